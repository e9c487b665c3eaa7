import fc from 'fast-check';

import { assess, type AssessmentEvent, type AssessmentInput, CannotAssess } from '@/shared/domain/assessment';
import { firstDayOfMonth, lastDayOfMonth, monthOf, nextMonth } from '@/shared/domain/calendar';
import { add, compare, sum } from '@/shared/domain/money';
import { type EarlierStatement, reckonStatement, type TaxBasis } from '@/shared/domain/statement';
import { chargesOf } from '@/shared/domain/statement/charges';
import { keyOf } from '@/shared/domain/statement/components';

import { possibleHistory } from '../assessment-histories';

const SEED = 20260404;

/** The histories run over November 2025 to April 2026; corrections of April are dated up to the end of June. */
const months = ['2025-11', '2025-12', '2026-01', '2026-02', '2026-03', '2026-04', '2026-05', '2026-06'];
const taxBasis: TaxBasis = { rate: '25', treatment: 'excluded' };

type Told = EarlierStatement & { payable: string };

/** Events become known in an arbitrary month from their own on, but never a correction before what it corrects. */
function knownFrom(events: readonly AssessmentEvent[], delays: readonly number[]): Map<string, string> {
  const known = new Map<string, string>();
  const at = (date: string, delay: number) => {
    let month = monthOf(date);
    for (let step = 0; step < delay && month < '2026-06'; step += 1) month = nextMonth(month);
    return month;
  };
  events.forEach((event, index) => known.set(event.id, at(event.date, delays[index % delays.length] ?? 0)));
  for (const event of events) {
    if (event.kind !== 'corrected') continue;
    const [own, other] = [known.get(event.id) ?? '', known.get(event.corrects) ?? ''];
    if (own < other) known.set(event.id, other);
  }
  return known;
}

/** Statements month by month, each from what is known by then; a month that is refused has none. */
function statementsOf(input: AssessmentInput, known: Map<string, string>): Told[] {
  const told: Told[] = [];
  months.forEach((month, index) => {
    const events = input.events.filter((event) => (known.get(event.id) ?? '') <= month);
    try {
      const statement = reckonStatement({
        month,
        taxBasis,
        known: { ...input, events },
        earlier: told,
        closedMonths: months.slice(0, index),
        credits: [],
      });
      const { lines, forfeits, payable, eventIds, lateEventIds } = statement;
      told.push({ month, taxBasis, lines, forfeits, payable, eventIds: [...eventIds, ...lateEventIds] });
    } catch (error) {
      if (!(error instanceof CannotAssess)) throw error;
    }
  });
  return told;
}

function sums(entries: readonly [string, string][]): Map<string, string> {
  const all = new Map<string, string>();
  for (const [key, amount] of entries) all.set(key, add(all.get(key) ?? '0', amount));
  for (const [key, amount] of all) if (compare(amount, '0') === 0) all.delete(key);
  return all;
}

const delays = fc.array(fc.constantFrom(0, 0, 0, 1, 2, 4), { minLength: 7, maxLength: 23 });

describe(`corrections, seed ${SEED}`, () => {
  it('what was billed and corrected equals each month assessed with everything known, to the cent', () => {
    let corrections = 0;
    fc.assert(
      fc.property(possibleHistory, delays, (input, late) => {
        const told = statementsOf(input, knownFrom(input.events, late));
        // By the last month everything is known, and what is known is possible: that statement cannot be refused.
        expect(told.at(-1)?.month).toBe(months.at(-1));
        const lines = told.flatMap((statement) => statement.lines);
        corrections += told
          .flatMap((each) => each.lines.filter((line) => line.accountMonth !== each.month))
          .filter((line) => line.component === 'daily fee').length;
        const billed = sums(lines.map((line) => [`${line.accountMonth} ${keyOf(line)}`, line.amount]));
        const everything = months.flatMap((month) =>
          chargesOf(assess({ ...input, from: firstDayOfMonth(month), to: lastDayOfMonth(month) })).map(
            (charge): [string, string] => [`${month} ${keyOf(charge)}`, charge.amount],
          ),
        );
        expect(Object.fromEntries(billed)).toEqual(Object.fromEntries(sums(everything)));
        const payable = sum(everything.map(([, amount]) => amount));
        expect(compare(sum(told.map((statement) => statement.payable)), payable)).toBe(0);
      }),
      { seed: SEED, numRuns: 80 },
    );
    // The histories must have tried the law.
    expect(corrections).toBeGreaterThan(100);
  });

  it('gives none when nothing was learnt, and states no event twice', () => {
    fc.assert(
      fc.property(possibleHistory, (input) => {
        const told = statementsOf(input, knownFrom(input.events, [0]));
        const ids = told.flatMap((statement) => statement.eventIds);
        expect(new Set(ids).size).toBe(ids.length);
        const again = statementsOf(input, new Map(input.events.map((event) => [event.id, '2025-11'])));
        const corrected = again.flatMap((each) =>
          each.lines.filter((line) => line.accountMonth !== each.month),
        );
        expect(corrected).toEqual([]);
      }),
      { seed: SEED, numRuns: 40 },
    );
  });
});
