import { assess, CannotAssess, type AssessmentEvent, type AssessmentInput } from '@/shared/domain/assessment';

const terms = {
  containerType: 'TOTE-64',
  validFrom: '2026-01-01',
  deposit: '4.50',
  replacement: '18.00',
  freeDays: 14,
  dailyFee: '0.03',
  lostAfterDays: null,
  usefulLifeMonths: 60,
  residualFloorPct: '20',
  damageFee: '3.20',
  cleaningFee: '0.40',
  recoveryDays: 60,
};

const issue = {
  id: 'e1',
  date: '2026-03-02',
  containerType: 'TOTE-64',
  kind: 'issued',
  quantity: 10,
} as const;

const input = (change: Partial<AssessmentInput>): AssessmentInput => ({
  currency: 'EUR',
  from: '2026-03-01',
  to: '2026-03-31',
  terms: [terms],
  containerTypes: [{ code: 'TOTE-64', inServiceFrom: '2024-06-01' }],
  events: [issue],
  ...change,
});

function refusal(of: unknown): Pick<CannotAssess, 'code' | 'eventId' | 'message'> {
  try {
    assess(of);
  } catch (error) {
    if (error instanceof CannotAssess) return error;
    throw error;
  }
  throw new Error('was not refused');
}

type Loose = Record<string, unknown>;
const next = (change: Loose): AssessmentEvent =>
  ({ id: 'e2', date: '2026-03-10', containerType: 'TOTE-64', kind: 'lost', quantity: 1, ...change }) as never;
const correcting = (change: Loose) => next({ kind: 'corrected', corrects: 'e1', quantity: -1, ...change });

const atEvent: [string, string, AssessmentEvent][] = [
  ['more lost than held', 'more lost than held', next({ quantity: 11 })],
  ['lost before anything was issued', 'more lost than held', next({ id: 'e2', date: '2026-03-01' })],
  ['found though nothing was lost', 'more found than lost', next({ kind: 'found' })],
  ['issued before any terms', 'no terms in force', next({ kind: 'issued', date: '2025-12-31' })],
  ['damaged before any terms', 'no terms in force', next({ kind: 'damaged', date: '2025-12-31' })],
  ['cleaned before any terms', 'no terms in force', next({ kind: 'cleaned', date: '2025-12-31' })],
  ['a type that is not listed', 'unknown container type', next({ kind: 'issued', containerType: 'LID-9' })],
  ['a correction of an unknown event', 'correction of nothing', correcting({ corrects: 'e9' })],
  ['a correction of itself', 'correction of nothing', correcting({ corrects: 'e2' })],
  ['a correction of another type', 'correction of another type', correcting({ containerType: 'LID-9' })],
  ['a correction below zero', 'corrected below zero', correcting({ quantity: -11 })],
  ['a correction by 0', 'quantity not whole and positive', correcting({ quantity: 0 })],
  ['a correction by a fraction', 'quantity not whole and positive', correcting({ quantity: -0.5 })],
  ['the same id twice', 'id used twice', next({ id: 'e1', kind: 'issued' })],
  ['a day that is none', 'input not understood', next({ date: '2026-02-30' })],
  ['a kind that is none', 'input not understood', next({ kind: 'borrowed' })],
  ['a correction that names nothing', 'input not understood', next({ kind: 'corrected' })],
  ...[0, -1, 1.5, NaN, Infinity, 1e308, -0, '5', null, undefined, 1_000_000_001].map(
    (quantity): [string, string, AssessmentEvent] => [
      `quantity ${Object.is(quantity, -0) ? '-0' : typeof quantity === 'string' ? `"${quantity}"` : quantity}`,
      'quantity not whole and positive',
      next({ kind: 'issued', quantity }),
    ],
  ),
];

describe('what cannot be is refused and names the event', () => {
  it.each(atEvent)('%s: %s', (_, code, event) => {
    const error = refusal(input({ events: [issue, event] }));
    expect(error.code).toBe(code);
    expect(error.eventId).toBe(event.id);
    expect(error.message).toContain(`Event ${event.id}: `);
  });

  it('a correction of a correction is refused: it names no movement', () => {
    const events = [issue, correcting({}), correcting({ id: 'e3', corrects: 'e2' })];
    expect(refusal(input({ events }))).toMatchObject({ code: 'correction of nothing', eventId: 'e3' });
  });

  it('more found than lost counts what was found before', () => {
    const found = (id: string, quantity: number) => next({ id, kind: 'found', date: '2026-03-12', quantity });
    const events = [issue, next({ quantity: 3 }), found('e3', 2), found('e4', 2)];
    expect(refusal(input({ events }))).toMatchObject({ code: 'more found than lost', eventId: 'e4' });
  });

  it('an event without an id is named by its place', () => {
    const events = [issue, next({ id: undefined })];
    expect(refusal(input({ events }))).toMatchObject({ code: 'input not understood', eventId: 'number 2' });
  });
});

