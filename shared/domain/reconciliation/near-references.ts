import { type Reference, withoutLookAlikes } from './references';

// A single character is near to every other.
const SHORTEST = 2;

const formsOf = (reference: Reference): string[] =>
  [...new Set([reference.compact, reference.padded, reference.core])].filter((f) => f.length >= SHORTEST);

const withoutOne = (text: string): string[] => [
  ...new Set(Array.from(text, (_, at) => text.slice(0, at) + text.slice(at + 1))),
];

/**
 * One character of `right` dropped, changed, or two neighbours swapped gives `written`. One character more
 * is a hyphen or blank that was changed, for these are set aside before.
 */
function oneSlip(written: string, right: string): boolean {
  let at = 0;
  while (at < written.length && written[at] === right[at]) at += 1;
  if (written.length === right.length - 1) return written.slice(at) === right.slice(at + 1);
  if (written.length === right.length + 1) return written.slice(at + 1) === right.slice(at);
  if (written.length !== right.length || at === written.length) return false;
  if (written.slice(at + 1) === right.slice(at + 1)) return true;
  const swapped = written[at] === right[at + 1] && written[at + 1] === right[at];
  return swapped && written.slice(at + 2) === right.slice(at + 2);
}

/** RULES 5, near reference: one slip of the pen, or look-alikes only. Not near: the same reference. */
export function isNear(written: Reference, right: Reference): boolean {
  if (written.core === right.core) return false;
  return formsOf(written).some((w) =>
    formsOf(right).some((r) => oneSlip(w, r) || (w !== r && withoutLookAlikes(w) === withoutLookAlikes(r))),
  );
}

/**
 * Finds what is near without comparing all pairs: whatever is one slip apart shares a text with one
 * character left out, so each entry stands under all of these.
 */
export class NearIndex<T> {
  private readonly entries = new Map<string, T[]>();

  add(lane: string, reference: Reference, entry: T): void {
    const keys = formsOf(reference).flatMap((form) => [
      form,
      ...withoutOne(form),
      `=${withoutLookAlikes(form)}`,
    ]);
    for (const key of new Set(keys)) {
      const place = `${lane}\u0000${key}`;
      const there = this.entries.get(place);
      if (there) there.push(entry);
      else this.entries.set(place, [entry]);
    }
  }

  /** Candidates on the lane, each once; the caller confirms them with `isNear`. */
  around(lane: string, written: Reference): T[] {
    const found = new Set<T>();
    for (const form of formsOf(written))
      for (const key of [form, ...withoutOne(form), `=${withoutLookAlikes(form)}`])
        for (const entry of this.entries.get(`${lane}\u0000${key}`) ?? []) found.add(entry);
    return [...found];
  }
}
