import { aReceipt, aShipment, matched, offeredPairs, outcomeFor, totes } from './reconciliation-papers';

describe('same reference', () => {
  test.each(['em-104300', 'EM104300', 'EM 104 300', '104300', ' EM-00104300 ', 'em/104300'])(
    'written "%s" is the same',
    (ref) => {
      const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', ref })]);
      expect(matched(outcome)).toEqual(['same reference: S1 – R1']);
    },
  );

  test('holds after the date window, for the reference is evidence enough', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', date: '2026-03-30' })]);
    expect(matched(outcome)).toEqual(['same reference: S1 – R1']);
  });

  test('on the day the shipment left is in time, the day before is not', () => {
    const on = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', date: '2026-03-10' })]);
    const before = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', date: '2026-03-09' })]);
    expect(matched(on)).toEqual(['same reference: S1 – R1']);
    expect(before).toMatchObject({ matches: [], suggestions: [], overdue: ['S1'], unannounced: ['R1'] });
  });

  test('of a reference used twice, the shipment in the window and with the contents is meant', () => {
    const shipments = [
      aShipment({ id: 'S1', date: '2026-02-01' }),
      aShipment({ id: 'S2', date: '2026-03-10' }),
      aShipment({ id: 'S3', date: '2026-03-10', lines: totes(16) }),
    ];
    expect(matched(outcomeFor(shipments, [aReceipt({ id: 'R1' })]))).toEqual(['same reference: S2 – R1']);
  });

  test('a reference on two equal shipments is offered for both', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' }), aShipment({ id: 'S2' })], [aReceipt({ id: 'R1' })]);
    expect(outcome.matches).toEqual([]);
    expect(offeredPairs(outcome)).toEqual([
      ['S1', 'R1'],
      ['S2', 'R1'],
    ]);
  });

  test('contents that differ widely are matched and shown as differences when nothing else is near', () => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', lines: totes(20) })]);
    expect(outcome.matches[0]).toMatchObject({
      rule: 'same reference',
      differences: [{ type: 'TOTE', declared: 400, counted: 20, difference: -380 }],
    });
  });

  test('two lines of one type count together', () => {
    const outcome = outcomeFor(
      [aShipment({ id: 'S1', lines: [...totes(150), ...totes(250)] })],
      [aReceipt({ id: 'R1' })],
    );
    expect(outcome.matches[0]?.differences).toEqual([]);
  });

  test('a mistyped reference that hits another real one goes to the near shipment with its contents', () => {
    const shipments = [
      aShipment({ id: 'S1', ref: 'EM-104301', lines: totes(400) }),
      aShipment({ id: 'S2', ref: 'EM-104302', lines: [{ type: 'RACK', quantity: 12 }] }),
    ];
    const receipts = [
      aReceipt({ id: 'R1', ref: 'EM-104301' }),
      aReceipt({ id: 'R2', ref: 'EM-104301', lines: [{ type: 'RACK', quantity: 12 }] }),
    ];
    expect(matched(outcomeFor(shipments, receipts))).toEqual([
      'same reference: S1 – R1',
      'near reference: S2 – R2',
    ]);
    expect(matched(outcomeFor(shipments, receipts.slice(1)))).toEqual(['near reference: S2 – R2']);
  });
});

describe('combined delivery', () => {
  const shipments = [
    aShipment({ id: 'S1', ref: 'EM-104301', lines: totes(96) }),
    aShipment({ id: 'S2', ref: 'EM-104302', lines: totes(48) }),
  ];

  test.each([
    'EM-104301 + EM-104302',
    'EM-104301+104302',
    'EM-104301/EM-104302',
    'em 104301, em 104302',
    'EM-104301 & EM-104302',
    'em104301 and em104302',
    'EM-104301 EM-104302',
    'EM 104301 EM 104302',
    '104302 104301',
    'EM-104 301 / EM-104 302',
  ])('"%s" names both', (ref) => {
    const outcome = outcomeFor(shipments, [aReceipt({ id: 'R1', ref, lines: totes(144) })]);
    expect(matched(outcome)).toEqual(['combined delivery: S1 S2 – R1']);
    expect(outcome.matches[0]?.differences).toEqual([]);
  });

  test('one of the two mistyped is read when the sum fits', () => {
    const receipt = aReceipt({ id: 'R1', ref: 'EM-104301 + EM-14302', lines: totes(144) });
    expect(matched(outcomeFor(shipments, [receipt]))).toEqual(['combined delivery: S1 S2 – R1']);
    expect(outcomeFor(shipments, [{ ...receipt, lines: totes(96) }]).matches).toEqual([]);
  });

  test('two receipts that read alike as both, days apart, are rivals; a day apart they are one', () => {
    const mistyped = (id: string, date: string) =>
      aReceipt({ id, date, ref: 'EM-104301 + EM-14302', lines: totes(144) });
    const apart = [mistyped('R1', '2026-03-12'), mistyped('R2', '2026-03-15')];
    expect(outcomeFor(shipments, apart)).toMatchObject({ matches: [], unannounced: ['R1', 'R2'] });
    const together = [mistyped('R1', '2026-03-12'), mistyped('R2', '2026-03-13')];
    expect(outcomeFor(shipments, together).duplicates).toEqual([{ receipt: 'R2', of: 'R1' }]);
  });

  test('entered twice, the later is the duplicate', () => {
    const receipt = aReceipt({ id: 'R1', ref: 'EM-104301 + EM-104302', lines: totes(144) });
    const outcome = outcomeFor(shipments, [{ ...receipt, id: 'R2', date: '2026-03-13' }, receipt]);
    expect(matched(outcome)).toEqual(['combined delivery: S1 S2 – R1']);
    expect(outcome.duplicates).toEqual([{ receipt: 'R2', of: 'R1' }]);
  });
});