const frames: [string, string, unknown][] = [
  ['a period that ends before it begins', 'period ends before it begins', input({ to: '2026-02-28' })],
  ['a currency without a known minor unit', 'unknown currency', input({ currency: 'ABC' })],
  [
    'a deposit finer than a cent',
    'not whole minor units',
    input({ terms: [{ ...terms, deposit: '4.505' }] }),
  ],
  ['amounts finer than a yen', 'not whole minor units', input({ currency: 'JPY' })],
  [
    'two terms from one day',
    'two terms from the same day',
    input({ terms: [terms, { ...terms, deposit: '5' }] }),
  ],
  ['a fee below 0', 'input not understood', input({ terms: [{ ...terms, dailyFee: '-0.03' }] })],
  ['a fee with an exponent', 'input not understood', input({ terms: [{ ...terms, dailyFee: '3e-2' }] })],
  [
    'a useful life of 0 months',
    'input not understood',
    input({ terms: [{ ...terms, usefulLifeMonths: 0 }] }),
  ],
  [
    'a floor over 100 percent',
    'input not understood',
    input({ terms: [{ ...terms, residualFloorPct: '101' }] }),
  ],
  ['nothing at all', 'input not understood', undefined],
];

describe('what cannot be without an event to blame', () => {
  it.each(frames)('%s: %s', (_, code, given) => {
    expect(refusal(given)).toMatchObject({ code, eventId: null });
  });
});

describe('what looks odd and can be', () => {
  const line = (change: Partial<AssessmentInput>) => assess(input(change)).lines[0];

  it('a correction to exactly zero takes the event back', () => {
    const undone = line({ events: [issue, correcting({ quantity: -10 })] });
    expect(undone?.units).toMatchObject({ issued: 0, closing: 0 });
    expect(undone?.deposit.charged).toBe('0.00');
  });

  it('two corrections are judged by their sum, in whichever order they came', () => {
    const events = [issue, correcting({ quantity: -12 }), correcting({ id: 'e3', quantity: 5 })];
    expect(line({ events })?.units.issued).toBe(3);
  });

  it('a correction after the period reaches back into it', () => {
    expect(line({ events: [issue, correcting({ date: '2026-06-01', quantity: -4 })] })?.units.issued).toBe(6);
  });

  it('returns before any terms carry no money and are no error', () => {
    const early = line({ events: [next({ kind: 'returned', date: '2025-12-01' })] });
    expect(early?.units).toMatchObject({ opening: -1, closing: -1, overReturned: 1 });
  });

  it('returns of a day come before its losses, however they were recorded', () => {
    const events = [issue, next({ quantity: 4 }), next({ id: 'e3', kind: 'returned', quantity: 6 })];
    expect(line({ events })?.units).toMatchObject({ returned: 6, lost: 4, closing: 0 });
  });

  it('one rate written in two ways is one rate, as the earlier terms wrote it', () => {
    const later = { ...terms, validFrom: '2026-03-01', dailyFee: '0.030' };
    const events = [
      { ...issue, date: '2026-02-20' },
      next({ kind: 'issued', date: '2026-03-05', quantity: 2 }),
    ];
    // 10 units from 6 March (26 days), 2 units from 19 March (13 days).
    expect(line({ terms: [later, terms], events })?.charges.dwell).toEqual({
      lines: [{ unitDays: 286, rate: '0.03', amount: '8.58' }],
      unitDays: 286,
      amount: '8.58',
    });
  });

  it('a period of one day and an empty history give no lines and totals of zero', () => {
    const nothing = assess(input({ from: '2026-03-31', events: [] }));
    expect(nothing.lines).toEqual([]);
    expect(nothing.totals).toMatchObject({ depositChange: '0.00', payable: '0.00' });
  });

  it('what is found while more was returned than held makes a layer and leaves the gap to issues', () => {
    const events = [
      issue,
      next({ quantity: 4 }),
      next({ id: 'e3', date: '2026-03-11', kind: 'returned', quantity: 9 }),
      next({ id: 'e4', date: '2026-03-12', kind: 'found', quantity: 2 }),
    ];
    const found = line({ events });
    expect(found?.units).toMatchObject({ found: 2, closing: -1, overReturned: 3 });
    expect(found?.deposit).toMatchObject({ reinstated: '9.00', closing: '9.00' });
    expect(found?.ages).toEqual({ '15-30': 2 });
  });
});
