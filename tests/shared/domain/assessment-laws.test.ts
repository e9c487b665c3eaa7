import fc from 'fast-check';

import { assess, type Assessment, CannotAssess } from '@/shared/domain/assessment';
import { addDays, daysBetween } from '@/shared/domain/calendar';
import { compare, fromMinor, subtract, sum } from '@/shared/domain/money';

import { anyHistory, possibleHistory } from './assessment-histories';
import { Impossible, secondReading } from './assessment-second-reading';

const SEED = 20260301;

function frozen<Value>(value: Value): Value {
  if (typeof value === 'object' && value !== null) Object.values(Object.freeze(value)).forEach(frozen);
  return value;
}

function law(name: string, runs: number, property: fc.IRawProperty<unknown>) {
  it(name, () => {
    fc.assert(property, { seed: SEED, numRuns: runs });
  });
}

type Line = Assessment['lines'][number];

describe(`laws of the assessment, seed ${SEED}`, () => {
  law(
    'it equals the second reading, container by container and day by day',
    400,
    fc.property(possibleHistory, (input) => {
      expect(assess(frozen(input))).toEqual(secondReading(input));
    }),
  );

  law(
    'it refuses what the second reading finds impossible, at the same event',
    300,
    fc.property(anyHistory({ types: 1 }), (input) => {
      expect(verdict(() => assess(input))).toBe(verdict(() => secondReading(input)));
    }),
  );

  law(
    'units and deposit balance on every line, and payable is what the lines add up to',
    150,
    fc.property(possibleHistory, (input) => {
      const { lines, totals } = assess(input);
      for (const { units, deposit } of lines) {
        const open = units.opening + units.issued - units.returned - units.lost + units.found;
        expect(open).toBe(units.closing);
        const held = sum([deposit.opening, deposit.charged, deposit.reinstated]);
        const left = sum([deposit.released, deposit.forfeited, deposit.closing]);
        expect(compare(held, left)).toBe(0);
      }
      const cash = lines.map(({ deposit }) => subtract(deposit.charged, deposit.released));
      const charges = [totals.dwell, totals.loss, totals.damage, totals.cleaning];
      expect(compare(totals.payable, sum([...cash, ...charges]))).toBe(0);
    }),
  );

  law(
    'neither the order of the events nor what happens after the period changes it',
    150,
    fc.property(possibleHistory, fc.gen(), (input, gen) => {
      const events = gen(fc.shuffledSubarray, input.events, { minLength: input.events.length });
      const terms = gen(fc.shuffledSubarray, input.terms, { minLength: input.terms.length });
      const containerType = input.containerTypes[0]?.code ?? '';
      const later = { date: addDays(input.to, 1), containerType, quantity: 1000 };
      const after = [
        { ...later, id: 'after-1', kind: 'lost' as const },
        { ...later, id: 'after-2', kind: 'issued' as const },
        { ...later, id: 'after-3', kind: 'issued' as const, containerType: 'SEEN LATER' },
      ];
      expect(assess({ ...input, terms, events: [...after, ...events] })).toEqual(assess(input));
    }),
  );
});

const verdict = (run: () => unknown): string => {
  try {
    run();
    return 'possible';
  } catch (error) {
    if (error instanceof Impossible || error instanceof CannotAssess) return `refused at ${error.eventId}`;
    throw error;
  }
};

describe(`a period cut in two, seed ${SEED}`, () => {
  law(
    'gives the same units, deposits and losses, the same unit-days, and fees within rounding',
    250,
    fc.property(possibleHistory, fc.nat(44), (input, days) => {
      const cut = addDays(input.from, days % (daysBetween(input.from, input.to) + 1));
      if (cut === input.to) return;
      const whole = assess(input);
      const first = assess({ ...input, to: cut });
      const second = assess({ ...input, from: addDays(cut, 1) });
      expect(second.lines.map(({ containerType }) => containerType)).toEqual(
        whole.lines.map(({ containerType }) => containerType),
      );
      whole.lines.forEach((line, index) => {
        const early = first.lines.find(({ containerType }) => containerType === line.containerType);
        const late = second.lines[index];
        if (late) holdsTogether({ line, early, late, currency: input.currency });
      });
    }),
  );
});

function holdsTogether(of: { line: Line; early: Line | undefined; late: Line; currency: string }) {
  const { line, early, late } = of;
  const parts = early ? [early, late] : [late];
  for (const what of ['issued', 'returned', 'lost', 'found'] as const) {
    expect(parts.reduce((total, part) => total + part.units[what], 0)).toBe(line.units[what]);
  }
  for (const what of ['charged', 'released', 'forfeited', 'reinstated'] as const) {
    expect(
      sameSum(
        line.deposit[what],
        parts.map((part) => part.deposit[what]),
      ),
    ).toBe(true);
  }
  for (const what of ['recovered', 'amount'] as const) {
    expect(
      sameSum(
        line.charges.loss[what],
        parts.map((part) => part.charges.loss[what]),
      ),
    ).toBe(true);
  }
  // A type that first moved after the cut has no line in the first half, and so nothing open at the cut.
  expect((early ?? line).units.opening).toBe(line.units.opening);
  expect(late.units.opening).toBe(early?.units.closing ?? 0);
  expect((early ?? line).deposit.opening).toBe(line.deposit.opening);
  expect(compare(late.deposit.opening, early?.deposit.closing ?? '0')).toBe(0);
  const end = ({ units, deposit, ages }: Line) => [units.closing, units.overReturned, deposit.closing, ages];
  expect(end(late)).toEqual(end(line));
  feesHoldTogether(line, parts, of.currency);
}

const sameSum = (whole: string, parts: string[]) => compare(whole, sum(parts)) === 0;

/** Each of three roundings is off by half a minor unit at most, so whole and parts differ by one at most. */
function feesHoldTogether(line: Line, parts: Line[], currency: string) {
  const apart = (whole: string, pieces: string[]) => subtract(whole, sum(pieces)).replace('-', '');
  const within = (whole: string, pieces: string[]) =>
    expect(compare(apart(whole, pieces), fromMinor(BigInt(1), currency))).toBeLessThanOrEqual(0);
  const atRate = (part: Line, rate: string) => part.charges.dwell.lines.find((each) => each.rate === rate);
  for (const { rate, unitDays, amount } of line.charges.dwell.lines) {
    expect(parts.reduce((total, part) => total + (atRate(part, rate)?.unitDays ?? 0), 0)).toBe(unitDays);
    within(
      amount,
      parts.map((part) => atRate(part, rate)?.amount ?? '0'),
    );
  }
  expect(parts.reduce((total, part) => total + part.charges.dwell.unitDays, 0)).toBe(
    line.charges.dwell.unitDays,
  );
  for (const what of ['damage', 'cleaning'] as const) {
    expect(parts.reduce((total, part) => total + part.charges[what].units, 0)).toBe(line.charges[what].units);
    within(
      line.charges[what].amount,
      parts.map((part) => part.charges[what].amount),
    );
  }
}