describe('other site', () => {
  const elsewhere = aReceipt({ id: 'R1', to: 'SUNDHOLM' });

  test('the same reference and contents are matched', () => {
    expect(matched(outcomeFor([aShipment({ id: 'S1' })], [elsewhere]))).toEqual(['other site: S1 – R1']);
  });

  test('booked as sent from the other plant is matched', () => {
    const receipt = aReceipt({ id: 'R1', from: 'OSTREL' });
    expect(matched(outcomeFor([aShipment({ id: 'S1' })], [receipt]))).toEqual(['other site: S1 – R1']);
  });

  test('a few fewer at another site are offered, other contents are not', () => {
    const few = outcomeFor([aShipment({ id: 'S1' })], [{ ...elsewhere, lines: totes(396) }]);
    expect(few.matches).toEqual([]);
    expect(offeredPairs(few)).toEqual([['S1', 'R1']]);
    expect(outcomeFor([aShipment({ id: 'S1' })], [{ ...elsewhere, lines: totes(40) }]).suggestions).toEqual(
      [],
    );
  });

  test('is not matched after the window, from another pad, or with both sites different', () => {
    for (const receipt of [
      { ...elsewhere, date: '2026-03-21' },
      { ...elsewhere, ref: 'DN-104300' },
      { ...elsewhere, from: 'OSTREL' },
    ])
      expect(outcomeFor([aShipment({ id: 'S1' })], [receipt])).toMatchObject({
        matches: [],
        suggestions: [],
      });
  });
});

describe('near reference', () => {
  test.each([
    ['dropped', 'EM-10430'],
    ['dropped in the middle', 'EM-10300'],
    ['changed', 'EM-104350'],
    ['swapped', 'EM-140300'],
    ['look-alikes', 'EM-1O43OO'],
    ['changed, the prefix left out', '104800'],
    ['dropped, in lower case', 'em 14300'],
  ])('one character %s: %s', (_, ref) => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', ref })]);
    expect(matched(outcome)).toEqual(['near reference: S1 – R1']);
  });

  test.each([
    ['two characters changed', { ref: 'EM-105400' }],
    ['other contents', { ref: 'EM-104350', lines: totes(150) }],
    ['another lane', { ref: 'EM-104350', to: 'SUNDHOLM' }],
    ['a day after the window', { ref: 'EM-104350', date: '2026-03-21' }],
    ['a day before it left', { ref: 'EM-104350', date: '2026-03-09' }],
  ])('%s: neither matched nor offered', (_, given) => {
    const outcome = outcomeFor([aShipment({ id: 'S1' })], [aReceipt({ id: 'R1', ...given })]);
    expect(outcome).toMatchObject({ matches: [], suggestions: [], overdue: ['S1'], unannounced: ['R1'] });
  });

  test('on the last day of the window it is matched', () => {
    const receipt = aReceipt({ id: 'R1', ref: 'EM-104350', date: '2026-03-20' });
    expect(matched(outcomeFor([aShipment({ id: 'S1' })], [receipt]))).toEqual(['near reference: S1 – R1']);
  });

  test('two shipments as near and alike are both offered, and each names the other', () => {
    const outcome = outcomeFor(
      [aShipment({ id: 'S1', ref: 'EM-104301' }), aShipment({ id: 'S2', ref: 'EM-104302' })],
      [aReceipt({ id: 'R1', ref: 'EM-104303' })],
    );
    expect(outcome.matches).toEqual([]);
    expect(outcome.suggestions.map(({ rule }) => rule)).toEqual(['near reference', 'near reference']);
    expect(outcome.suggestions.find(({ shipments }) => shipments[0] === 'S1')?.why).toContain('EM-104302');
  });

  test('the same contents win over like ones', () => {
    const outcome = outcomeFor(
      [
        aShipment({ id: 'S1', ref: 'EM-104301', lines: totes(396) }),
        aShipment({ id: 'S2', ref: 'EM-104302', lines: totes(400) }),
      ],
      [aReceipt({ id: 'R1', ref: 'EM-104303' })],
    );
    expect(matched(outcome)).toEqual(['near reference: S2 – R1']);
    expect(outcome.suggestions).toEqual([]);
  });

  test('two receipts as near to one shipment are both offered', () => {
    const outcome = outcomeFor(
      [aShipment({ id: 'S1' })],
      [aReceipt({ id: 'R1', ref: 'EM-104301' }), aReceipt({ id: 'R2', ref: 'EM-104302' })],
    );
    expect(outcome.matches).toEqual([]);
    expect(offeredPairs(outcome)).toEqual([
      ['S1', 'R1'],
      ['S1', 'R2'],
    ]);
  });
});
