import type { ReconciliationInput } from '@/shared/domain/reconciliation';
import { text } from '@/shared/text/catalogue';

const uuid = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}/g;

/** The comparison names documents by their ids; people know them by reference or day. */
export function namesIn({ shipments, receipts }: Pick<ReconciliationInput, 'shipments' | 'receipts'>) {
  const names = new Map<string, string>();
  for (const { id, ref } of shipments) names.set(id, ref);
  for (const { id, ref, date } of receipts) names.set(id, ref ?? text.imports.receiptOf(date));
  return (why: string): string => why.replace(uuid, (id) => names.get(id) ?? id);
}
