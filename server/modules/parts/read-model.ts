import { and, asc, eq, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes, parts } from '@/db/schema/containers';
import type { QueryOf } from '@/shared/contracts/operation';
import type { listParts, PartRow } from '@/shared/contracts/parts';
import { plainDecimal } from '@/shared/domain/plain-decimal';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { holdsText } from '../../http/search';
import { keyset, sortOf } from '../../http/sort';

const supplier = alias(sites, 'supplier_site');
const supplierCompany = alias(companies, 'supplier_company');
const plant = alias(sites, 'plant_site');
const plantCompany = alias(companies, 'plant_company');

/** Packing specifications by part number or name, a page by key. */
export async function partsPage(db: Reader, query: QueryOf<typeof listParts>) {
  const { key, down } = sortOf(query.sort, ['number', 'name']);
  const page = keyset({ by: parts[key], then: parts.id, down, after: cursor(query.after, 2) });
  const rows = await partRows(db, {
    limit: query.limit + 1,
    order: page.order,
    where: and(
      query.type ? eq(parts.typeCode, query.type) : undefined,
      query.use ? eq(parts.active, query.use === 'in use') : undefined,
      holdsText(query.search, parts.number, parts.name),
      page.after,
    ),
  });
  return cutPage(rows, query.limit, (row) => [row[key], row.id]);
}

export async function readPartRow(db: Reader, id: string): Promise<PartRow> {
  const [row] = await partRows(db, { where: eq(parts.id, id), order: [], limit: 1 });
  if (!row) throw new Problem('not found');
  return row;
}

async function partRows(
  db: Reader,
  asked: { where: SQL | undefined; order: SQL[]; limit: number },
): Promise<PartRow[]> {
  const rows = await db
    .select({
      part: parts,
      type: { code: containerTypes.code, name: containerTypes.name },
      supplierSite: { id: supplier.id, name: supplier.name, company: supplierCompany.name },
      plantSite: { id: plant.id, name: plant.name, company: plantCompany.name },
    })
    .from(parts)
    .innerJoin(containerTypes, eq(containerTypes.code, parts.typeCode))
    .innerJoin(supplier, eq(supplier.id, parts.supplierSiteId))
    .innerJoin(supplierCompany, eq(supplierCompany.id, supplier.companyId))
    .innerJoin(plant, eq(plant.id, parts.plantSiteId))
    .innerJoin(plantCompany, eq(plantCompany.id, plant.companyId))
    .where(asked.where)
    .orderBy(...asked.order)
    .limit(asked.limit);
  return rows.map(({ part, ...named }) => ({
    ...named,
    id: part.id,
    number: part.number,
    name: part.name,
    unitsPerContainer: part.unitsPerContainer,
    unitsPerDayMean: plainDecimal(part.unitsPerDayMean),
    unitsPerDaySd: plainDecimal(part.unitsPerDaySd),
    containersPerDay: Number(part.unitsPerDayMean) / part.unitsPerContainer,
    active: part.active,
  }));
}

/** What a part can be given: types in use, sites of partners and of the operator. */
export async function partChoices(db: Reader) {
  const types = await db
    .select({ code: containerTypes.code, name: containerTypes.name })
    .from(containerTypes)
    .where(eq(containerTypes.active, true))
    .orderBy(asc(containerTypes.name));
  const sitesOf = (kind: 'partner' | 'operator') =>
    db
      .select({ id: sites.id, name: sites.name, company: companies.name })
      .from(sites)
      .innerJoin(companies, eq(companies.id, sites.companyId))
      .where(and(eq(companies.kind, kind), eq(sites.active, true), eq(companies.active, true)))
      .orderBy(asc(companies.name), asc(sites.name));
  return { types, supplierSites: await sitesOf('partner'), plantSites: await sitesOf('operator') };
}
