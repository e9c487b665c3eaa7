import { type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import type { BalancePart } from '@/shared/contracts/balances';
import { differing, netsOf, onTheWay } from './parts-sql';

export type Parts = Record<BalancePart | 'inQuestion' | 'held', number>;
type Asked = { companyIds: readonly string[]; asOf?: string | undefined; type?: string | undefined };
/** Parts by company and type: map of company id to map of type code. */
export type PartsByCompany = Map<string, Map<string, Parts>>;

/** Where the units of these companies are, or were at the end of a day. */
export async function unitsByCompany(db: Reader, asked: Asked): Promise<PartsByCompany> {
  if (asked.companyIds.length === 0) return new Map();
  const found: PartsByCompany = new Map(asked.companyIds.map((id) => [id, new Map()]));
  const add = (at: { company: string; type: string }, part: keyof Parts, units: number): void => {
    const types = found.get(at.company);
    if (!types) return;
    const parts = types.get(at.type) ?? { ...noUnits };
    parts[part] += units;
    types.set(at.type, parts);
  };
  for (const row of await atSites(db, asked))
    add({ company: row.companyId, type: row.typeCode }, 'atSites', Number(row.units));
  for (const row of await inTransit(db, asked, onTheWay(asked.asOf))) {
    add({ company: row.fromCompanyId, type: row.typeCode }, 'sent', Number(row.units));
    add({ company: row.toCompanyId, type: row.typeCode }, 'toIt', Number(row.units));
  }
  for (const row of await inTransit(db, asked, differing(asked.asOf))) {
    const units = Number(row.units);
    for (const [company, part] of [
      [row.fromCompanyId, 'sentDiffers'],
      [row.toCompanyId, 'toItDiffers'],
    ] as const) {
      add({ company, type: row.typeCode }, part, units);
      add({ company, type: row.typeCode }, 'inQuestion', Math.abs(units));
    }
  }
  for (const types of found.values())
    for (const parts of types.values()) parts.held = parts.atSites + parts.sent + parts.sentDiffers;
  return found;
}

export const noUnits: Readonly<Parts> = {
  atSites: 0,
  sent: 0,
  sentDiffers: 0,
  toIt: 0,
  toItDiffers: 0,
  inQuestion: 0,
  held: 0,
};

type SiteUnits = { companyId: string; typeCode: string; units: string };

async function atSites(db: Reader, { companyIds, asOf, type }: Asked): Promise<SiteUnits[]> {
  const { table, units, until } = netsOf(asOf);
  return rowsOf(
    db,
    sql`select a.company_id as companyId, n.type_code as typeCode, sum(${units}) as units
        from accounts a join ${table} n on n.account_id = a.id
        where a.kind = 'site' and a.company_id in ${[...companyIds]} and ${until}${ofType(type)}
        group by a.company_id, n.type_code`,
  );
}

type TransitUnits = { fromCompanyId: string; toCompanyId: string; typeCode: string; units: string };

/** By shipment, so that what is too few on one and too many on another does not cancel out. */
async function inTransit(db: Reader, asked: Asked, which: SQL): Promise<TransitUnits[]> {
  const { table, units, until } = netsOf(asked.asOf);
  const ids = [...asked.companyIds];
  return rowsOf(
    db,
    sql`select s.from_company_id as fromCompanyId, s.to_company_id as toCompanyId, n.type_code as typeCode, sum(${units}) as units
        from shipments s join accounts a on a.shipment_id = s.id join ${table} n on n.account_id = a.id
        where ${which} and (s.from_company_id in ${ids} or s.to_company_id in ${ids}) and ${until}${ofType(asked.type)}
        group by s.id, s.from_company_id, s.to_company_id, n.type_code having sum(${units}) <> 0`,
  );
}

const ofType = (type: string | undefined): SQL =>
  type === undefined ? sql`` : sql` and n.type_code = ${type}`;

async function rowsOf<Row>(db: Reader, query: SQL): Promise<Row[]> {
  const [rows] = await db.execute(query);
  return rows as unknown as Row[];
}
