import type { ChosenWay, DifferenceDetail, DifferenceRow } from '../../contracts/differences';
import { formatDay, formatUnits } from '../format';
import { plural } from '../plural';
import { statements } from './statements';

type Way = DifferenceRow['ways'][number];
export type Effect = {
  units: number;
  fewer: boolean;
  sender: string;
  receiver: string;
  /** Who bears a loss, once chosen. */
  bearer?: string;
  bearerIsPartner?: boolean;
  other?: string;
  countedOn: string;
};

const ways: Record<Way, string> = {
  'sender miscounted': 'The sender miscounted',
  'receiver miscounted': 'The receiver miscounted',
  'lost on the way': 'Lost on the way',
  'turned up later': 'Turned up later',
  'wrong type': 'One type taken for another',
  'within tolerance': 'Within tolerance',
};

const inWords: Record<Way, string> = {
  'sender miscounted': 'as the sender’s miscount',
  'receiver miscounted': 'as the receiver’s miscount',
  'lost on the way': 'as lost on the way',
  'turned up later': 'as turned up later',
  'wrong type': 'as one type taken for another',
  'within tolerance': 'as within tolerance',
};

const many = (units: number) => `${formatUnits(units)} ${plural(units, { one: 'unit', other: 'units' })}`;

const effects: Record<ChosenWay, (it: Effect) => string> = {
  'sender miscounted': (it) =>
    it.fewer
      ? `${many(it.units)} go back to ${it.sender} in the book, today. The count stands; no money moves.`
      : `${many(it.units)} more are taken from ${it.sender} in the book, today. The count stands; no money moves.`,
  'receiver miscounted': (it) =>
    `The count of ${formatDay(it.countedOn, 'date')} is put right by ${formatUnits(it.units)} ${it.fewer ? 'more' : 'fewer'}, on that day. Deposits and fees from then on follow, also in a closed month, as a correction.`,
  'lost on the way': (it) => {
    const gone = `${many(it.units)} leave the pool as lost, today.`;
    if (it.bearer === undefined) return `${gone} Say who bears it.`;
    return it.bearerIsPartner
      ? `${gone} ${it.bearer} forfeits the deposit and is charged the rest of their value.`
      : `${gone} ${it.bearer} bears it: nothing is charged, and a partner that sent them has given them back.`;
  },
  'turned up later': (it) =>
    `A second count, today: ${it.receiver} has ${many(it.units)} more, and answers for them from today on.`,
  'wrong type': (it) =>
    it.other === undefined
      ? 'Choose the type it was taken for. Both differences are settled together.'
      : `${many(it.units)} of this type and ${formatUnits(it.units)} of ${it.other} change places in the book of ${it.sender}, today. The count stands; no money moves.`,
};

const days = (count: number) => `${formatUnits(count)} ${plural(count, { one: 'day', other: 'days' })}`;

/** "8 totes", or "65 units of 2 types". */
function load({ lines, units }: Pick<DifferenceRow, 'lines' | 'units'>): string {
  const kinds = new Set(lines.map((line) => line.typeKind));
  const [kind] = kinds;
  return kinds.size === 1 && kind
    ? statements.unitsOfKind(units, kind)
    : `${many(units)} of ${lines.length} types`;
}

