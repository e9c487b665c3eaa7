import { CannotReconcile, reconcile } from '@/shared/domain/reconciliation';
import { aMonth, aReceipt, aShipment, totes } from './reconciliation-papers';

const refusalOf = (input: unknown): CannotReconcile => {
  try {
    reconcile(input as Parameters<typeof reconcile>[0]);
  } catch (error) {
    if (error instanceof CannotReconcile) return error;
    throw error;
  }
  throw new Error('nothing was refused');
};

const withShipment = (given: object) =>
  aMonth({ shipments: [aShipment({ id: 'S1' }), { ...aShipment({ id: 'S2', ref: 'EM-1' }), ...given }] });
const withReceipt = (given: object) => aMonth({ receipts: [{ ...aReceipt({ id: 'R7' }), ...given }] });

const refused: [what: string, input: unknown, document: string, reason: RegExp][] = [
  ['a fraction of a unit', withShipment({ lines: totes(1.5) }), 'shipment S2', /whole/],
  ['no unit', withShipment({ lines: totes(0) }), 'shipment S2', /at least 1/],
  ['fewer than none', withReceipt({ lines: totes(-3) }), 'receipt R7', /at least 1/],
  ['a quantity as text', withReceipt({ lines: [{ type: 'TOTE', quantity: '4' }] }), 'receipt R7', /whole/],
  ['a day that does not exist', withReceipt({ date: '2026-02-29' }), 'receipt R7', /calendar/],
  ['a shipment without lines', withShipment({ lines: [] }), 'shipment S2', /at least one line/],
  ['a line without a type', withShipment({ lines: [{ type: '', quantity: 4 }] }), 'shipment S2', /missing/],
  ['a receipt without a receiver', withReceipt({ to: '' }), 'receipt R7', /missing/],
  ['a shipment without an id', withShipment({ id: undefined }), 'shipment number 2', /id/],
  ['the same shipment twice', withShipment({ id: 'S1' }), 'shipment S1', /twice/],
  [
    'the same receipt twice',
    aMonth({ receipts: [aReceipt({ id: 'R1' }), aReceipt({ id: 'R1' })] }),
    'receipt R1',
    /twice/,
  ],
  ['an unreal closing day', aMonth({ asOf: '2026-04-31' }), 'asOf', /calendar/],
  ['a negative window', aMonth({ windowDays: -1 }), 'windowDays', /negative/],
  ['half a day', aMonth({ overdueAfterDays: 0.5 }), 'overdueAfterDays', /whole/],
  ['no receipts at all', { ...aMonth({}), receipts: undefined }, 'receipts', /./],
  ['nothing', null, 'input', /./],
];

test.each(refused)('%s is refused, and the document named', (...[, input, document, reason]) => {
  const refusal = refusalOf(input);
  expect(refusal.document).toBe(document);
  expect(refusal.reason).toMatch(reason);
});

test('a receipt on which nothing came is no mistake', () => {
  const outcome = reconcile(
    aMonth({ shipments: [aShipment({ id: 'S1' })], receipts: [aReceipt({ id: 'R1', lines: [] })] }),
  );
  expect(outcome.matches[0]?.differences).toEqual([
    { type: 'TOTE', declared: 400, counted: 0, difference: -400 },
  ]);
});

test('an empty month has an empty outcome', () => {
  expect(reconcile(aMonth({}))).toEqual({
    matches: [],
    suggestions: [],
    duplicates: [],
    waiting: [],
    overdue: [],
    unannounced: [],
  });
});
