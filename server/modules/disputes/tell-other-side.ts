import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies, people, personRoles } from '@/db/schema/companies';
import { disputes } from '@/db/schema/differences';
import type { DisputeMessage } from '@/shared/contracts/disputes';
import type { Role } from '@/shared/access/abilities';
import { disputes as words } from '@/shared/text/en/disputes';
import type { Person } from '../../http/person';
import { letterOf } from '../../mail/letters';
import { queueMail } from '../../mail/outbox';
import type { DisputeRow } from './locked-dispute';

type Told = {
  disputeId: string;
  step: DisputeMessage['step'];
  person: Person;
  now: string;
  publicUrl: string;
};
const hourMs = 3_600_000;

/**
 * A letter to the other side, at most one an hour for each thread and side: what follows within the hour waits for
 * its end, in one letter that says that there is news.
 */
export async function tellOtherSide(tx: Transaction, told: Told): Promise<void> {
  const [dispute] = await tx.select().from(disputes).where(eq(disputes.id, told.disputeId));
  if (!dispute) return;
  const toPartner = told.person.companyId !== dispute.companyId;
  const last = toPartner ? dispute.partnerMailAt : dispute.operatorMailAt;
  if (last !== null && last > told.now) return;
  const due = last === null ? told.now : new Date(Date.parse(last) + hourMs).toISOString();
  const sendAt = due > told.now ? due : told.now;
  await tx
    .update(disputes)
    .set(toPartner ? { partnerMailAt: sendAt } : { operatorMailAt: sendAt })
    .where(eq(disputes.id, dispute.id));
  const readers = toPartner ? await partnerReaders(tx, dispute) : await operatorReaders(tx, dispute);
  const letter = sendAt === told.now ? words.mail.step[told.step](told.person.companyName) : words.mail.news;
  for (const to of readers) {
    await queueMail(tx, {
      ...letterOf('dispute', words.mail.subject, {
        name: to.name,
        parts: [letter, `${told.publicUrl}/disputes/${dispute.id}`],
      }),
      to,
      now: sendAt,
    });
  }
}

type Reader = { name: string; email: string };

/** Who opened it; where that person has left, everyone of the company who can open one. */
async function partnerReaders(tx: Transaction, dispute: DisputeRow): Promise<Reader[]> {
  const able = await peopleWith(tx, { roles: ['clerk', 'manager'], companyId: dispute.companyId });
  const opener = able.filter((person) => person.id === dispute.openedBy);
  return opener.length > 0 ? opener : able;
}

/** The coordinators; for a statement line finance, too. */
function operatorReaders(tx: Transaction, dispute: DisputeRow): Promise<Reader[]> {
  return peopleWith(tx, {
    roles: dispute.subject === 'count' ? ['coordinator'] : ['coordinator', 'finance'],
    companyId: null,
  });
}

async function peopleWith(
  tx: Transaction,
  { roles, companyId }: { roles: Role[]; companyId: string | null },
): Promise<(Reader & { id: string })[]> {
  return tx
    .selectDistinct({ id: people.id, name: people.name, email: people.email })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .innerJoin(personRoles, eq(personRoles.personId, people.id))
    .where(
      and(
        eq(people.active, true),
        inArray(personRoles.role, roles),
        companyId ? eq(people.companyId, companyId) : eq(companies.kind, 'operator'),
      ),
    )
    .orderBy(asc(people.id));
}
