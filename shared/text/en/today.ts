import { formatUnits } from '../format';
import { plural } from '../plural';

const days = (count: number) => `${formatUnits(count)} ${plural(count, { one: 'day', other: 'days' })}`;

export const today = {
  head: 'Today',
  poolHead: 'Where the pool is',
  kicker: (company: string, day: string) => `${company} · ${day}`,
  nothing: 'Nothing waits for you',
  nothingHint: 'What comes in for you will stand here, most urgent first.',
  all: (count: number) => `all ${formatUnits(count)}`,

  deliveries: (count: number) =>
    `${formatUnits(count)} ${plural(count, { one: 'delivery', other: 'deliveries' })} to count`,
  fulls: (count: number) =>
    `${formatUnits(count)} ${plural(count, { one: 'shipment', other: 'shipments' })} of fulls to count`,
  onTheWay: 'on the way',
  fromSite: (site: string) => `from ${site}`,
  count: 'Count',
  countOf: (reference: string) => `Count ${reference}`,
  due: (inDays: number, day: string) => {
    if (inDays === 0) return 'due today';
    if (inDays === 1) return 'due tomorrow';
    return inDays > 1 ? `due ${day}` : `due ${day}, ${days(-inDays)} ago`;
  },
  overdue: 'Not counted in time',
  overdueFor: (count: number) => `${days(count)} since it was expected`,
  open: 'Open',
  openOf: (what: string) => `Open ${what}`,

  hold: 'You hold',
  atSites: 'at your site',
  sent: 'sent, not yet counted',
  sentDiffers: 'sent, counted otherwise',
  moreToIt: (units: number) =>
    `${formatUnits(units)} more ${plural(units, { one: 'is', other: 'are' })} on the way to you`,
  lasts: (type: string, count: string) => `${type} last for ${count} days of packing.`,
  running: 'Running short',
  runningDays: (count: string) => `${count} d`,
  runningAt: (company: string, type: string) => `${company} · ${type}`,
  runningNote:
    'Days of packing that what is at the site will last, by the parts kept for it. A bar is full at ten days.',
  sendEmpties: 'Send empties',

  fewer: (units: number) => `${formatUnits(units)} fewer`,
  more: (units: number) => `${formatUnits(units)} more`,
  countedOn: (reference: string, type: string, day: string) => `${reference}, ${type}, counted ${day}`,

  type: 'Container type',
  allTypes: 'All container types',
  full: { words: 'full, on the way to the plants', key: 'full, on the way in' },
  empty: { words: 'empty, on the way back', key: 'empty, on the way back' },
  partners: {
    words: (count: number) =>
      `at ${formatUnits(count)} ${plural(count, { one: 'partner', other: 'partners' })}`,
    key: 'partners',
  },
  plants: { words: 'at the plants', key: 'plants' },
  inQuestion: {
    words: (money: string) => (money === '' ? 'in question' : `in question, ${money}`),
    key: 'in question',
  },
  inPool: (units: number) => `${formatUnits(units)} units in the pool`,
  approved: (units: number) => `approved size ${formatUnits(units)}`,
  under: (under: number, of: number) =>
    `${formatUnits(under)} of ${formatUnits(of)} ${plural(of, { one: 'type', other: 'types' })} under the approved size`,

  differences: 'Differences to settle',
  column: {
    shipment: 'Shipment',
    between: 'Between',
    what: 'What differs',
    openFor: 'Open for',
    atStake: 'At stake',
    next: 'Next step',
  },
  between: (from: string, to: string) => `${from} → ${to}`,
  openFor: days,
  settle: 'Settle',
  settleOf: (reference: string) => `Settle ${reference}`,

  disputes: 'Disputes to answer',
  disputed: (claimed: number, stated: number) =>
    `says ${formatUnits(claimed)}, the book says ${formatUnits(stated)}`,
  lastWord: (when: string) => `last word ${when}`,
  held: (money: string) => `${money} held out`,
  answer: 'Answer',
  answerOf: (what: string) => `Answer ${what}`,

  levels: 'Off their level',
  wholePool: 'whole pool',
  underBy: (units: number) => `${formatUnits(units)} under`,
  over: (units: number) => `${formatUnits(units)} over`,
  there: (units: number, minimum: number, maximum: number) =>
    minimum === maximum
      ? `${formatUnits(units)} there, approved ${formatUnits(minimum)}`
      : `${formatUnits(units)} there, between ${formatUnits(minimum)} and ${formatUnits(maximum)} wanted`,
  openPool: 'Open pool',

  months: 'Month end',
  toClose: (month: string) => `${month} is open`,
  close: 'Close',
  closeOf: (month: string) => `Close ${month}`,
  drafts: (count: number, month: string) =>
    `${formatUnits(count)} ${plural(count, { one: 'statement', other: 'statements' })} of ${month} not issued`,
  issue: 'Issue',
  issueOf: (month: string) => `Issue the statements of ${month}`,
  inDispute: (count: number, money: string) =>
    `${formatUnits(count)} ${plural(count, { one: 'dispute', other: 'disputes' })} undecided${money === '' ? '' : `, ${money} held out`}`,
  awaited: (count: number) =>
    `${formatUnits(count)} ${plural(count, { one: 'answer', other: 'answers' })} awaited`,
  statement: (month: string) => `Statement, ${month}`,
  statementOf: (company: string, month: string) => `${company}, ${month}`,
  dueNow: (money: string) => `due now ${money}`,
  answerBy: (day: string) => `answer by ${day}`,
  check: 'Check',

  administration: 'People and letters',
  invited: (name: string, company: string) => `${name}, ${company}`,
  invitedSince: (day: string) => `invited ${day}, not in yet`,
  failed: (count: number) =>
    `${formatUnits(count)} ${plural(count, { one: 'letter', other: 'letters' })} could not be sent`,
  bookDiffers: 'The book does not add up',
  bookDiffersHint: 'The daily check found a kept balance that is not the sum of its lines. See the log.',
} as const;
