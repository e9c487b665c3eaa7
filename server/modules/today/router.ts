import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { readToday, type Today } from '@/shared/contracts/today';
import { dayInZone } from '@/shared/domain/calendar';
import type { Person } from '../../http/person';
import { read, type Route } from '../../http/route';
import { administration } from './administration';
import { overdue, toCount } from './deliveries';
import { differencesToSettle, ownDifferences } from './differences-waiting';
import { disputesToAnswer } from './disputes-waiting';
import { holding } from './holding';
import { offLevel } from './levels';
import { awaitedAnswers, monthEnd } from './month-end';
import { poolPicture } from './pool-picture';
import { runningShort } from './running-short';

export const todayRoutes: Route[] = [
  read(readToday, 'see own account', ({ person, db, at }) => worklistOf(db, { person, now: at.now })),
];

/** Each part is null for those whose work it is not. */
async function worklistOf(db: Reader, { person, now }: { person: Person; now: string }): Promise<Today> {
  const timeZone = await zoneOf(db, person.companyId);
  const day = dayInZone(now, timeZone);
  return {
    company: person.companyName,
    day,
    timeZone,
    toCount: await toCount(db, person),
    overdue: await overdue(db, { person, day }),
    holding: await holding(db, person),
    runningShort: await runningShort(db, person),
    pool: await poolPicture(db, person),
    differences: await differencesToSettle(db, { person, day }),
    ownDifferences: await ownDifferences(db, person),
    disputes: await disputesToAnswer(db, person),
    levels: await offLevel(db, person),
    months: await monthEnd(db, { person, day }),
    awaited: await awaitedAnswers(db, person),
    administration: await administration(db, person),
  };
}

async function zoneOf(db: Reader, companyId: string): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .where(eq(sites.companyId, companyId))
    .orderBy(asc(sites.id))
    .limit(1);
  return site?.timeZone ?? 'UTC';
}
