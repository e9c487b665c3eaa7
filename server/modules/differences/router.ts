import { asc, eq } from 'drizzle-orm';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import * as contracts from '@/shared/contracts/differences';
import { post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { listDifferences } from './list-differences';
import { readDifference } from './read-difference';
import { dayOfDifference } from './receiver-day';
import { settleDifference } from './settle-difference';

export const differenceRoutes: Route[] = [
  read(contracts.listDifferences, 'see differences', async ({ query, db, at }) =>
    listDifferences(db, { query, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.readDifference, 'see differences', async ({ params, person, db, at }) =>
    readDifference(db, { id: params.difference, person, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.listDifferenceChoices, 'see differences', async ({ db }) => ({
    partners: await db
      .select({ id: companies.id, name: companies.name })
      .from(companies)
      .where(eq(companies.kind, 'partner'))
      .orderBy(asc(companies.name)),
    types: await db
      .select({ code: containerTypes.code, name: containerTypes.name })
      .from(containerTypes)
      .orderBy(asc(containerTypes.code)),
  })),
  post(contracts.settleDifference, 'settle differences', async ({ params, body, tx, person, at }) => {
    const { bearerCompanyId, swapWithId, ...rest } = body;
    const settled = await settleDifference(tx, {
      ...rest,
      ...(body.way === 'lost on the way' && bearerCompanyId ? { bearerCompanyId } : {}),
      ...(body.way === 'wrong type' && swapWithId ? { swapWithId } : {}),
      differenceId: params.difference,
      personId: person.id,
      today: await dayOfDifference(tx, { id: params.difference, now: at.now }),
      now: at.now,
    });
    return { id: params.difference, way: body.way, units: body.units, ...settled };
  }),
];
