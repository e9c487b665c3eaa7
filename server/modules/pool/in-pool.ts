import { sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';

/** Units of each type that the book holds: at sites and on the way. What is lost, scrapped or not yet bought is not in it. */
export async function unitsInPool(db: Reader): Promise<Map<string, number>> {
  const [rows] = await db.execute(
    sql`select b.type_code as typeCode, sum(b.units) as units from balances b join accounts a on a.id = b.account_id
        where a.kind in ('site', 'transit') group by b.type_code`,
  );
  return new Map(
    (rows as unknown as { typeCode: string; units: string }[]).map(({ typeCode, units }) => [
      typeCode,
      Number(units),
    ]),
  );
}

export type SiteStock = { id: string; name: string; company: string; companyId: string; units: number };

/** Sites that hold a type, or between which its parts travel, with what stands there. */
export async function stockBySite(db: Reader, typeCode: string): Promise<SiteStock[]> {
  const [rows] = await db.execute(
    sql`select s.id as id, s.name as name, c.name as company, c.id as companyId, coalesce(b.units, 0) as units
        from sites s join companies c on c.id = s.company_id
        left join accounts a on a.site_id = s.id left join balances b on b.account_id = a.id and b.type_code = ${typeCode}
        where coalesce(b.units, 0) <> 0 or (s.active and exists (
          select 1 from parts p where p.type_code = ${typeCode} and p.active and s.id in (p.supplier_site_id, p.plant_site_id)))
        order by c.kind, c.name, s.name, s.id`,
  );
  return (rows as unknown as (Omit<SiteStock, 'units'> & { units: string })[]).map((row) => ({
    ...row,
    units: Number(row.units),
  }));
}
