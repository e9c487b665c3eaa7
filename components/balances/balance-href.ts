import type { BalancePart, BalanceRow } from '@/shared/contracts/balances';

/** The page behind a figure: company, type, and where given the part and the day it was asked for. */
export function balanceHref(
  row: Pick<BalanceRow, 'companyId' | 'typeCode'>,
  { part, asOf }: { part?: BalancePart; asOf?: string | undefined } = {},
): string {
  const query = new URLSearchParams();
  if (part) query.set('part', part);
  if (asOf) query.set('asOf', asOf);
  const asked = query.toString();
  return `/balances/${row.companyId}/${encodeURIComponent(row.typeCode)}${asked === '' ? '' : `?${asked}`}`;
}
