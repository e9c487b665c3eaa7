import type { ContentLine } from '@/shared/domain/statement/content';
import {
  lineTitle,
  reckonedFrom,
  reckonedTogether,
  workedOut,
  type WordContext,
} from '@/shared/text/statement-words';

/** Groups of three are parted by a narrow space that does not break. */
const spaced = (words: string) => words.replace(/(\d) (?=\d{3}\b)/g, '$1\u202f');

const terms = (containerType: string, rest: object = {}) => ({
  containerType,
  validFrom: '2026-01-01',
  deposit: '4.5',
  replacement: '18',
  freeDays: 14,
  dailyFee: '0.03',
  lostAfterDays: null,
  usefulLifeMonths: 60,
  residualFloorPct: '20',
  damageFee: '3.2',
  cleaningFee: '0.4',
  recoveryDays: 60,
  ...rest,
});
const context: WordContext = {
  currency: 'EUR',
  types: [
    { code: 'TOTE-64', name: 'Tote 600×400×280', kind: 'tote' },
    { code: 'LID', name: 'Lid 1200×800', kind: 'lid' },
  ],
  terms: [terms('TOTE-64')],
};
const line = (given: Partial<ContentLine>): ContentLine => ({
  id: '1',
  component: 'daily fee',
  accountMonth: '2026-11',
  typeCode: 'TOTE-64',
  quantity: 3440,
  rate: null,
  amount: '0.00',
  parts: [],
  correction: null,
  credit: null,
  ...given,
});

describe('what an amount was reckoned from, in words', () => {
  it('for deposits names units and rate, and units that ask none because they made up a gap', () => {
    const asked = line({
      component: 'deposits asked',
      quantity: 400,
      parts: [{ quantity: 392, each: '4.5' }],
    });
    expect(reckonedFrom(asked, context)).toBe(
      '392 totes at 4.50; 8 made up for returns beyond what was held and ask no deposit',
    );
  });

  it('for the daily fee names the free days of its rate, and leaves them open where terms disagree', () => {
    const fee = line({ rate: '0.03' });
    expect(reckonedFrom(fee, context)).toBe(spaced('3 440 unit-days beyond 14 days at 0.03'));
    const disagreeing = { ...context, terms: [terms('TOTE-64'), terms('TOTE-64', { freeDays: 7 })] };
    expect(reckonedFrom(fee, disagreeing)).toBe(spaced('3 440 unit-days beyond the free days at 0.03'));
  });

  it('for a loss names residual value and deposit where they are certain, else the rule', () => {
    const parts = [{ quantity: 12, each: '7.20', residual: '11.70', deposit: '4.50' }];
    expect(reckonedFrom(line({ component: 'lost', quantity: 12, parts }), context)).toBe(
      '12 totes at 11.70 residual value less 4.50 deposit',
    );
    expect(reckonedFrom(line({ component: 'lost', quantity: 1 }), context)).toBe(
      '1 tote, residual value less the deposit that each carried',
    );
  });

  it('for a correction names month and cause', () => {
    const correction = {
      billed: '3.00',
      now: '2.80',
      causes: ['count of EM-103655 put right to 392'],
      eventIds: [],
    };
    const corrected = line({ accountMonth: '2026-10', amount: '-0.20', correction });
    expect(lineTitle(corrected)).toBe('Correction to October 2026: daily fee');
    expect(reckonedFrom(corrected, context)).toBe('count of EM-103655 put right to 392');
    expect(reckonedFrom({ ...corrected, correction: { ...correction, causes: [] } }, context)).toBe(
      'recorded after the month was closed',
    );
    expect(workedOut(corrected, context)).toBe('comes to 2.80 now, 3.00 billed so far: −0.20');
  });

  it('for several types together says the rule of released deposits once', () => {
    const released = [
      line({ component: 'deposits released', quantity: 3360 }),
      line({ component: 'deposits released', quantity: 166, typeCode: 'LID' }),
    ];
    expect(reckonedTogether(released, context)).toBe(
      spaced('3 360 totes, 166 lids, oldest issues first, each at the rate it was asked at'),
    );
  });

  it('tells two types of one kind apart by name', () => {
    const types = [...context.types, { code: 'TOTE-43', name: 'Tote 400×300×280', kind: 'tote' }];
    const lost = line({ component: 'lost', quantity: 2, typeCode: 'TOTE-43' });
    expect(reckonedFrom(lost, { ...context, types })).toContain('2 totes (Tote 400×300×280)');
  });

  it('writes the sum out with its own figures', () => {
    expect(workedOut(line({ rate: '0.03', amount: '103.20' }), context)).toBe(
      spaced('3 440 unit-days × 0.03 = 103.20'),
    );
    const parts = [{ quantity: 16, each: '3.2' }];
    expect(workedOut(line({ component: 'damage', quantity: 16, parts, amount: '51.20' }), context)).toBe(
      '16 totes × 3.20 = 51.20',
    );
  });
});
