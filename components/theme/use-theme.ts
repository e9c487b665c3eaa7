import { useSyncExternalStore } from 'react';
import { meaning, tones } from './meaning';
import type { ThemeName } from './palette';

export type ThemeChoice = 'device' | ThemeName;

const storedUnder = 'tarekeep.theme';
const listeners = new Set<() => void>();
const deviceIsDark = () => globalThis.matchMedia?.('(prefers-color-scheme: dark)').matches ?? false;

function readChoice(): ThemeChoice {
  try {
    const kept = globalThis.localStorage?.getItem(storedUnder);
    return kept === 'light' || kept === 'dark' ? kept : 'device';
  } catch {
    return 'device';
  }
}

let choice: ThemeChoice = readChoice();

function show(chosen: ThemeChoice) {
  if (typeof document === 'undefined') return;
  if (chosen === 'device') document.documentElement.removeAttribute('data-theme');
  else document.documentElement.setAttribute('data-theme', chosen);
}
show(choice);

function choose(chosen: ThemeChoice) {
  choice = chosen;
  try {
    globalThis.localStorage?.setItem(storedUnder, chosen);
  } catch {
    // A browser that keeps nothing still shows the choice until the page is left.
  }
  show(chosen);
  listeners.forEach((tell) => tell());
}

function subscribe(tell: () => void) {
  listeners.add(tell);
  const device = globalThis.matchMedia?.('(prefers-color-scheme: dark)');
  device?.addEventListener('change', tell);
  return () => {
    listeners.delete(tell);
    device?.removeEventListener('change', tell);
  };
}

const readShown = (): ThemeName => (choice === 'device' ? (deviceIsDark() ? 'dark' : 'light') : choice);

/** Colours by meaning, which theme shows, and the person's choice of it. */
export function useTheme() {
  const shown = useSyncExternalStore(subscribe, readShown);
  const chosen = useSyncExternalStore(subscribe, () => choice);
  return { colours: meaning, tones, shown, choice: chosen, choose };
}
