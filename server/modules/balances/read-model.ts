import { and, eq, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import type { BalanceRow, listBalances, readBalance } from '@/shared/contracts/balances';
import type { AnswerOf, ParamsOf, QueryOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { type Person, scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { netsOf } from './parts-sql';
import { type SiteUnits, unitsAsKnown } from './units-as-known';
import { noUnits, type Parts, type PartsByCompany, unitsByCompany } from './units-by-company';

type Company = typeof companies.$inferSelect;
type Listing = { query: QueryOf<typeof listBalances>; person: Person; today: string };

/** Companies by name, so many to a page, each with a row per container type that it has to do with. */
export async function balanceRows(
  db: Reader,
  { query, person, today }: Listing,
): Promise<AnswerOf<typeof listBalances>> {
  const found = await companiesOfPage(db, { query, person });
  const { rows: page, next } = cutPage(found, query.limit, ({ name, id }) => [name, id]);
  const { asOf, type } = query;
  const units = await unitsByCompany(db, { companyIds: page.map((company) => company.id), asOf, type });
  return {
    rows: rowsOf({ companies: page, units, names: await typeNames(db) }),
    next,
    asOf: asOf ?? null,
    today,
  };
}

async function companiesOfPage(
  db: Reader,
  { query, person }: Pick<Listing, 'query' | 'person'>,
): Promise<Company[]> {
  const scope = scopeOf(person);
  const { name, id } = companies;
  const page = keyset({ by: name, then: id, down: false, after: cursor(query.after, 2) });
  return db
    .select()
    .from(companies)
    .where(
      and(
        scope ? eq(companies.id, scope) : undefined,
        query.company ? eq(companies.id, query.company) : undefined,
        holdsText(query.search, name),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(query.limit + 1);
}

type Made = { companies: readonly Company[]; units: PartsByCompany; names: Map<string, string> };

function rowsOf(made: Made): BalanceRow[] {
  return made.companies.flatMap((company) =>
    [...(made.units.get(company.id) ?? new Map<string, Parts>())]
      .filter(([, parts]) => Object.values(parts).some((units) => units !== 0))
      .map(([typeCode, parts]) => rowOf(company, { typeCode, typeName: made.names.get(typeCode), parts }))
      .sort(
        (a, b) => a.typeName.localeCompare(b.typeName, 'en') || a.typeCode.localeCompare(b.typeCode, 'en'),
      ),
  );
}

type OfType = { typeCode: string; typeName: string | undefined; parts: Readonly<Parts> };

function rowOf({ id, name, kind }: Company, { typeCode, typeName, parts }: OfType): BalanceRow {
  return { companyId: id, company: name, kind, typeCode, typeName: typeName ?? typeCode, ...parts };
}

async function typeNames(db: Reader): Promise<Map<string, string>> {
  const rows = await db.select({ code: containerTypes.code, name: containerTypes.name }).from(containerTypes);
  return new Map(rows.map((row) => [row.code, row.name]));
}

type One = {
  params: ParamsOf<typeof readBalance>;
  query: QueryOf<typeof readBalance>;
  person: Person;
  today: string;
};

/** One type of one company, site by site. */
export async function oneBalance(db: Reader, one: One): Promise<AnswerOf<typeof readBalance>> {
  const { company, name } = await visibleBalance(db, one);
  const { type } = one.params;
  const { asOf, knownAt } = one.query;
  const asked = { companyId: company.id, type, asOf };
  const { parts, sites: bySite } =
    knownAt === undefined ? await unitsAsKept(db, asked) : await unitsAsKnown(db, { ...asked, knownAt });
  return {
    ...rowOf(company, { typeCode: type, typeName: name, parts }),
    sites: bySite,
    asOf: asOf ?? null,
    today: one.today,
  };
}

type Asked = { companyId: string; type: string; asOf: string | undefined };

async function unitsAsKept(
  db: Reader,
  asked: Asked,
): Promise<{ parts: Readonly<Parts>; sites: SiteUnits[] }> {
  const { companyId, type, asOf } = asked;
  const units = await unitsByCompany(db, { companyIds: [companyId], asOf, type });
  return { parts: units.get(companyId)?.get(type) ?? noUnits, sites: await unitsBySite(db, asked) };
}

/** The company and the type that are asked about, if this person may see them. */
export async function visibleBalance(
  db: Reader,
  { params, person }: Pick<One, 'params' | 'person'>,
): Promise<{ company: Company; name: string }> {
  const scope = scopeOf(person);
  const [company] = await db.select().from(companies).where(eq(companies.id, params.company));
  const [type] = await db.select().from(containerTypes).where(eq(containerTypes.code, params.type));
  if (!company || !type || (scope !== null && company.id !== scope)) throw new Problem('not found');
  return { company, name: type.name };
}

async function unitsBySite(db: Reader, { companyId, type, asOf }: Asked): Promise<SiteUnits[]> {
  const { table, units, until } = netsOf(asOf);
  const [rows] = await db.execute(
    sql`select a.site_id as siteId, st.name as site, sum(${units}) as units
        from accounts a join ${sites} st on st.id = a.site_id join ${table} n on n.account_id = a.id
        where a.kind = 'site' and a.company_id = ${companyId} and n.type_code = ${type} and ${until}
        group by a.site_id, st.name order by st.name, a.site_id`,
  );
  return (rows as unknown as { siteId: string; site: string; units: string }[]).map((row) => ({
    ...row,
    units: Number(row.units),
  }));
}
