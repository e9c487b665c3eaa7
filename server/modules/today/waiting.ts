import { and, count, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { statements } from '@/db/schema/statements';
import type { Ability } from '@/shared/access/abilities';
import { may, type Person, scopeOf } from '../../http/person';
import { countListed } from '../differences/count-listed';

type Place = { place: string; ability: Ability; read: (db: Reader, asked: Asked) => Promise<number> };
type Asked = { person: Person; today: string };

const places: readonly Place[] = [
  { place: 'shipments', ability: 'count shipments', read: shipmentsToCount },
  { place: 'differences', ability: 'see differences', read: (db, { today }) => countListed(db, today) },
  { place: 'disputes', ability: 'see disputes', read: disputesToAnswer },
  { place: 'statements', ability: 'answer statements', read: statementsToAnswer },
];

/** How much waits for this person in each place; places where nothing waits are left out. */
export async function waitingFor(db: Reader, person: Person, today: string): Promise<Record<string, number>> {
  const waiting: Record<string, number> = {};
  for (const { place, ability, read } of places) {
    if (!may(person, ability)) continue;
    const found = await read(db, { person, today });
    if (found > 0) waiting[place] = found;
  }
  return waiting;
}

async function shipmentsToCount(db: Reader, { person }: Asked): Promise<number> {
  const [row] = await db
    .select({ n: count() })
    .from(shipments)
    .where(and(eq(shipments.state, 'on the way'), eq(shipments.toCompanyId, person.companyId)));
  return row?.n ?? 0;
}

async function disputesToAnswer(db: Reader, { person }: Asked): Promise<number> {
  const scope = scopeOf(person);
  const [row] = await db
    .select({ n: count() })
    .from(disputes)
    .where(
      scope
        ? and(eq(disputes.companyId, scope), eq(disputes.state, 'waiting for partner'))
        : eq(disputes.state, 'open'),
    );
  return row?.n ?? 0;
}

async function statementsToAnswer(db: Reader, { person }: Asked): Promise<number> {
  const { companyId, state, answer } = statements;
  const [row] = await db
    .select({ n: count() })
    .from(statements)
    .where(and(eq(companyId, person.companyId), eq(state, 'issued'), eq(answer, 'awaited')));
  return row?.n ?? 0;
}
