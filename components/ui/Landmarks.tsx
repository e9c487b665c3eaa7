import type { ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';

/** The first stop of the keyboard: past the places, to the content. */
export function SkipLink() {
  return (
    <a className="tk-skip" href="#content" onClick={(event) => goToContent(event)}>
      {text.shell.skip}
    </a>
  );
}

function goToContent(event: { preventDefault: () => void }) {
  event.preventDefault();
  document.getElementById('content')?.focus();
}

export function Main({ children }: { children: ReactNode }) {
  return (
    <main id="content" tabIndex={-1} style={{ flex: 1, minWidth: 0 }}>
      {children}
    </main>
  );
}

/** The rail at the left, from 900 px. */
export function Rail({ children }: { children: ReactNode }) {
  return (
    <nav className="tk-rail" aria-label={text.shell.places} data-print="no">
      {children}
    </nav>
  );
}

/** The bar at the bottom, below 900 px. */
export function BottomBar({ children }: { children: ReactNode }) {
  return (
    <nav className="tk-bottom-bar" aria-label={text.shell.places} data-print="no">
      {children}
    </nav>
  );
}
