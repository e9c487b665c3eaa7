import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { accounts } from '@/db/schema/ledger';

type Site = { id: string; companyId: string };
type Shipment = { id: string; fromCompanyId: string };
export type OutsideKind = 'bought' | 'scrapped' | 'lost' | 'found' | 'opening';

/** The account of a site, made when first needed. */
export async function siteAccount(tx: Transaction, site: Site): Promise<number> {
  const held = await find(tx, eq(accounts.siteId, site.id));
  if (held !== undefined) return held;
  await tx.insert(accounts).ignore().values({ kind: 'site', siteId: site.id, companyId: site.companyId });
  return found(await find(tx, eq(accounts.siteId, site.id)));
}

/** The account of what a shipment has on the way; its sender answers for it (RULES 2). */
export async function transitAccount(tx: Transaction, shipment: Shipment): Promise<number> {
  const held = await find(tx, eq(accounts.shipmentId, shipment.id));
  if (held !== undefined) return held;
  await tx
    .insert(accounts)
    .ignore()
    .values({ kind: 'transit', shipmentId: shipment.id, companyId: shipment.fromCompanyId });
  return found(await find(tx, eq(accounts.shipmentId, shipment.id)));
}

export async function outsideAccount(tx: Transaction, kind: OutsideKind): Promise<number> {
  return found(await find(tx, and(eq(accounts.kind, kind), isNull(accounts.companyId))));
}

async function find(tx: Transaction, where: ReturnType<typeof eq> | undefined): Promise<number | undefined> {
  const [row] = await tx.select({ id: accounts.id }).from(accounts).where(where).limit(1);
  return row?.id;
}

function found(id: number | undefined): number {
  if (id === undefined) throw new Error('an account of the ledger is missing');
  return id;
}
