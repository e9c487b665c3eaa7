import fc from 'fast-check';

import type { AssessmentEvent, AssessmentInput, AssessmentTerms } from '@/shared/domain/assessment';

import { Impossible, secondReading } from './assessment-second-reading';

/** Random histories of one partner over about half a year, with a period somewhere inside. */

const FIRST = Date.UTC(2025, 10, 1);
const dateOf = (offset: number) => new Date(FIRST + offset * 86_400_000).toISOString().slice(0, 10);
const LAST_OFFSET = 180;

const amounts: Record<string, { deposit: string[]; replacement: string[] }> = {
  EUR: { deposit: ['0', '4.50', '2.5', '60'], replacement: ['18.00', '95.55', '3', '640.01'] },
  JPY: { deposit: ['0', '450', '1200'], replacement: ['1801', '95', '64000'] },
  TND: { deposit: ['0.000', '4.505', '11.25'], replacement: ['18.001', '95.5', '640'] },
};

const fees = ['0', '0.03', '0.0335', '1.1', '0.125', '3.7'];

const termsOf = (currency: string, containerType: string, validFrom: string): fc.Arbitrary<AssessmentTerms> =>
  fc.record({
    containerType: fc.constant(containerType),
    validFrom: fc.constant(validFrom),
    deposit: fc.constantFrom(...(amounts[currency]?.deposit ?? [])),
    replacement: fc.constantFrom(...(amounts[currency]?.replacement ?? [])),
    freeDays: fc.constantFrom(0, 3, 7, 14, 30),
    dailyFee: fc.constantFrom(...fees),
    lostAfterDays: fc.constantFrom(null, 0, 5, 20, 45, 90),
    usefulLifeMonths: fc.constantFrom(1, 24, 37, 60),
    residualFloorPct: fc.constantFrom('0', '12.5', '20', '100'),
    damageFee: fc.constantFrom('0', '3.205', '12.755'),
    cleaningFee: fc.constantFrom('0', '0.333', '0.4'),
    recoveryDays: fc.constantFrom(0, 5, 30, 90),
  });

const historyOfType = (currency: string, containerType: string) =>
  fc.uniqueArray(fc.integer({ min: 1, max: LAST_OFFSET }), { maxLength: 3 }).chain((later) => {
    const starts = fc.shuffledSubarray([-400, ...later], { minLength: later.length + 1 });
    return starts.chain((offsets) =>
      fc.record({
        terms: fc.tuple(...offsets.map((offset) => termsOf(currency, containerType, dateOf(offset)))),
        inServiceFrom: fc.integer({ min: -900, max: 60 }).map(dateOf),
        events: fc.array(rawEvent, { maxLength: 40, size: 'max' }),
      }),
    );
  });

/** Weighted so that most histories hold, lose and find something; found comes late, when something may be lost. */
const kinds = fc.constantFrom(
  ...(['issued', 'issued', 'issued', 'issued', 'returned', 'returned', 'damaged', 'cleaned'] as const),
  ...(['lost', 'lost', 'found', 'found'] as const),
);
const rawEvent = fc.record({
  kind: kinds,
  early: fc.noBias(fc.integer({ min: 0, max: LAST_OFFSET })),
  late: fc.noBias(fc.integer({ min: LAST_OFFSET / 3, max: LAST_OFFSET })),
  quantity: fc.integer({ min: 1, max: 6 }),
  /** Signed change by a correction, taken back to undoing the event where it goes below; null for none. */
  change: fc.option(fc.integer({ min: -9, max: 6 }), { freq: 3 }),
  correctedAfter: fc.integer({ min: 0, max: 60 }),
});
type RawEvent = typeof rawEvent extends fc.Arbitrary<infer Event> ? Event : never;

function eventsOf(containerType: string, raw: readonly RawEvent[]): AssessmentEvent[] {
  return raw.flatMap(({ early, late, kind, quantity: units, change, correctedAfter }, index) => {
    const id = `${containerType}-${index}`;
    const offset = kind === 'found' ? late : early;
    const quantity = kind === 'issued' ? 2 * units : units;
    const event: AssessmentEvent = { id, date: dateOf(offset), containerType, kind, quantity };
    const signed = change === null ? 0 : Math.max(change, -quantity);
    if (signed === 0) return [event];
    const date = dateOf(offset + correctedAfter);
    return [
      event,
      { id: `${id}c`, date, containerType, kind: 'corrected' as const, corrects: id, quantity: signed },
    ];
  });
}

/** Anything that can be written down, possible or not. */
export const anyHistory = (options: { types: number }): fc.Arbitrary<AssessmentInput> =>
  fc
    .record({
      currency: fc.constantFrom('EUR', 'JPY', 'TND'),
      types: fc.integer({ min: 1, max: options.types }),
      start: fc.noBias(fc.integer({ min: 0, max: LAST_OFFSET - 40 })),
      length: fc.noBias(fc.integer({ min: 0, max: 45 })),
    })
    .chain(({ currency, types, start, length }) =>
      fc
        .tuple(...Array.from({ length: types }, (_, n) => historyOfType(currency, `TYPE-${n + 1}`)))
        .map((parts) => ({
          currency,
          from: dateOf(start),
          to: dateOf(start + length),
          terms: parts.flatMap((part) => part.terms),
          containerTypes: parts.map((part, n) => ({
            code: `TYPE-${n + 1}`,
            inServiceFrom: part.inServiceFrom,
          })),
          events: parts.flatMap((part, n) => eventsOf(`TYPE-${n + 1}`, part.events)),
        })),
    );

/** The history without what could not have happened: more lost than held, more found than lost. */
export function madePossible(input: AssessmentInput): AssessmentInput {
  try {
    // Read to the very end, so that a later period sees no impossible event either.
    secondReading({ ...input, to: dateOf(LAST_OFFSET) });
    return input;
  } catch (error) {
    if (!(error instanceof Impossible)) throw error;
    const { eventId } = error;
    const events = input.events.filter(
      (event) => event.id !== eventId && !(event.kind === 'corrected' && event.corrects === eventId),
    );
    return madePossible({ ...input, events });
  }
}

export const possibleHistory = anyHistory({ types: 3 }).map(madePossible);
