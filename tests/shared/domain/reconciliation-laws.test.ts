import fc from 'fast-check';
import { reconcile, type ReconciliationInput } from '@/shared/domain/reconciliation';
import { aMonth } from './reconciliation-papers';

// Few sites, references, types and days, so that papers meet, rival, repeat and miss each other all the time.
const lines = fc.uniqueArray(
  fc.record({
    type: fc.constantFrom('TOTE', 'LID', 'RACK'),
    quantity: fc.constantFrom(4, 8, 12, 100, 196, 200, 400),
  }),
  { minLength: 1, maxLength: 3, selector: ({ type }) => type },
);
const number = fc.constantFrom('1041', '1042', '1043', '1014', '2077', '2O77', '0001041');
const written = fc.oneof(
  number,
  number.map((n) => `EM-${n}`),
  fc.tuple(number, number).map(([a, b]) => `EM-${a} + EM-${b}`),
);
const date = fc.integer({ min: 1, max: 31 }).map((n) => `2026-03-${String(n).padStart(2, '0')}`);
const lane = fc.constantFrom(
  { from: 'TARNBY', to: 'KESTREL' },
  { from: 'OSTREL', to: 'KESTREL' },
  { from: 'KESTREL', to: 'TARNBY' },
);
const paper = fc
  .record({ ref: written, lane, date, lines })
  .map(({ lane: sites, ...rest }) => ({ ...rest, ...sites }));
const receiptPaper = fc
  .tuple(paper, fc.integer({ min: 0, max: 5 }))
  .map(([rest, kind]) => [{ ...rest, ref: kind < 2 ? null : rest.ref }, ...(kind === 5 ? [rest] : [])]);

const month: fc.Arbitrary<ReconciliationInput> = fc
  .record({
    shipments: fc.array(paper, { maxLength: 14 }),
    receipts: fc.array(receiptPaper, { maxLength: 14 }),
    windowDays: fc.integer({ min: 0, max: 12 }),
  })
  .map(({ shipments, receipts, windowDays }) =>
    aMonth({
      windowDays,
      shipments: shipments.map((rest, n) => ({ id: `S${n}`, ...rest })),
      receipts: receipts.flat().map((rest, n) => ({ id: `R${n}`, ...rest })),
    }),
  );

const check = (law: (input: ReconciliationInput) => void) =>
  fc.assert(fc.property(month, law), { seed: 20260331, numRuns: 400 });

const sorted = (ids: string[]) => [...ids].sort();

test('every shipment stands in exactly one match, or waits, or is overdue', () =>
  check((input) => {
    const { matches, waiting, overdue } = reconcile(input);
    const placed = [...matches.flatMap(({ shipments }) => shipments), ...waiting, ...overdue];
    expect(sorted(placed)).toEqual(sorted(input.shipments.map(({ id }) => id)));
  }));

test('every receipt stands in exactly one match, or is a duplicate, or unannounced', () =>
  check((input) => {
    const { matches, duplicates, unannounced } = reconcile(input);
    const placed = [
      ...matches.flatMap(({ receipts }) => receipts),
      ...duplicates.map(({ receipt }) => receipt),
      ...unannounced,
    ];
    expect(sorted(placed)).toEqual(sorted(input.receipts.map(({ id }) => id)));
  }));

test('the order of the input changes nothing', () =>
  fc.assert(
    fc.property(
      month.chain((input) =>
        fc.record({
          input: fc.constant(input),
          shipments: fc.shuffledSubarray(input.shipments, { minLength: input.shipments.length }),
          receipts: fc.shuffledSubarray(input.receipts, { minLength: input.receipts.length }),
        }),
      ),
      ({ input, shipments, receipts }) => {
        const turned = [...shipments].map((one) => ({ ...one, lines: [...one.lines].reverse() }));
        expect(reconcile({ ...input, shipments: turned, receipts })).toEqual(reconcile(input));
      },
    ),
    { seed: 20260331, numRuns: 400 },
  ));

