import { type Book, type Layer } from './book';
import { type TermsVersion } from './terms-history';

/** A new layer of that day (RULES 3.3, 3.11); its age counts from that day for the fee and for loss by age. */
export function openLayer(
  book: Book,
  of: { day: number; terms: TermsVersion; deposit: bigint; units: number },
): void {
  const { lostAfterDays } = of.terms.given;
  const layer: Layer = {
    sequence: book.layers.length,
    day: of.day,
    terms: of.terms,
    deposit: of.deposit,
    dueDay: lostAfterDays === null ? Infinity : of.day + lostAfterDays,
    open: of.units,
    reckonedTo: of.day,
  };
  book.layers.push(layer);
  if (layer.dueDay <= book.period.to) book.due.add(layer);
}

/** Takes units out of one layer on that day. */
export function takeFrom(book: Book, layer: Layer, of: { day: number; units: number }): void {
  reckonUnitDays(book, layer, of.day);
  layer.open -= of.units;
}

/**
 * Oldest first (RULES 3.4): hands each piece to `each` and gives back how many units no layer could cover.
 * A layer once empty is never looked at again, so all calls together cost as much as there are layers.
 */
export function takeOldest(
  book: Book,
  of: { day: number; units: number },
  each: (layer: Layer, units: number) => void,
): number {
  let wanted = of.units;
  while (wanted > 0) {
    const layer = book.layers[book.oldest];
    if (!layer) return wanted;
    if (layer.open === 0) {
      book.oldest += 1;
      continue;
    }
    const units = Math.min(wanted, layer.open);
    takeFrom(book, layer, { day: of.day, units });
    wanted -= units;
    each(layer, units);
  }
  return 0;
}

/**
 * Adds the layer's unit-days for the days before `day` on which its open units did not change: units open at
 * the end of a day of the period on which their age is at least `freeDays` (RULES 3.7, 3.8).
 */
export function reckonUnitDays(book: Book, layer: Layer, day: number): void {
  const first = Math.max(layer.reckonedTo, book.period.from, layer.day + layer.terms.given.freeDays);
  const days = Math.min(day, book.period.to + 1) - first;
  layer.reckonedTo = day;
  if (days <= 0 || layer.open === 0) return;
  book.unitDays.set(layer.terms, (book.unitDays.get(layer.terms) ?? 0) + days * layer.open);
}
