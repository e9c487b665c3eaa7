import { useEffect, useSyncExternalStore } from 'react';

let message = '';
let listeners: (() => void)[] = [];

function say(next: string) {
  message = next;
  listeners.forEach((tell) => tell());
}

/** Says in one sentence what has just happened; shown for a while and read out politely. */
export function announce(sentence: string) {
  say('');
  setTimeout(() => say(sentence), 30);
}

function subscribe(tell: () => void) {
  listeners = [...listeners, tell];
  return () => {
    listeners = listeners.filter((each) => each !== tell);
  };
}

/** The one place of a page where announcements appear. */
export function Announcer() {
  const shown = useSyncExternalStore(subscribe, () => message);
  useEffect(() => {
    if (shown === '') return undefined;
    const timer = setTimeout(() => say(''), 6000);
    return () => clearTimeout(timer);
  }, [shown]);
  return (
    <div className="tk-toast" role="status">
      {shown}
    </div>
  );
}
