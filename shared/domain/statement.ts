import { assess, type Assessment, type AssessmentInput } from './assessment';
import { firstDayOfMonth, lastDayOfMonth } from './calendar';
import { compare, isZero, roundToMinor, subtract, sum } from './money';
import { chargesOf } from './statement/charges';
import { type Charge, type LineComponent } from './statement/components';
import { type Billed, correctionsOf } from './statement/corrections';
import { causesOf, type DatedEvent, datedEvents, lateEvents } from './statement/late';
import { type Part, partsOf } from './statement/parts';
import { type Forfeit, forfeitsOf, type TaxBasis, type TaxRow, taxRows } from './statement/tax';

export { type LineComponent, lineComponents } from './statement/components';
export { type Part } from './statement/parts';
export { type TaxBasis, type TaxRow, type TaxTreatment } from './statement/tax';

export type StatementLine = Charge & {
  /** Earlier than the statement's month for a correction. */
  accountMonth: string;
  /** For a correction: what was billed and corrected before, what the month comes to now, the events behind it. */
  correction: { billed: string; now: string; causes: string[] } | null;
  /** For a credit: which one, why, and for what it is. */
  credit: { id: string; reason: string; of: LineComponent | null } | null;
  /** What the amount was made of, where one rate alone does not say it. */
  parts: Part[];
};

/** What an earlier statement of the partner said; all that a later one needs of it. */
export type EarlierStatement = {
  month: string;
  taxBasis: TaxBasis;
  lines: readonly (Billed & { credit: { id: string } | null })[];
  forfeits: readonly Forfeit[];
  /** Events that it took in, in its month or late. */
  eventIds: readonly string[];
};

export type Credit = {
  id: string;
  typeCode: string | null;
  /** Negative: it lowers what is payable. */
  amount: string;
  reason: string;
  of: LineComponent | null;
};

export type StatementInput = {
  month: string;
  taxBasis: TaxBasis;
  /** What is known now; `from` and `to` come from the month. */
  known: Omit<AssessmentInput, 'from' | 'to'>;
  earlier: readonly EarlierStatement[];
  /** Closed months before this one on which events bear, whether or not they had a statement. */
  closedMonths: readonly string[];
  credits: readonly Credit[];
};

export type Statement = {
  assessment: Assessment;
  lines: StatementLine[];
  forfeits: Forfeit[];
  taxRows: TaxRow[];
  payable: string;
  tax: string;
  total: string;
  /** Events of the month, and late ones of months before. */
  eventIds: string[];
  lateEventIds: string[];
};

/**
 * The statement of one partner and one closed month (RULES 4): the month's own lines, what earlier closed months
 * must be corrected by, credits not yet given, and tax. Nothing is billed twice and nothing is forgotten: all lines
 * of an account month over all statements add up to that month assessed with what is known. Refuses as `assess` does.
 */
export function reckonStatement(input: StatementInput): Statement {
  const { month, known, earlier } = input;
  const { currency } = known;
  const assessment = assessMonth(known, month);
  const dated = datedEvents(known.events);
  const stated = new Set(earlier.flatMap((statement) => statement.eventIds));
  const late = lateEvents(dated, { month, stated });
  const corrected = [...input.closedMonths]
    .sort()
    .map((accountMonth) => correct(input, { accountMonth, late }));
  const own: StatementLine[] = chargesOf(assessment).map((charge) => ({
    ...charge,
    accountMonth: month,
    correction: null,
    credit: null,
    parts: partsOf(charge, { known, assessment }),
  }));
  const lines = [...own, ...corrected.flatMap(({ lines: each }) => each), ...creditLines(input)];
  const ownForfeits = forfeitsOf(assessment.lines, { accountMonth: month, currency });
  const forfeits = [...ownForfeits, ...corrected.flatMap((each) => each.forfeits)].filter(
    ({ amount }) => !isZero(amount),
  );
  const rows = taxOfAll(input, { lines, forfeits });
  const payable = roundToMinor(sum(lines.map((line) => line.amount)), currency);
  const tax = roundToMinor(sum(rows.map((row) => row.tax)), currency);
  return {
    assessment,
    lines,
    forfeits,
    taxRows: rows,
    payable,
    tax,
    total: roundToMinor(sum([payable, tax]), currency),
    eventIds: dated.filter((event) => event.month === month).map((event) => event.id),
    lateEventIds: late.map((event) => event.id),
  };
}

