import type { ReactNode } from 'react';

/** A record on a phone; the link of its title stretches over all of it. */
export function RecordCard({ children }: { children: ReactNode }) {
  return <li className="tk-record">{children}</li>;
}

export function RecordCards({ label, children }: { label: string; children: ReactNode }) {
  return (
    <ul className="tk-records" aria-label={label}>
      {children}
    </ul>
  );
}
