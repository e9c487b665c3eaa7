import { and, eq, inArray, isNotNull, isNull } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { companies, people, personRoles } from '@/db/schema/companies';
import type { listPeople, PersonRow } from '@/shared/contracts/people';
import type { QueryOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { type Person, scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';

const stateIs = {
  active: and(eq(people.active, true), isNotNull(people.passwordHash)),
  invited: and(eq(people.active, true), isNull(people.passwordHash)),
  disabled: eq(people.active, false),
};

/** People by name, a page by key; a partner sees its own company's only. */
export async function peoplePage(db: Database, person: Person, query: QueryOf<typeof listPeople>) {
  const page = keyset({ by: people.name, then: people.id, down: false, after: cursor(query.after, 2) });
  const company = scopeOf(person) ?? query.company;
  const found = await db
    .select({ person: people, company: { id: companies.id, name: companies.name, kind: companies.kind } })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(
      and(
        company ? eq(people.companyId, company) : undefined,
        query.state ? stateIs[query.state] : undefined,
        holdsText(query.search, people.name, people.email),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(query.limit + 1);
  return cutPage(await asRows(db, found), query.limit, (row) => [row.name, row.id]);
}

/** One person; of another company: nobody. */
export async function personRowOf(
  db: Database,
  { person, id }: { person: Person; id: string },
): Promise<PersonRow> {
  const scope = scopeOf(person);
  const found = await db
    .select({ person: people, company: { id: companies.id, name: companies.name, kind: companies.kind } })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(and(eq(people.id, id), scope ? eq(people.companyId, scope) : undefined));
  const [row] = await asRows(db, found);
  if (!row) throw new Problem('not found');
  return row;
}

type Found = { person: typeof people.$inferSelect; company: PersonRow['company'] };

async function asRows(db: Database, found: readonly Found[]): Promise<PersonRow[]> {
  const roles = await rolesOf(
    db,
    found.map((row) => row.person.id),
  );
  return found.map((row) => ({
    id: row.person.id,
    name: row.person.name,
    email: row.person.email,
    company: row.company,
    roles: roles.get(row.person.id) ?? [],
    state: !row.person.active ? 'disabled' : row.person.passwordHash === null ? 'invited' : 'active',
    lastSignedInAt: row.person.lastSignedInAt,
  }));
}

async function rolesOf(db: Database, ids: string[]): Promise<Map<string, PersonRow['roles']>> {
  const held = new Map<string, PersonRow['roles']>();
  if (ids.length === 0) return held;
  for (const { personId, role } of await db
    .select()
    .from(personRoles)
    .where(inArray(personRoles.personId, ids))) {
    held.set(personId, [...(held.get(personId) ?? []), role]);
  }
  return held;
}
