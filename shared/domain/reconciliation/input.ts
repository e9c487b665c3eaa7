import { z } from 'zod';
import { day } from '../calendar';

/** What cannot be reconciled; `document` names the shipment or receipt, or the field of the whole. */
export class CannotReconcile extends Error {
  constructor(
    readonly document: string,
    readonly reason: string,
  ) {
    super(`${document}: ${reason}`);
    this.name = 'CannotReconcile';
  }
}

const quantity = z.int({ error: 'a quantity is a whole number of units' }).positive({
  error: 'a quantity is at least 1',
});
const name = z.string().min(1, { error: 'a name is missing' });
const line = z.object({ type: name, quantity });
const days = z.int({ error: 'days are a whole number' }).nonnegative({ error: 'days are not negative' });

const shipment = z.object({
  id: name,
  ref: z.string(),
  from: name,
  to: name,
  date: day,
  lines: z.array(line).min(1, { error: 'a shipment declares at least one line' }),
});

const receipt = shipment.extend({ ref: z.string().nullable(), lines: z.array(line) });

const input = z.object({
  asOf: day,
  windowDays: days,
  overdueAfterDays: days,
  shipments: z.array(shipment),
  receipts: z.array(receipt),
});

export type ReconciliationInput = z.infer<typeof input>;
export type DeclaredShipment = z.infer<typeof shipment>;
export type CountedReceipt = z.infer<typeof receipt>;

/** Reads the input whole, or refuses it with the document at fault. */
export function readInput(raw: unknown): ReconciliationInput {
  const read = input.safeParse(raw);
  if (!read.success) throw refusalOf(raw, read.error);
  refuseTwice('shipment', read.data.shipments);
  refuseTwice('receipt', read.data.receipts);
  return read.data;
}

function refusalOf(raw: unknown, error: z.ZodError): CannotReconcile {
  const issue = error.issues[0];
  const [list, index, ...field] = issue?.path ?? [];
  const where = field.length > 0 ? `${field.join('.')}: ` : '';
  return new CannotReconcile(documentAt(raw, list, index), `${where}${issue?.message ?? 'unreadable'}`);
}

function documentAt(raw: unknown, list: PropertyKey | undefined, index: PropertyKey | undefined): string {
  if (list !== 'shipments' && list !== 'receipts') return String(list ?? 'input');
  if (typeof index !== 'number') return list;
  const kind = list === 'shipments' ? 'shipment' : 'receipt';
  const named = z.object({ [list]: z.array(z.unknown()) }).safeParse(raw);
  const document = z.object({ id: name }).safeParse(named.data?.[list]?.[index]);
  return document.success ? `${kind} ${document.data.id}` : `${kind} number ${index + 1}`;
}

function refuseTwice(kind: string, documents: { id: string }[]): void {
  const seen = new Set<string>();
  for (const { id } of documents) {
    if (seen.has(id)) throw new CannotReconcile(`${kind} ${id}`, 'the same id twice');
    seen.add(id);
  }
}
