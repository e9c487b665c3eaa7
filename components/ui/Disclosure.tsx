import type { ReactNode } from 'react';

/** Something that can be opened in place, such as how a figure is reckoned. */
export function Disclosure({
  label,
  children,
  open,
}: {
  label: string;
  children: ReactNode;
  open?: boolean;
}) {
  return (
    <details className="tk-disclosure" open={open}>
      <summary>{label}</summary>
      {children}
    </details>
  );
}
