import { and, count, eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { statements } from '@/db/schema/statements';
import { may, type Person, scopeOf } from '../../http/person';
import { countListed } from '../differences/count-listed';

/** How much waits for this person in each place; places where nothing waits are left out. */
export async function waitingFor(db: Reader, person: Person, today: string): Promise<Record<string, number>> {
  const scope = scopeOf(person);
  const waiting: Record<string, number> = {};
  const put = async (
    place: string,
    wanted: boolean,
    number: () => Promise<{ n: number }[]>,
  ): Promise<void> => {
    if (!wanted) return;
    const n = (await number())[0]?.n ?? 0;
    if (n > 0) waiting[place] = n;
  };
  await put('shipments', may(person, 'count shipments'), () =>
    db
      .select({ n: count() })
      .from(shipments)
      .where(and(eq(shipments.state, 'on the way'), eq(shipments.toCompanyId, person.companyId))),
  );
  await put('differences', may(person, 'see differences'), async () => [{ n: await countListed(db, today) }]);
  await put('disputes', may(person, 'see disputes'), () =>
    db
      .select({ n: count() })
      .from(disputes)
      .where(
        scope
          ? and(eq(disputes.companyId, scope), eq(disputes.state, 'waiting for partner'))
          : inArray(disputes.state, ['open']),
      ),
  );
  await put('statements', may(person, 'answer statements'), () =>
    db
      .select({ n: count() })
      .from(statements)
      .where(
        and(
          eq(statements.companyId, person.companyId),
          eq(statements.state, 'issued'),
          eq(statements.answer, 'awaited'),
        ),
      ),
  );
  return waiting;
}
