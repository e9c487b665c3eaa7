import { formatUnits } from '../format';
import { plural } from '../plural';

type Kind = 'empties' | 'fulls';

const lines = (count: number) => plural(count, { one: 'line', other: 'lines' });

export const shipments = {
  head: 'Shipments',
  empty: 'No shipments yet',
  emptyHint: {
    empties: 'Empties that you send and fulls that are announced to you will stand here.',
    fulls: 'Empties that are on their way to you and fulls that you announce will stand here.',
  },
  send: { empties: 'Send empties', fulls: 'Announce fulls' },
  contents: { empties: 'empties', fulls: 'fulls' },
  count: 'Count',
  countThis: 'Count this delivery',

  column: {
    reference: 'Shipment',
    contents: 'Contents',
    from: 'From',
    to: 'To',
    load: 'Load',
    leftOn: 'Left',
    expectedOn: 'Expected',
    state: 'State',
  },
  filter: { direction: 'Direction', state: 'State', contents: 'Contents', partner: 'Partner' },
  direction: { in: 'coming to us', out: 'sent by us' },
  state: {
    'on the way': 'on the way',
    counted: 'counted',
    overdue: 'overdue',
    differs: 'differs',
  },
  search: 'Reference',

  detailHead: (kind: Kind, reference: string) => `${kind === 'empties' ? 'Empties' : 'Fulls'} ${reference}`,
  fromTo: (from: string, to: string) => `${from} → ${to}`,
  leftExpected: (left: string, expected: string) => `left ${left} · expected ${expected}`,
  leftFrom: (kind: Kind, from: string, left: string) =>
    `${kind === 'empties' ? 'Empties' : 'Fulls'} from ${from} · left ${left}`,
  sentBy: (name: string) => `Sent by ${name}`,
  linesHead: 'What was declared and counted',
  type: 'Container type',
  typeCode: 'Type',
  countedDay: 'Counted on',
  openDifference: 'Difference open',
  declared: 'Declared',
  counted: 'Counted',
  firstCounted: (units: number) => `first counted ${formatUnits(units)}`,
  difference: 'Difference',
  damaged: 'Damaged',
  dirty: 'To clean',
  notCounted: 'not yet counted',
  asDeclared: 'as declared',
  fewer: (units: number) => `${formatUnits(units)} fewer than declared`,
  more: (units: number) => `${formatUnits(units)} more than declared`,
  settledDifference: (units: number) =>
    `${formatUnits(Math.abs(units))} ${units < 0 ? 'fewer' : 'more'}, settled`,
  countsHead: 'Who sent and counted',
  laterCount: (sequence: number) => `Count ${formatUnits(sequence)}, turned up later`,
  countedBy: (name: string, when: string) => `Counted by ${name}, ${when}`,
  countedByImport: (when: string) => `Counted, taken from a file, ${when}`,
  countedAutomatically: (when: string) => `Taken as counted as declared, ${when}`,
  countedOn: (when: string) => `Counted ${when}`,
  settlementsHead: 'How differences were settled',
  settled: (way: string, units: number) => `${way}, ${formatUnits(units)}`,
  settle: 'Settle the difference',
  dispute: 'Dispute this count',
  entriesHead: 'Entries in the book',
  entry: (id: number, kind: string) => `Entry ${formatUnits(id)}: ${kind}`,
  moved: (units: number, type: string) => `${formatUnits(units)} ${type}`,
  move: (what: string, from: string, to: string) => `${what}: ${from} → ${to}`,

  sendLead: {
    empties: 'The partner sees the shipment at once and is told by e-mail.',
    fulls: 'The plant sees the shipment at once and is told by e-mail.',
  },
  form: {
    from: 'From',
    to: 'To',
    leftOn: 'Left on',
    expectedOn: 'Expected on',
    reference: 'Number of your note',
    referenceHint: 'Left empty, a number is made.',
    linesHead: 'Load',
    type: 'Container type',
    units: 'Units',
    addLine: 'Add another type',
    removeLine: (type: string) => `Remove ${type}`,
    note: 'Note for the receiver',
    atSite: (units: number) => `${formatUnits(units)} at this site by the book`,
    short: (units: number) => `By the book this site holds ${formatUnits(units)}.`,
  },
  sent: (company: string) => `Sent. ${company} sees it now.`,
  openSent: (reference: string) => `Open ${reference}`,
  sendAnother: 'Send another',

  countHead: (reference: string) => `Count ${reference}`,
  declaredUnits: (units: number) => `declared ${formatUnits(units)}`,
  notDeclared: 'not declared',
  stacks: (stacks: number, each: number, rest: number) =>
    `${formatUnits(stacks)} ${plural(stacks, { one: 'stack', other: 'stacks' })} of ${formatUnits(each)}${rest === 0 ? '' : ` and ${formatUnits(rest)}`}`,
  takeAsDeclared: 'As declared',
  change: 'Other number, or damaged',
  changeOf: (type: string) => `Other number, or damaged: ${type}`,
  asDeclaredOf: (type: string) => `As declared: ${type}`,
  number: (type: string) => `${type}, counted`,
  damagedOf: (type: string) => `${type}, of these damaged`,
  dirtyOf: (type: string) => `${type}, of these to clean`,
  ofTheseDamaged: 'of these damaged',
  ofTheseDirty: 'of these to clean',
  addType: 'Something came that was not declared',
  addTypePick: 'Which container type',
  addTypeDo: 'Add to the count',
  takeOff: (type: string) => `Take ${type} off`,
  photos: 'Photos',
  photosHint: 'A photo of the load helps when the numbers differ.',
  countNote: 'Note',
  linesLeft: (left: number, of: number) => `${formatUnits(left)} of ${formatUnits(of)} ${lines(of)} left`,
  allCounted: 'All lines counted',
  sendCount: 'Send count',
  notSent: 'Not sent: no connection. Everything you typed is kept here.',
  sendAgain: 'Send again',
  countSent: (reference: string) => `Your count of ${reference} is in the book.`,
  countSentAgreed: 'Everything came as declared.',
  countSentDiffers: 'What differs is with the plant now, to be settled.',
  countSentDiffersOperator: 'What differs stands in the list of differences now.',
  countedAlready: 'This shipment is counted',
  notYours: 'Only the receiver counts a shipment.',
  moreDamaged: 'More damaged than counted.',
  moreDirty: 'More to clean than counted.',

  mail: {
    sentSubject: (it: { reference: string; contents: Kind; company: string }) =>
      `${it.contents === 'empties' ? 'Empties' : 'Fulls'} ${it.reference} from ${it.company}`,
    sentText: (it: { contents: Kind; from: string; to: string; due: string; reference: string }) =>
      `${it.contents === 'empties' ? 'Empties' : 'Fulls'} have left ${it.from} for ${it.to} under ${it.reference}, expected on ${it.due}. Count them here when they arrive:`,
    beforeSubject: (reference: string) => `${reference} is not counted yet`,
    beforeText: (it: {
      reference: string;
      from: string;
      to: string;
      toCompany: string;
      due: string;
      on: string;
    }) =>
      `Empties ${it.reference} from ${it.from} to ${it.to} were expected on ${it.due} and are not counted yet. If ${it.toCompany} does not count them before ${it.on}, they are then taken as counted as declared. The shipment:`,
    afterSubject: (reference: string) => `${reference} is taken as counted as declared`,
    afterText: (it: { reference: string; from: string; to: string; toCompany: string; due: string }) =>
      `Empties ${it.reference} from ${it.from} to ${it.to} were expected on ${it.due} and nobody counted them in the time agreed, so they are taken as counted as declared. ${it.toCompany} can still dispute that count. The shipment:`,
  },
} as const;
