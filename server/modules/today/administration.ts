import { and, asc, count, desc, eq, isNull } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { log } from '@/db/schema/access';
import { companies, people } from '@/db/schema/companies';
import { outbox } from '@/db/schema/work';
import type { Today } from '@/shared/contracts/today';
import { may, type Person } from '../../http/person';
import { bookSubject } from '../balances/check-book';

/** People invited who have not come in, letters that could not be sent, and whether the book adds up. */
export async function administration(db: Reader, person: Person): Promise<Today['administration']> {
  if (!may(person, 'keep people')) return null;
  const invited = await db
    .select({ id: people.id, name: people.name, company: companies.name, since: people.createdAt })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(and(isNull(people.passwordHash), eq(people.active, true)))
    .orderBy(asc(people.createdAt), asc(people.id))
    .limit(6);
  const [failed] = await db.select({ n: count() }).from(outbox).where(eq(outbox.state, 'failed'));
  const [check] = await db
    .select({ outcome: log.outcome })
    .from(log)
    .where(and(eq(log.subjectId, bookSubject.id), eq(log.action, 'checkBook')))
    .orderBy(desc(log.id))
    .limit(1);
  return { invited, failedLetters: failed?.n ?? 0, bookDiffers: check?.outcome === 'differs' };
}