test('declared and counted quantities are conserved: their difference is what each match reports', () =>
  check((input) => {
    const unitsOf = (documents: { id: string; lines: { quantity: number }[] }[], ids: string[]) =>
      documents
        .filter(({ id }) => ids.includes(id))
        .flatMap((document) => document.lines)
        .reduce((sum, { quantity }) => sum + quantity, 0);
    for (const { shipments, receipts, differences } of reconcile(input).matches) {
      const reported = differences.reduce((sum, { difference }) => sum + difference, 0);
      expect(unitsOf(input.receipts, receipts) - unitsOf(input.shipments, shipments)).toBe(reported);
      for (const { declared, counted, difference } of differences) {
        expect(difference).toBe(counted - declared);
        expect(difference).not.toBe(0);
      }
      expect(sorted(differences.map(({ type }) => type))).toEqual(differences.map(({ type }) => type));
    }
  }));

test('no receipt comes before its shipment left, matched or offered', () =>
  check((input) => {
    const dateOf = new Map([...input.shipments, ...input.receipts].map(({ id, date: on }) => [id, on]));
    const { matches, suggestions } = reconcile(input);
    for (const { shipments, receipts } of [...matches, ...suggestions])
      for (const shipment of shipments)
        for (const receipt of receipts)
          expect((dateOf.get(receipt) ?? '') >= (dateOf.get(shipment) ?? '?')).toBe(true);
  }));

test('suggestions offer only what is left over, at most three for a receipt, and no pair twice', () =>
  check((input) => {
    const { suggestions, waiting, overdue, unannounced } = reconcile(input);
    const offers = suggestions.map(({ shipments, receipts }) => `${shipments.join()} ${receipts.join()}`);
    expect(new Set(offers).size).toBe(offers.length);
    for (const { shipments, receipts, score, why } of suggestions) {
      for (const shipment of shipments) expect([...waiting, ...overdue]).toContain(shipment);
      for (const receipt of receipts) expect(unannounced).toContain(receipt);
      expect(score).toBeGreaterThanOrEqual(0);
      expect(score).toBeLessThanOrEqual(1);
      expect(why).not.toBe('');
    }
    for (const receipt of unannounced)
      expect(suggestions.filter(({ receipts }) => receipts.includes(receipt)).length).toBeLessThanOrEqual(3);
  }));

test('a duplicate repeats the lane and the contents of a receipt that is kept, a day apart at most', () =>
  check((input) => {
    const { duplicates } = reconcile(input);
    const doubles = new Set(duplicates.map(({ receipt }) => receipt));
    const find = (wanted: string) => input.receipts.find(({ id }) => id === wanted);
    const contents = (id: string) => [...(find(id)?.lines ?? [])].sort((a, b) => (a.type < b.type ? -1 : 1));
    for (const { receipt, of } of duplicates) {
      expect(doubles.has(of)).toBe(false);
      expect(contents(receipt)).toEqual(contents(of));
      expect(find(receipt)).toMatchObject({ from: find(of)?.from, to: find(of)?.to });
      expect((find(receipt)?.date ?? '') >= (find(of)?.date ?? '?')).toBe(true);
    }
  }));

test('what a machine matched without the reference it only offers once there is an equal shipment beside it', () =>
  check((input) => {
    const weak = reconcile(input).matches.filter(
      ({ rule }) => rule === 'near reference' || rule === 'same load' || rule === 'other site',
    );
    for (const { shipments, receipts } of weak) {
      const original = input.shipments.find(({ id }) => id === shipments[0]);
      if (!original) throw new Error('a match names a shipment that was never given');
      const twin = { ...original, id: 'twin' };
      const outcome = reconcile({ ...input, shipments: [...input.shipments, twin] });
      const still = outcome.matches.filter((match) => match.receipts.includes(receipts[0] ?? ''));
      expect(still.flatMap((match) => match.shipments)).not.toContain(original.id);
      expect(still.flatMap((match) => match.shipments)).not.toContain('twin');
    }
  }));
