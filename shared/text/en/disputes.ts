import type { DisputeReason, DisputeRow, DisputeState, LineSubject } from '../../contracts/disputes';
import { formatDay, formatMoney, formatMonth, formatUnits } from '../format';
import { plural } from '../plural';
import { statements } from './statements';

const reasons: Record<DisputeReason, string> = {
  'counted wrongly': 'It was counted wrongly',
  'sent them back': 'We sent them back',
  'never arrived': 'They never arrived',
  'arrived damaged': 'They arrived damaged',
  'wrong rate': 'The rate is not the agreed one',
  other: 'Something else',
};

const states: Record<DisputeState, string> = {
  open: 'open',
  'waiting for partner': 'asked for more',
  accepted: 'accepted',
  'accepted in part': 'accepted in part',
  declined: 'declined',
  withdrawn: 'withdrawn',
};

const days = (count: number) =>
  count === 0 ? 'today' : `${formatUnits(count)} ${plural(count, { one: 'day', other: 'days' })}`;

const gap = (by: number) => `${formatUnits(Math.abs(by))} ${by < 0 ? 'fewer' : 'more'}`;

export const disputes = {
  what: 'A dispute over this',
  yourCompany: 'Your company',
  acceptedReason: 'Accepted as the partner said',
  reasons,
  states,
  days,
  gap,
  list: {
    head: 'Disputes',
    search: 'Shipment or statement',
    chosen: (about: string) => `› ${about}`,
    emptyOperator: 'No dispute waits for a decision',
    emptyOperatorBody:
      'When a partner says that a count or a statement line is wrong, it stands here with its papers, the longest silence first.',
    emptyPartner: 'You dispute nothing',
    emptyPartnerBody:
      'To dispute a count, open its shipment. To dispute money, open the line on the statement. What you send stands here.',
    toShipments: 'Open shipments',
    filter: {
      state: 'State',
      subject: 'About',
      partner: 'Partner',
      undecided: 'Not decided',
      open: 'Plant has the next word',
      waiting: 'Partner has the next word',
      decided: 'Decided',
      count: 'Counts',
      line: 'Statement lines',
    },
    column: {
      about: 'About',
      partner: 'Partner',
      claim: 'The claim',
      held: 'Held back',
      state: 'State',
      next: 'Next word',
    },
    tag: (row: DisputeRow) => {
      if (row.waitingFor === null) return states[row.state];
      return row.yourTurn ? 'waits for you' : states[row.state];
    },
    next: (row: DisputeRow) => {
      if (row.waitingFor === null) return 'decided';
      const who = row.yourTurn ? 'yours' : row.waitingFor === 'operator' ? 'the plant' : row.company;
      return `${who}, ${row.days === 0 ? 'since today' : `for ${days(row.days)}`}`;
    },
  },
  about: (row: DisputeRow) => {
    if (row.subject === 'count') return `Count of ${row.reference ?? ''}`;
    const what = row.component ? statements.component[row.component] : '';
    return `${what}, ${row.statementMonth ? formatMonth(row.statementMonth) : ''}`;
  },
  claim: (row: DisputeRow) => {
    if (row.stated === row.claimed) return `${formatMoney(row.amountClaimed, row.currency)} too much`;
    return `${formatUnits(row.claimed)} instead of ${formatUnits(row.stated)} ${row.typeName ?? ''}`.trim();
  },
  detail: {
    bookSays: 'The book says',
    partnerSays: (company: string) => `${company} says`,
    heldBack: 'Held back',
    nothingHeld: 'Nothing is held back',
    why: 'Why',
    toShipment: (reference: string) => `Shipment ${reference}`,
    toStatement: (number: string) => `Statement ${number}`,
    cameBackOn: (reference: string) => `Came back on ${reference}`,
    thread: 'What was said',
    steps: {
      opened: 'opened the dispute',
      asked: 'asked for more',
      answered: 'answered',
      accepted: 'accepted it in whole',
      'accepted in part': 'accepted it in part',
      declined: 'declined it',
      withdrawn: 'withdrew it',
    },
    someone: 'Tarekeep',
    noWords: 'Without further words.',
    nextWord: (row: DisputeRow) =>
      row.waitingFor === null
        ? ''
        : row.yourTurn
          ? `You have the next word, ${row.days === 0 ? 'since today' : `for ${days(row.days)}`}.`
          : `${row.waitingFor === 'operator' ? 'The plant' : row.company} has the next word, ${row.days === 0 ? 'since today' : `for ${days(row.days)}`}.`,
    outcome: {
      units: (accepted: number, claimed: number) =>
        `${formatUnits(accepted)} of ${formatUnits(claimed)} accepted.`,
      countRight: (to: number) => `The count stands at ${formatUnits(to)}.`,
      money: (amount: string, currency: string) =>
        `${formatMoney(amount, currency)} is given back: as a correction or a credit in the next statement.`,
      declined: 'Declined: what the book says stands.',
      withdrawn: 'Withdrawn: what the book says stands.',
    },
  },
  answer: {
    head: 'Your answer',
    step: 'What do you decide?',
    steps: {
      accept: 'Accept in whole',
      'accept in part': 'Accept in part',
      ask: 'Ask for more',
      decline: 'Decline',
    },
    effect: {
      count: (by: number, to: number) =>
        `The count is put right by ${gap(by)}, to ${formatUnits(to)}, on its own day. The partner's deposits and fees follow.`,
      lost: 'The units are no longer lost; the month they were billed in is reckoned again and the next statement corrects it.',
      credit: (amount: string, currency: string) =>
        `${formatMoney(amount, currency)} stands as a credit in the next statement.`,
      part: 'The rest stands as the book says it.',
      ask: 'Nothing is posted. The partner has the next word; what is held back stays held back.',
      decline: 'Nothing is posted; what was held back is due again.',
    },
    units: 'How many do you accept?',
    unitsHelp: (claimed: number) => `Fewer than the ${formatUnits(claimed)} claimed.`,
    amount: 'How much do you accept?',
    amountHelp: (amount: string, currency: string) =>
      `Less than the ${formatMoney(amount, currency)} claimed.`,
    text: 'What do you tell them?',
    textNeeded: 'Both companies read this.',
    paper: 'A photo or PDF, up to 10 MB each',
    send: 'Send answer',
    done: 'The answer is sent.',
  },
  reply: {
    head: 'Say more',
    text: 'What do you want to add?',
    send: 'Send',
    done: 'Your words are sent.',
    withdraw: 'Withdraw the dispute',
    withdrawHead: 'Withdraw this dispute?',
    withdrawBody: 'What the book says then stands, and what was held back is due again.',
    keep: 'Keep it',
    withdrawn: 'The dispute is withdrawn.',
  },
  form: {
    countHead: 'Dispute a count',
    lineHead: 'Dispute a line',
    type: 'Which container type?',
    claimed: 'How many do you say it should be?',
    tooMuch: 'How much of it is too much?',
    same: 'That is what the book says already.',
    countGap: (by: number) => `${gap(by)} than counted.`,
    held: (by: number, amount: string, currency: string) =>
      `${gap(by)}. ${formatMoney(amount, currency)} is held back until this is decided.`,
    heldAmount: (amount: string, currency: string) =>
      `${formatMoney(amount, currency)} is held back until this is decided.`,
    onlyFewer: (quantity: number) => `Say a number below ${formatUnits(quantity)}.`,
    onlyMore: (quantity: number) => `Say a number above ${formatUnits(quantity)}.`,
    atMost: (amount: string, currency: string) => `At most ${formatMoney(amount, currency)}.`,
    why: 'Why',
    whyNone: 'Choose a reason',
    shipment: 'On which shipment?',
    shipmentNone: 'Not on a shipment',
    shipmentOption: (reference: string, day: string) => `${reference}, ${formatDay(day, 'date')}`,
    what: 'What happened',
    paper: 'Paper',
    paperHelp: 'A photo or PDF of the signed note, up to 10 MB each.',
    send: 'Send dispute',
    done: 'The dispute is sent. The plant has the next word.',
    declared: (units: number) => `${formatUnits(units)} declared`,
    counted: (units: number) => `${formatUnits(units)} counted`,
    countOf: (reference: string, day: string) => `${reference}, counted on ${formatDay(day, 'date')}`,
    lane: (from: string, to: string) => `${from} → ${to}`,
    line: (it: LineSubject) => {
      const quantity = it.way === null ? '' : `: ${statements.unitsOfKind(it.quantity, it.typeKind ?? '')}`;
      return `${statements.component[it.component]}${quantity}`;
    },
    unitDays: (quantity: number) => `${formatUnits(quantity)} unit-days`,
    already: 'This is in dispute already.',
    openIt: 'Open the dispute',
    blocked: {
      'objection over': (until: string) =>
        `Objections to this statement were possible until ${formatDay(until)}, so its lines stand. You can still dispute the count behind them: open its shipment.`,
      confirmed:
        'Your company has confirmed this statement, so its lines stand. You can still dispute the count behind them: open its shipment.',
    },
    backToShipment: (reference: string) => `Shipment ${reference}`,
    backToStatement: (month: string) => `Statement, ${formatMonth(month)}`,
  },
  mail: {
    subject: 'A dispute has moved on',
    news: 'There is news in a dispute. Read the thread and answer here:',
    step: {
      opened: (company: string) =>
        `${company} disputes what the book says. Read what they say, with their papers, and answer here:`,
      asked: (company: string) =>
        `${company} asks for more before it decides your dispute. Read the question and answer here:`,
      answered: (company: string) => `${company} has answered in a dispute. Read the thread here:`,
      accepted: (company: string) =>
        `${company} has accepted your dispute in whole. The correction is posted; read it here:`,
      'accepted in part': (company: string) =>
        `${company} has accepted your dispute in part. The correction is posted; read it here:`,
      declined: (company: string) => `${company} has declined your dispute. Read the reason here:`,
      withdrawn: (company: string) => `${company} has withdrawn its dispute. The thread stays here:`,
    },
  },
} as const;
