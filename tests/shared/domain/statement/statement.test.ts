import type { AssessmentEvent, AssessmentTerms } from '@/shared/domain/assessment';
import { type EarlierStatement, reckonStatement, type StatementInput } from '@/shared/domain/statement';

const terms: AssessmentTerms = {
  containerType: 'TOTE',
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
type Moved = { date: string; kind: 'issued' | 'returned' | 'lost' | 'damaged'; quantity: number };
const event = (id: string, moved: Moved) => ({ id, containerType: 'TOTE', ...moved });
const input = (
  month: string,
  events: AssessmentEvent[],
  rest: Partial<StatementInput> = {},
): StatementInput => ({
  month,
  taxBasis: { rate: '25', treatment: 'excluded' },
  known: {
    currency: 'EUR',
    terms: [terms],
    containerTypes: [{ code: 'TOTE', inServiceFrom: '2024-09-15' }],
    events,
  },
  earlier: [],
  closedMonths: [],
  credits: [],
  ...rest,
});

const told = (given: StatementInput): EarlierStatement => {
  const statement = reckonStatement(given);
  return {
    month: given.month,
    taxBasis: given.taxBasis,
    lines: statement.lines,
    forfeits: statement.forfeits,
    eventIds: [...statement.eventIds, ...statement.lateEventIds],
  };
};

const february = [event('1', { date: '2026-02-02', kind: 'issued', quantity: 400 })];
const march = [
  event('2', { date: '2026-03-04', kind: 'issued', quantity: 100 }),
  event('3', { date: '2026-03-20', kind: 'returned', quantity: 80 }),
  event('4', { date: '2026-03-25', kind: 'lost', quantity: 12 }),
  event('5', { date: '2026-03-20', kind: 'damaged', quantity: 16 }),
];

describe('lines of a statement', () => {
  const statement = reckonStatement(input('2026-03', [...february, ...march]));
  const line = (component: string) => statement.lines.find((each) => each.component === component);

  it('take deposits, damage and losses apart into units and what each costs', () => {
    expect(line('deposits asked')).toMatchObject({
      amount: '450.00',
      parts: [{ quantity: 100, each: '4.50' }],
    });
    expect(line('damage')).toMatchObject({ amount: '51.20', parts: [{ quantity: 16, each: '3.20' }] });
    // 18 whole months in service on 25 March: 18.00 × (1 − 18/60) = 12.60, less the deposit of 4.50.
    expect(line('lost')).toMatchObject({
      amount: '97.20',
      parts: [{ quantity: 12, each: '8.10', residual: '12.60', deposit: '4.50' }],
    });
  });

  const withTerms = (events: AssessmentEvent[], ...more: AssessmentTerms[]) => {
    const given = input('2026-03', events);
    return reckonStatement({ ...given, known: { ...given.known, terms: [terms, ...more] } });
  };
  const dearer = { ...terms, validFrom: '2026-03-01', deposit: '5.00' };

  it('tell the deposit of lost units apart after a change of terms, as long as the oldest all carried one', () => {
    const mixed = withTerms([...february, ...march], dearer);
    expect(mixed.lines.find((each) => each.component === 'lost')?.parts).toEqual([
      { quantity: 12, each: '8.10', residual: '12.60', deposit: '4.50' },
    ]);
    expect(mixed.lines.find((each) => each.component === 'deposits asked')?.parts).toEqual([
      { quantity: 100, each: '5.00' },
    ]);
  });

  it('say nothing for certain where the units lost on one day carried different deposits', () => {
    // 400 − 80 are left of February: the 330 lost take 10 of March's at 5.00 with them.
    const events = march.map((each) => (each.kind === 'lost' ? { ...each, quantity: 330 } : each));
    const mixed = withTerms([...february, ...events], dearer);
    expect(mixed.lines.find((each) => each.component === 'lost')).toMatchObject({
      // 320 × (12.60 − 4.50) + 10 × (12.60 − 5.00)
      amount: '2668.00',
      parts: [],
    });
  });

  it('add up to the payable of the assessment; tax falls on fees and on deposits that were kept', () => {
    expect(statement.payable).toBe(statement.assessment.totals.payable);
    const fee = line('daily fee')?.amount ?? '';
    expect(statement.taxRows).toEqual([
      expect.objectContaining({ fees: (Number(fee) + 51.2).toFixed(2), deposits: '54.00' }),
    ]);
  });
});

describe('a correction that comes after the close', () => {
  const first = input('2026-02', february);
  const events: AssessmentEvent[] = [
    ...february,
    { id: '9', date: '2026-02-02', containerType: 'TOTE', kind: 'corrected', corrects: '1', quantity: -8 },
  ];

  it('shows in the next statement by month and component, with the event behind it', () => {
    const next = reckonStatement(
      input('2026-03', events, { earlier: [told(first)], closedMonths: ['2026-02'] }),
    );
    // 8 totes: the deposit of 4.50 each, and 13 days beyond the 14 free ones (16 to 28 February) at 0.03.
    const corrections = next.lines.filter((each) => each.accountMonth === '2026-02');
    expect(corrections).toMatchObject([
      {
        component: 'deposits asked',
        quantity: -8,
        amount: '-36.00',
        correction: { billed: '1800.00', now: '1764.00', causes: ['9'] },
      },
      {
        component: 'daily fee',
        quantity: -104,
        amount: '-3.12',
        correction: { billed: '156.00', now: '152.88', causes: ['9'] },
      },
    ]);
    expect(next.lateEventIds).toEqual(['9']);
  });

  it('is not billed again in the statement after', () => {
    const second = input('2026-03', events, { earlier: [told(first)], closedMonths: ['2026-02'] });
    const third = reckonStatement(
      input('2026-04', events, {
        earlier: [told(first), told(second)],
        closedMonths: ['2026-02', '2026-03'],
      }),
    );
    expect(third.lines.filter((each) => each.accountMonth !== '2026-04')).toEqual([]);
  });

  it('is taxed as its month was', () => {
    const next = reckonStatement(
      input('2026-03', events, {
        earlier: [told(first)],
        closedMonths: ['2026-02'],
        taxBasis: { rate: '20', treatment: 'excluded' },
      }),
    );
    expect(next.taxRows.find((row) => row.rate === '25')).toMatchObject({ base: '-3.12', tax: '-0.78' });
  });

  it('bills a closed month that had no statement', () => {
    const next = reckonStatement(input('2026-03', events, { closedMonths: ['2026-01', '2026-02'] }));
    const late = next.lines.filter((each) => each.accountMonth === '2026-02');
    expect(late.map(({ component, amount }) => [component, amount])).toEqual([
      ['deposits asked', '1764.00'],
      ['daily fee', '152.88'],
    ]);
  });
});

describe('a credit', () => {
  const credit = { id: 'c1', typeCode: 'TOTE', amount: '-36', reason: 'signed note', of: 'lost' as const };

  it('stands once, in the first statement after it was given', () => {
    const given = input('2026-02', february, { credits: [credit] });
    expect(reckonStatement(given).lines.at(-1)).toMatchObject({
      component: 'credit',
      amount: '-36.00',
      credit: { id: 'c1', reason: 'signed note' },
    });
    const next = reckonStatement(
      input('2026-03', february, { credits: [credit], earlier: [told(given)], closedMonths: ['2026-02'] }),
    );
    expect(next.lines.filter((each) => each.component === 'credit')).toEqual([]);
  });
});
