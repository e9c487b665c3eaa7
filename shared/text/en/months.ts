import { formatMonth, formatUnits } from '../format';
import { plural } from '../plural';

const statements = (count: number) =>
  `${formatUnits(count)} ${plural(count, { one: 'statement', other: 'statements' })}`;

export const months = {
  head: 'Months',
  lead: 'A month is open until you close it. Closing makes a draft statement for each partner.',
  month: 'Month',
  state: 'State',
  closed: 'Closed',
  statements: 'Statements',
  states: { open: 'open', running: 'still running', closed: 'closed' },
  closedBy: (by: string | null, when: string) => (by ? `${by}, ${when}` : when),
  counts: ({
    drafts,
    issued,
    confirmed,
    disputed,
  }: Record<'drafts' | 'issued' | 'confirmed' | 'disputed', number>) =>
    [
      ...(drafts > 0 ? [`${formatUnits(drafts)} ${plural(drafts, { one: 'draft', other: 'drafts' })}`] : []),
      ...(issued > 0 ? [`${formatUnits(issued)} issued`] : []),
      ...(confirmed > 0 ? [`${formatUnits(confirmed)} confirmed`] : []),
      ...(disputed > 0 ? [`${formatUnits(disputed)} disputed`] : []),
    ].join(', '),
  none: 'none yet',
  empty: 'No months yet',
  emptyHint: 'The first month stands here with the first movement.',
  openHead: 'What still stands open',
  openLead: 'Each leads to the place where it is settled. You can close the month anyway and say why.',
  nothingOpen: 'Nothing stands open.',
  item: {
    differences: (count: number) =>
      `${formatUnits(count)} open ${plural(count, { one: 'difference', other: 'differences' })}`,
    disputes: (count: number) =>
      `${formatUnits(count)} undecided ${plural(count, { one: 'dispute', other: 'disputes' })}`,
    uncounted: (count: number) =>
      `${formatUnits(count)} ${plural(count, { one: 'shipment', other: 'shipments' })} not counted`,
    'terms missing': (_count: number, type: string | null) =>
      `No terms for ${type ?? ''}: cannot be reckoned`,
  },
  itemHeads: { what: 'What', partner: 'Partner', money: 'Money' },
  closeHead: (month: string) => `Close ${formatMonth(month)}`,
  closeNote:
    'After the close nothing more is posted into this month, except corrections. These show in the next statement.',
  reason: 'Why it is closed although something stands open',
  close: 'Close the month',
  closeDone: 'The month is closed. The drafts are being made.',
  notOver: 'This month is still running. It can be closed after its last day.',
  earlierOpen: (month: string) => `${formatMonth(month)} is still open and has to be closed first.`,
  toEarlier: (month: string) => `Go to ${formatMonth(month)}`,
  closedReason: (reason: string) => `Closed although something stood open: “${reason}”`,
  draftsHead: 'Statements',
  draftsRunning: 'Draft statements are being made',
  issueRunning: 'Statements are going out',
  leave: 'You can leave this page and come back.',
  failed: (problem: string) => `This did not come to its end: ${problem}`,
  refusedHead: (count: number) =>
    `${formatUnits(count)} ${plural(count, { one: 'partner', other: 'partners' })} could not be reckoned`,
  refusedHint: 'Put right what is named, then make the drafts again. The other partners are not held up.',
  seeTerms: (partner: string) => `Terms of ${partner}`,
  seeStatements: (count: number) => `See ${statements(count)}`,
  issueAll: (count: number) =>
    `Issue ${formatUnits(count)} ${plural(count, { one: 'draft', other: 'drafts' })}`,
  issueNote: 'Each partner is told by e-mail. An issued statement does not change any more.',
  issueDone: 'The statements are going out.',
  draftAgain: 'Make the drafts again',
  draftAgainNote: 'With what is known now. Issued statements stay as they are.',
  downloadAll: 'Download all spreadsheets',
  back: 'Months',
} as const;
