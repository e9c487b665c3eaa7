import { eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { accounts } from '@/db/schema/ledger';
import { shipments } from '@/db/schema/shipments';
import type { Place } from '@/shared/contracts/balances';

export type NamedAccount = {
  kind: (typeof accounts.$inferSelect)['kind'];
  /** Site, or reference of the shipment; null outside. */
  name: string | null;
  company: string | null;
};

/** What stands behind account numbers, in words. */
export async function accountNames(db: Reader, ids: readonly number[]): Promise<Map<number, NamedAccount>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({ account: accounts, site: sites.name, company: companies.name, reference: shipments.reference })
    .from(accounts)
    .leftJoin(sites, eq(sites.id, accounts.siteId))
    .leftJoin(companies, eq(companies.id, sites.companyId))
    .leftJoin(shipments, eq(shipments.id, accounts.shipmentId))
    .where(inArray(accounts.id, [...new Set(ids)]));
  return new Map(
    rows.map(({ account, site, company, reference }) => [
      account.id,
      { kind: account.kind, name: site ?? reference, company },
    ]),
  );
}

/** As an answer names it. */
export function placeOf(account: NamedAccount | undefined): Place {
  if (!account) throw new Error('a line of the ledger names no account');
  return { kind: account.kind, name: account.name };
}
