import { and, eq, inArray, isNotNull } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { people, personRoles } from '@/db/schema/companies';
import { type Ability, mayWith, roles } from '@/shared/access/abilities';

/** Active people of a company who have taken their invitation and hold the ability; for letters to them. */
export async function peopleWhoMay(
  db: Reader,
  { companyId, ability }: { companyId: string; ability: Ability },
): Promise<{ name: string; email: string }[]> {
  const able = roles.filter((role) => mayWith([role], ability));
  return db
    .selectDistinct({ name: people.name, email: people.email })
    .from(people)
    .innerJoin(personRoles, eq(personRoles.personId, people.id))
    .where(
      and(
        eq(people.companyId, companyId),
        eq(people.active, true),
        isNotNull(people.passwordHash),
        inArray(personRoles.role, able),
      ),
    )
    .orderBy(people.email);
}
