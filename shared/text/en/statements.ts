import type { LineComponent } from '../../domain/statement';
import { formatAmount, formatDay, formatDecimal, formatMonth, formatUnits } from '../format';
import { plural } from '../plural';

const component: Record<LineComponent, string> = {
  'deposits asked': 'Deposits asked',
  'deposits released': 'Deposits released',
  'daily fee': 'Daily fee',
  lost: 'Lost',
  'found again': 'Found again',
  damage: 'Damage',
  cleaning: 'Cleaning',
  credit: 'Credit',
};

const nouns: Record<string, { one: string; other: string }> = {
  tote: { one: 'tote', other: 'totes' },
  lid: { one: 'lid', other: 'lids' },
  pallet: { one: 'pallet', other: 'pallets' },
  box: { one: 'box', other: 'boxes' },
  rack: { one: 'rack', other: 'racks' },
};
const anyUnit = { one: 'unit', other: 'units' };

const lowered = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);

export const statements = {
  head: 'Statements',
  component,
  correctionTo: (accountMonth: string, of: LineComponent) =>
    `Correction to ${formatMonth(accountMonth)}: ${lowered(component[of])}`,
  unitsOfKind: (units: number, kind: string) =>
    `${formatUnits(units)} ${plural(units, nouns[kind] ?? anyUnit)}`,
  reckoned: {
    at: (units: string, each: string, currency: string) => `${units} at ${formatAmount(each, currency)}`,
    asked: (units: string) => `${units}, each at the deposit in force on its day`,
    filled: (units: number) =>
      `${formatUnits(units)} made up for returns beyond what was held and ask no deposit`,
    released: (units: string) => `${units}, oldest issues first, each at the rate it was asked at`,
    fee: (unitDays: number, rate: string, freeDays: number | null) =>
      freeDays === null
        ? `${formatUnits(unitDays)} unit-days beyond the free days at ${formatDecimal(rate)}`
        : `${formatUnits(unitDays)} unit-days beyond ${formatUnits(freeDays)} ${plural(freeDays, { one: 'day', other: 'days' })} at ${formatDecimal(rate)}`,
    lost: (units: string) => `${units}, residual value less the deposit that each carried`,
    lostAt: (units: string, residual: string, deposit: string) =>
      `${units} at ${formatDecimal(residual)} residual value less ${formatDecimal(deposit)} deposit`,
    found: (units: string) => `${units} found; the charge is given back for those found in time`,
    fees: (units: string) => `${units}, each at the fee in force on its day`,
    late: 'recorded after the month was closed',
  },
  kind: {
    issued: 'issued',
    returned: 'returned',
    lost: 'lost',
    found: 'found again',
    damaged: 'damaged',
    cleaned: 'to be cleaned',
    corrected: 'correction',
  },
  treatment: {
    excluded: 'deposits left out, taxed when not returned',
    included: 'deposits taxed when asked, adjusted when returned',
  },
  taxNotice:
    'Tax on returnable packaging differs by country. Ask a licensed adviser before you book these figures.',
  silence: (day: string) => `No answer by ${formatDay(day, 'date')} counts as confirmed.`,
  document: {
    fileName: (number: string) => `statement-${number}.xlsx`,
    draftFileName: (number: string) => `draft-statement-${number}.xlsx`,
    monthFileName: (month: string) => `statements-${month}.zip`,
    title: (month: string) => `Statement ${formatMonth(month)}`,
    draft: 'Draft, not issued',
    issued: (day: string) => `Issued ${formatDay(day)}`,
    page: 'Page &P of &N',
    sheet: {
      summary: 'Summary',
      containers: 'Containers',
      movements: 'Movements',
      money: 'Money',
      corrections: 'Corrections',
      differences: 'Open differences',
      terms: 'Terms',
    },
    partner: 'Partner',
    operator: 'Operator',
    number: 'Statement',
    period: 'Period',
    periodOf: (from: string, to: string) => `${formatDay(from)} to ${formatDay(to)}`,
    currency: 'Currency',
    state: 'State',
    answerBy: 'Answer by',
    fingerprint: 'SHA-256 of the content',
    what: 'What',
    corrections: 'Corrections of closed months',
    payable: 'Payable',
    taxAt: (rate: string) => `Tax ${formatDecimal(rate)} %`,
    taxFees: 'Daily, damage and cleaning fees',
    taxDeposits: { excluded: 'Deposits kept for losses', included: 'Deposits asked less released' },
    taxBase: 'Taxable',
    tax: 'Tax',
    total: 'Payable with tax',
    sum: 'Sum',
    type: 'Type',
    name: 'Name',
    opening: 'Opening',
    issuedUnits: 'Issued',
    returned: 'Returned',
    lost: 'Lost',
    found: 'Found',
    closing: 'Closing',
    overReturned: 'Returned beyond held',
    heldFor: {
      '0-14': 'Held to 14 days',
      '15-30': '15 to 30',
      '31-60': '31 to 60',
      '61-90': '61 to 90',
      'over 90': 'over 90',
    },
    depositOpening: 'Deposits held before',
    depositAsked: 'Asked',
    depositReleased: 'Released',
    depositKept: 'Kept for losses',
    depositAgain: 'Taken up again',
    depositClosing: 'Deposits held after',
    day: 'Day',
    movement: 'Movement',
    units: 'Units',
    reference: 'Shipment',
    cause: 'Cause',
    bearsOn: 'Bears on',
    line: 'Line',
    reckonedFrom: 'Reckoned from',
    quantity: 'Quantity',
    rate: 'Rate',
    amount: 'Amount',
    month: 'Month',
    billed: 'Billed so far',
    now: 'Comes to now',
    difference: 'Correction',
    openedOn: 'Since',
    declared: 'Declared',
    counted: 'Counted',
    open: 'Open',
    atStake: 'At stake',
    validFrom: 'From',
    deposit: 'Deposit',
    replacement: 'Replacement value',
    freeDays: 'Free days',
    dailyFee: 'Daily fee',
    lostAfterDays: 'Lost after days',
    usefulLifeMonths: 'Useful life, months',
    residualFloorPct: 'Residual floor, %',
    damageFee: 'Damage fee',
    cleaningFee: 'Cleaning fee',
    recoveryDays: 'Recovery days',
    none: 'None in this month.',
  },
  mail: {
    issuedSubject: (month: string) => `Statement for ${formatMonth(month)}`,
    issuedText: (operator: string, month: string, total: string) =>
      `${operator} has issued the statement for ${formatMonth(month)}: ${total} payable with tax. Check it, confirm it, or dispute the lines that you see otherwise:`,
    issuedUntil: (day: string) =>
      `Please answer by ${formatDay(day, 'weekday')}. No answer by then counts as confirmed.`,
    reminderSubject: (month: string) => `Statement for ${formatMonth(month)} waits for your answer`,
    reminderText: (month: string, day: string) =>
      `The statement for ${formatMonth(month)} has no answer yet. Without one by ${formatDay(day, 'weekday')} it counts as confirmed:`,
  },
};