export const differences = {
  head: 'Differences',
  lead: 'What was declared and not counted, counted and not declared, overdue or unannounced. The oldest first.',
  search: 'Reference',
  noReference: 'no reference',
  empty: 'Nothing differs',
  emptyBody:
    'When a count says otherwise than the declaration, or a shipment stays out too long, it stands here to be settled.',
  filter: {
    kind: 'What differs',
    partner: 'Partner',
    type: 'Container type',
    state: 'State',
    open: 'To settle',
    settled: 'Settled',
  },
  kinds: {
    fewer: 'Fewer than declared',
    more: 'More than declared',
    overdue: 'Too long on the way',
    unannounced: 'Arrived unannounced',
  },
  columns: {
    shipment: 'Shipment',
    between: 'Between',
    what: 'What differs',
    openFor: 'Open for',
    atStake: 'At stake',
    next: 'Next',
  },
  lane: (from: string, to: string) => `${from} → ${to}`,
  load,
  days,
  daysOpen: (count: number) => (count === 0 ? 'today' : days(count)),
  tag: (row: DifferenceRow) => {
    if (row.kind === 'overdue') return `${days(row.days)} on the way, ${load(row)}`;
    if (row.kind === 'unannounced') return `arrived unannounced, ${load(row)}`;
    const gap = `${load(row)} ${row.kind}`;
    return row.disputeId !== null && row.state === 'open' ? `disputed: ${gap}` : gap;
  },
  chosen: (reference: string) => `› ${reference}`,
  settledTag: (row: DifferenceRow) => {
    const [first, ...more] = row.ways;
    if (first === undefined) return 'settled';
    return more.length > 0 ? `${ways[first].toLowerCase()} and other` : ways[first].toLowerCase();
  },
  next: { settle: 'Settle', match: 'Match', open: 'Open', answer: 'Answer', look: 'Look' },
  ways,
  detail: {
    declared: 'Declared',
    counted: 'Counted',
    gap: (by: number) => `${formatUnits(Math.abs(by))} ${by < 0 ? 'fewer' : 'more'} than declared`,
    open: 'Still open',
    atStake: 'At stake',
    atStakeFrom: 'Replacement value by the terms in force on the day of the count',
    toShipment: (reference: string) => `Shipment ${reference} and its movements`,
    toDispute: 'The partner disputes this count',
    countHead: 'The count',
    countedBy: (by: string | null, when: string) =>
      by === null ? `Counted on ${when}.` : `${by} counted on ${when}.`,
    countedAlone: (when: string) => `Taken as counted as declared on ${when}: nobody had counted in time.`,
    countedImport: (when: string) => `Counted by a file on ${when}.`,
    matchingHead: 'What the matching found',
    matching: (rule: string, receipt: string | null) =>
      receipt === null ? `A receipt without a reference, by ${rule}` : `Receipt ${receipt}, by ${rule}`,
    historyHead: 'How it was settled',
    settledLine: (it: DifferenceDetail['settlements'][number]) =>
      `${formatUnits(it.units)} ${inWords[it.way]}${it.bearer ? `, borne by ${it.bearer}` : ''}${it.swappedWith ? `, with ${it.swappedWith}` : ''}`,
    byWhom: (by: string | null, when: string) => `${by ?? 'By rule'}, ${when}`,
    nobodyMay: 'Your role reads differences and does not settle them.',
    isSettled: 'This is settled.',
  },
  settle: {
    head: 'Settle it',
    way: 'What happened?',
    units: 'How many of them?',
    unitsHint: (open: number) => `${formatUnits(open)} ${plural(open, { one: 'is', other: 'are' })} open.`,
    bearer: 'Who bears the loss?',
    bearers: {
      sender: (company: string) => `${company}, who sent them`,
      receiver: (company: string) => `${company}, who received them`,
    },
    swap: 'Taken for which type?',
    swapOption: (name: string, openUnits: number) =>
      `${name}: ${formatUnits(Math.abs(openUnits))} ${openUnits < 0 ? 'fewer' : 'more'}`,
    reason: 'How do you know?',
    reasonHint: 'Both companies can read this later.',
    does: 'What this does',
    send: 'Settle',
    effect: (way: ChosenWay, it: Effect) => effects[way](it),
    done: (units: number, way: ChosenWay, left: number) =>
      `${many(units)} settled ${inWords[way]}. ${left === 0 ? 'Nothing of it is open any more.' : `${formatUnits(left)} ${plural(left, { one: 'is', other: 'are' })} still open.`}`,
  },
} as const;
