import { aReceipt, aShipment, matched, offeredPairs, outcomeFor, totes } from './reconciliation-papers';

describe('split delivery', () => {
  const half = (id: string, given = {}) => aReceipt({ id, lines: totes(200), ...given });

  test('two halves entered on one day are a split, not a double entry', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [half('R1'), half('R2')]);
    expect(matched(outcome)).toEqual(['split delivery: S1 – R1 R2']);
    expect(outcome.duplicates).toEqual([]);
  });

  test('unequal parts, one miscounted, are a split', () => {
    const parts = [half('R1', { lines: totes(250) }), half('R2', { lines: totes(147), date: '2026-03-14' })];
    expect(outcomeFor([aShipment({ id: 'S1' })], parts).matches).toMatchObject([
      {
        rule: 'split delivery',
        differences: [{ type: 'TOTE', declared: 400, counted: 397, difference: -3 }],
      },
    ]);
  });

  test('three parts, each another line, are a split', () => {
    const lines = [
      { type: 'TOTE', quantity: 96 },
      { type: 'LID', quantity: 4 },
      { type: 'RACK', quantity: 2 },
    ];
    const parts = lines.map((line, at) => aReceipt({ id: `R${at + 1}`, lines: [line] }));
    expect(matched(outcomeFor([aShipment({ id: 'S1', lines })], parts))).toEqual([
      'split delivery: S1 – R1 R2 R3',
    ]);
  });

  test('one part alone is matched with what is missing as a difference', () => {
    expect(outcomeFor([aShipment({ id: 'S1' })], [half('R1')]).matches).toMatchObject([
      { rule: 'same reference', differences: [{ difference: -200 }] },
    ]);
  });

  test('a second part with a mistyped or without a reference joins when it is exactly what is missing', () => {
    for (const ref of ['EM-104380', null])
      expect(matched(outcomeFor([aShipment({ id: 'S1' })], [half('R1'), half('R2', { ref })]))).toEqual([
        'split delivery: S1 – R1 R2',
      ]);
    const other = half('R2', { ref: null, lines: totes(150) });
    expect(outcomeFor([aShipment({ id: 'S1' })], [half('R1'), other]).unannounced).toEqual(['R2']);
  });
});

describe('double entry', () => {
  const again = (given = {}) => aReceipt({ id: 'R2', date: '2026-03-13', ...given });

  test('two times 400 against 400 a day apart: the later one, in whatever style', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [again({ ref: '104300' }), aReceipt({ id: 'R1' })]);
    expect(matched(outcome)).toEqual(['same reference: S1 – R1']);
    expect(outcome.duplicates).toEqual([{ receipt: 'R2', of: 'R1' }]);
    expect(outcome.unannounced).toEqual([]);
  });

  test('on one day the first by id is kept, R2 before R10', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R10' }), aReceipt({ id: 'R2' })]);
    expect(outcome.duplicates).toEqual([{ receipt: 'R10', of: 'R2' }]);
  });

  test('on one day the first by id is kept, also among UUIDs that grow with time', () => {
    const earlier = '019a2b3c-0000-7a10-8fff-0000000000aa';
    const later = '019a2b3c-0000-7a9f-8000-000000000001';
    const both = [aReceipt({ id: later }), aReceipt({ id: earlier })];
    expect(outcomeFor([aShipment({ id: 'S1' })], both).duplicates).toEqual([{ receipt: later, of: earlier }]);
  });

  test('both with the same miscount are one receipt entered twice', () => {
    const lines = totes(392);
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', lines }), again({ lines })]);
    expect(outcome.duplicates).toEqual([{ receipt: 'R2', of: 'R1' }]);
  });

  test('two days apart it is no double entry: two receipts as good as each other are both offered', () => {
    const outcome = outcomeFor(
      [aShipment({ id: 'S1' })],
      [aReceipt({ id: 'R1' }), again({ date: '2026-03-14' })],
    );
    expect(outcome).toMatchObject({ matches: [], duplicates: [], unannounced: ['R1', 'R2'] });
    expect(offeredPairs(outcome)).toEqual([
      ['S1', 'R1'],
      ['S1', 'R2'],
    ]);
  });

  test('with a mistyped reference both times the first is matched, the second told', () => {
    const ref = 'EM-104380';
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', ref }), again({ ref })]);
    expect(matched(outcome)).toEqual(['near reference: S1 – R1']);
    expect(outcome.duplicates).toEqual([{ receipt: 'R2', of: 'R1' }]);
  });

  test('is told, but its shipment is asked, while a near one with the same contents is missing', () => {
    const shipments = [aShipment({ id: 'S1' }), aShipment({ id: 'S2', ref: 'EM-104380' })];
    const outcome = outcomeFor(shipments, [aReceipt({ id: 'R1' }), again()]);
    expect(outcome).toMatchObject({ matches: [], duplicates: [{ receipt: 'R2', of: 'R1' }] });
    expect(offeredPairs(outcome)).toEqual([
      ['S1', 'R1'],
      ['S2', 'R1'],
    ]);
  });
});