const assessMonth = (known: StatementInput['known'], month: string): Assessment =>
  assess({ ...known, from: firstDayOfMonth(month), to: lastDayOfMonth(month) });

/** Assesses a closed month again and compares it with all that earlier statements said of it. */
function correct(
  { known, earlier }: StatementInput,
  { accountMonth, late }: { accountMonth: string; late: readonly DatedEvent[] },
): { lines: StatementLine[]; forfeits: Forfeit[] } {
  const { currency } = known;
  const now = assessMonth(known, accountMonth);
  const billed = earlier.flatMap((statement) => statement.lines);
  const corrections = correctionsOf({ accountMonth, now: chargesOf(now), currency }, billed);
  const lines = corrections.map(({ billed: before, now: after, ...charge }) => ({
    ...charge,
    correction: { billed: before, now: after, causes: causesOf(late, charge) },
    credit: null,
    parts: [],
  }));
  const saidOf = (typeCode: string) =>
    earlier
      .flatMap((statement) => statement.forfeits)
      .filter((forfeit) => forfeit.accountMonth === accountMonth && forfeit.typeCode === typeCode)
      .map((forfeit) => forfeit.amount);
  const forfeits = allTypes(now, earlier).map(({ typeCode, amount }) => ({
    accountMonth,
    typeCode,
    amount: roundToMinor(subtract(amount, sum(saidOf(typeCode))), currency),
  }));
  return { lines, forfeits };
}

/** Forfeits now by type, with 0 for a type that an earlier statement knew and the new assessment no longer shows. */
function allTypes(now: Assessment, earlier: readonly EarlierStatement[]): Forfeit[] {
  const accountMonth = now.from.slice(0, 7);
  const forfeits = forfeitsOf(now.lines, { accountMonth, currency: now.currency });
  const shown = new Set(forfeits.map((forfeit) => forfeit.typeCode));
  const gone = new Set(
    earlier
      .flatMap((statement) => statement.forfeits)
      .filter((forfeit) => forfeit.accountMonth === accountMonth && !shown.has(forfeit.typeCode))
      .map((forfeit) => forfeit.typeCode),
  );
  return [...forfeits, ...[...gone].map((typeCode) => ({ accountMonth, typeCode, amount: '0' }))];
}

/** Credits that stand in no earlier statement. */
function creditLines({ month, credits, earlier, known }: StatementInput): StatementLine[] {
  const given = new Set(earlier.flatMap((statement) => statement.lines).map((line) => line.credit?.id));
  return credits
    .filter((credit) => !given.has(credit.id) && compare(credit.amount, '0') !== 0)
    .map(({ id, typeCode, amount, reason, of }) => ({
      component: 'credit',
      typeCode,
      rate: null,
      quantity: 0,
      amount: roundToMinor(amount, known.currency),
      accountMonth: month,
      correction: null,
      credit: { id, reason, of },
      parts: [],
    }));
}

/** A correction is taxed as its month was; a month that had no statement, as this one. */
function taxOfAll(
  { month, taxBasis, earlier, known }: StatementInput,
  { lines, forfeits }: { lines: readonly StatementLine[]; forfeits: readonly Forfeit[] },
): TaxRow[] {
  const basisOf = new Map(earlier.map((statement) => [statement.month, statement.taxBasis]));
  const months = [
    ...new Set([month, ...lines.map((line) => line.accountMonth), ...forfeits.map((f) => f.accountMonth)]),
  ];
  const taxed = months.map((each) => ({
    basis: (each === month ? undefined : basisOf.get(each)) ?? taxBasis,
    charges: lines
      .filter((line) => line.accountMonth === each)
      .map(({ component, amount, credit }) => ({ component, amount, creditFor: credit?.of ?? null })),
    forfeited: forfeits.filter((forfeit) => forfeit.accountMonth === each).map((forfeit) => forfeit.amount),
  }));
  return taxRows(taxed, known.currency);
}
