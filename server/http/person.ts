import { and, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, people, personRoles } from '@/db/schema/companies';
import { type Ability, type CompanyKind, mayWith, type Role } from '@/shared/access/abilities';

/** The signed-in person as every handler sees them. */
export type Person = {
  id: string;
  name: string;
  email: string;
  language: string;
  roles: Role[];
  companyId: string;
  companyKind: CompanyKind;
  companyName: string;
  currency: string;
  sessionsFrom: string;
};

export function may(person: Person, ability: Ability): boolean {
  return mayWith(person.roles, ability);
}

/** The company whose records this person sees: null means all (the operator's people). */
export function scopeOf(person: Person): string | null {
  return person.companyKind === 'operator' ? null : person.companyId;
}

/** Reads an active person of an active company with its roles; asked on every request, so a change holds at once. */
export async function readPerson(db: Reader, personId: string): Promise<Person | null> {
  const rows = await db
    .select({ person: people, company: companies, role: personRoles.role })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .leftJoin(personRoles, eq(personRoles.personId, people.id))
    .where(and(eq(people.id, personId), eq(people.active, true), eq(companies.active, true)));
  const first = rows[0];
  if (!first) return null;
  const { person, company } = first;
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    language: person.language,
    roles: rows.flatMap((row) => (row.role ? [row.role] : [])),
    companyId: company.id,
    companyKind: company.kind,
    companyName: company.name,
    currency: company.currency,
    sessionsFrom: person.sessionsFrom,
  };
}
