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

interface Turn {
  paper: Paper;
  /** The id without the number at its end, and that number: R2 comes before R10. */
  head: string;
  tail: number;
}

// An id of any other kind, as a UUID that grows with time, stands as it is.
function turnOf(paper: Paper): Turn {
  const tail = /^\D*(\d{1,15})$/.exec(paper.id)?.[1];
  if (tail === undefined) return { paper, head: paper.id, tail: -1 };
  return { paper, head: paper.id.slice(0, -tail.length), tail: Number(tail) };
}

const compare = <T>(a: T, b: T) => (a < b ? -1 : a > b ? 1 : 0);

const byDayThenId = (a: Turn, b: Turn): number =>
  a.paper.day - b.paper.day ||
  (a.head === b.head ? a.tail - b.tail : compare(a.head, b.head)) ||
  compare(a.paper.id, b.paper.id);

export function readPapers(documents: (DeclaredShipment | CountedReceipt)[]): Paper[] {
  const turns = documents.map((document) => turnOf(readPaper(document))).sort(byDayThenId);
  return turns.map(({ paper }, place) => {
    paper.place = place;
    return paper;
  });
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
