import type { companies } from '@/db/schema/companies';
import type { StatementRow } from '@/shared/contracts/statements';
import { add, roundToMinor, subtract } from '@/shared/domain/money';
import { plain } from './assessment-input';
import type { StatementRecord } from './locked-statement';

type Row = Omit<StatementRecord, 'content'>;

/** A statement's row as lists and pages show it; `held` is what undecided disputes hold. */
export function statementRowOf(
  row: Row,
  { partner, held }: { partner: Pick<typeof companies.$inferSelect, 'id' | 'name'>; held: string },
): StatementRow {
  const money = (amount: string) => roundToMinor(plain(amount), row.currency);
  const total = money(add(plain(row.payable), plain(row.tax)));
  return {
    id: row.id,
    number: row.number,
    month: row.month,
    partner: { id: partner.id, name: partner.name },
    state: row.state,
    answer: row.answer,
    objectionUntil: row.objectionUntil,
    issuedAt: row.issuedAt,
    currency: row.currency,
    payable: money(row.payable),
    tax: money(row.tax),
    total,
    held: money(held),
    dueNow: money(subtract(total, held)),
  };
}
