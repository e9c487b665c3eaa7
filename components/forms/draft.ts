const prefix = 'tarekeep.draft.';

const keyOf = (name: string, person: string) => `${prefix}${person}.${name}`;

/** Files cannot be kept in the browser's session; everything else that was typed can. */
function withoutFiles(_: string, value: unknown): unknown {
  const isFile = (each: unknown) => typeof File !== 'undefined' && each instanceof File;
  if (isFile(value) || (Array.isArray(value) && value.some(isFile))) return undefined;
  return value;
}

type Place = { name: string; person: string };

export function keepDraft({ name, person }: Place, values: unknown) {
  try {
    sessionStorage.setItem(keyOf(name, person), JSON.stringify(values, withoutFiles));
  } catch {
    // A full or forbidden store loses the draft on a reload, nothing else.
  }
}

export function readDraft({ name, person }: Place): Record<string, unknown> | undefined {
  try {
    const kept = sessionStorage.getItem(keyOf(name, person));
    return kept === null ? undefined : (JSON.parse(kept) as Record<string, unknown>);
  } catch {
    return undefined;
  }
}

export function dropDraft({ name, person }: Place) {
  try {
    sessionStorage.removeItem(keyOf(name, person));
  } catch {
    // Nothing was kept.
  }
}

/** At sign-out: the next person at this device finds none of it. */
export function dropAllDrafts() {
  try {
    Object.keys(sessionStorage)
      .filter((key) => key.startsWith(prefix))
      .forEach((key) => sessionStorage.removeItem(key));
  } catch {
    // Nothing was kept.
  }
}
