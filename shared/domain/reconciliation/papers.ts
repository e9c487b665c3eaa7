import { dayNumber } from '../calendar';
import { type Contents, contentsOf } from './contents';
import type { CountedReceipt, DeclaredShipment } from './input';
import { readReference, type Reference } from './references';

/** A shipment's note or a receipt, read once for all rules. */
export interface Paper {
  id: string;
  /** Place among its kind by day, then id: the order in which everything is done, whatever the input's. */
  place: number;
  from: string;
  to: string;
  lane: string;
  /** Day number of the calendar. */
  day: number;
  text: string | null;
  reference: Reference | null;
  contents: Contents;
}

export const laneOf = (from: string, to: string): string => JSON.stringify([from, to]);

// R2 comes before R10; an id of any other kind, as a UUID that grows with time, stands as it is.
const inCountingOrder = (id: string) =>
  /^\D*\d+$/.test(id) ? id.replace(/\d+$/, (digits) => digits.padStart(15, '0')) : id;

const compare = <T>(a: T, b: T) => (a < b ? -1 : a > b ? 1 : 0);

export function readPapers(documents: (DeclaredShipment | CountedReceipt)[]): Paper[] {
  return documents
    .map((document) => ({ paper: readPaper(document), key: inCountingOrder(document.id) }))
    .sort((a, b) => a.paper.day - b.paper.day || compare(a.key, b.key) || compare(a.paper.id, b.paper.id))
    .map(({ paper }, place) => ({ ...paper, place }));
}

function readPaper({ id, ref, from, to, date, lines }: DeclaredShipment | CountedReceipt): Paper {
  return {
    id,
    place: 0,
    from,
    to,
    lane: laneOf(from, to),
    day: dayNumber(date),
    text: ref,
    reference: readReference(ref),
    contents: contentsOf(lines),
  };
}

export const inOrder = (papers: Iterable<Paper>): Paper[] => [...papers].sort((a, b) => a.place - b.place);

/** The receipt can be of the shipment by its day: not before it left, not after the window. */
export const inWindow = (windowDays: number, shipment: Paper, receipt: Paper): boolean =>
  receipt.day >= shipment.day && receipt.day - shipment.day <= windowDays;