describe('same load', () => {
  const unnamed = aReceipt({ id: 'R1', ref: null });

  test('the only like load of the lane in the window is matched', () => {
    expect(matched(outcomeFor([aShipment({ id: 'S1' })], [unnamed]))).toEqual(['same load: S1 – R1']);
  });

  test('a reference of blanks and signs is none', () => {
    expect(matched(outcomeFor([aShipment({ id: 'S1' })], [{ ...unnamed, ref: ' - ' }]))).toEqual([
      'same load: S1 – R1',
    ]);
  });

  test('on the last day of the window it is matched, a day later not even offered', () => {
    const shipments = [aShipment({ id: 'S1' })];
    expect(matched(outcomeFor(shipments, [{ ...unnamed, date: '2026-03-20' }]))).toEqual([
      'same load: S1 – R1',
    ]);
    expect(outcomeFor(shipments, [{ ...unnamed, date: '2026-03-21' }])).toMatchObject({
      matches: [],
      suggestions: [],
    });
  });

  test('a few units fewer are matched, like contents are offered, others neither', () => {
    const withCount = (n: number) => outcomeFor([aShipment({ id: 'S1' })], [{ ...unnamed, lines: totes(n) }]);
    expect(matched(withCount(394))).toEqual(['same load: S1 – R1']);
    expect(withCount(330).matches).toEqual([]);
    expect(offeredPairs(withCount(330))).toEqual([['S1', 'R1']]);
    expect(withCount(200).suggestions).toEqual([]);
  });

  test('two receipts for one load are both offered', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [unnamed, { ...unnamed, id: 'R2' }]);
    expect(outcome.matches).toEqual([]);
    expect(offeredPairs(outcome)).toEqual([
      ['S1', 'R1'],
      ['S1', 'R2'],
    ]);
  });

  test('a shipment that a stronger rule settles is no rival', () => {
    const shipments = [aShipment({ id: 'S1' }), aShipment({ id: 'S2', ref: 'EM-104777' })];
    const outcome = outcomeFor(shipments, [unnamed, aReceipt({ id: 'R2', ref: 'EM-104777' })]);
    expect(matched(outcome)).toEqual(['same load: S1 – R1', 'same reference: S2 – R2']);
  });

  test('at most three are offered for a receipt, the best first', () => {
    const shipments = [1, 2, 3, 4, 5].map((n) =>
      aShipment({ id: `S${n}`, ref: `EM-20${n}00`, date: `2026-03-0${n}` }),
    );
    const { suggestions } = outcomeFor(shipments, [{ ...unnamed, date: '2026-03-06' }]);
    expect(suggestions.map(({ shipments: [id] }) => id)).toEqual(['S5', 'S4', 'S3']);
    const scores = suggestions.map(({ score }) => score);
    expect([...scores].sort((a, b) => b - a)).toEqual(scores);
    expect(Math.min(...scores)).toBeGreaterThan(0);
    expect(Math.max(...scores)).toBeLessThan(1);
  });

  test('where a lane is used to two days, a load of nine days before is no rival of one of two', () => {
    const days = Array.from({ length: 25 }, (_, n) => n + 1);
    const dated = (n: number) => `2026-02-${String(n).padStart(2, '0')}`;
    const habit = days.map((n) =>
      aShipment({ id: `H${n}`, ref: `EM-3${n}77`, date: dated(n), lines: totes(n) }),
    );
    const counted = days.map((n) =>
      aReceipt({ id: `C${n}`, ref: `EM-3${n}77`, date: dated(n + 2), lines: totes(n) }),
    );
    const rivals = [
      aShipment({ id: 'S1', ref: 'EM-900001', date: '2026-03-03' }),
      aShipment({ id: 'S2', ref: 'EM-700002', date: '2026-03-10' }),
    ];
    expect(outcomeFor(rivals, [unnamed]).matches).toEqual([]);
    const outcome = outcomeFor([...habit, ...rivals], [...counted, unnamed]);
    expect(matched(outcome)).toContain('same load: S2 – R1');
    expect(outcome.overdue).toEqual(['S1']);
  });
});

describe('leftovers', () => {
  test('a shipment is waiting on the last day allowed and overdue the day after', () => {
    const shipments = [
      aShipment({ id: 'S1', date: '2026-03-24' }),
      aShipment({ id: 'S2', date: '2026-03-23' }),
    ];
    expect(outcomeFor(shipments, [])).toMatchObject({ waiting: ['S1'], overdue: ['S2'] });
  });
});
