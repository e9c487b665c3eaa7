import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { abilitiesOf } from '@/shared/access/abilities';
import type { SignedIn } from '@/shared/contracts/session';
import type { Person } from '../../http/person';
import { waitingFor } from '../today/waiting';

/** What a screen needs to know of the person: name, company, abilities, and how much waits where. */
export async function signedInOf(db: Reader, person: Person, today: string): Promise<SignedIn> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .where(eq(sites.companyId, person.companyId))
    .limit(1);
  return {
    person: {
      id: person.id,
      name: person.name,
      email: person.email,
      roles: person.roles,
      language: person.language,
    },
    company: {
      id: person.companyId,
      name: person.companyName,
      kind: person.companyKind,
      currency: person.currency,
      timeZone: site?.timeZone ?? 'UTC',
    },
    abilities: abilitiesOf(person.roles),
    waiting: await waitingFor(db, person, today),
  };
}
