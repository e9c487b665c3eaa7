import { and, eq, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import type { OpenItem } from '@/shared/contracts/months';
import { sitesById } from '../partners/sites';

/** Shipments that should have arrived by a day and have no count, under the partner of the lane. */
export async function uncountedByPartner(db: Reader, through: string): Promise<OpenItem[]> {
  const rows = await db
    .select({ from: shipments.fromSiteId, to: shipments.toSiteId })
    .from(shipments)
    .where(and(eq(shipments.state, 'on the way'), lte(shipments.expectedOn, through)));
  const sites = await sitesById(
    db,
    rows.flatMap((row) => [row.from, row.to]),
  );
  const items = new Map<string, OpenItem>();
  for (const row of rows) {
    const [from, to] = [sites.get(row.from)?.company, sites.get(row.to)?.company];
    const company = to?.kind === 'partner' ? to : from;
    if (!company) continue;
    const held = items.get(company.id);
    const { id, name } = company;
    items.set(id, {
      kind: 'uncounted',
      partner: { id, name },
      count: (held?.count ?? 0) + 1,
      money: null,
      typeCode: null,
    });
  }
  return [...items.values()].sort((a, b) => (a.partner.name < b.partner.name ? -1 : 1));
}
