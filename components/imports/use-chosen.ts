import { useState } from 'react';

/** Which rows of a list are ticked. */
export function useChosen() {
  const [ids, setIds] = useState<readonly string[]>([]);
  return {
    ids,
    has: (id: string) => ids.includes(id),
    set: (id: string, isChosen: boolean) =>
      setIds((before) => [...before.filter((each) => each !== id), ...(isChosen ? [id] : [])]),
    clear: () => setIds([]),
  };
}
