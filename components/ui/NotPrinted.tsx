import type { ReactNode } from 'react';

/** Stands on the screen and not on paper. */
export function NotPrinted({ children }: { children: ReactNode }) {
  return <div data-print="no">{children}</div>;
}
