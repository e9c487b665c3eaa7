import { eq } from 'drizzle-orm';
import type { Request } from 'express';
import type { Database } from '@/db/client';
import { people } from '@/db/schema/companies';
import { inTransaction } from '@/db/transaction';
import * as contracts from '@/shared/contracts/session';
import { dayInZone } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import type { Deps } from '../../deps';
import { readPerson } from '../../http/person';
import { type Limits, useTry } from '../../http/rate-limit';
import { type Circumstances, open, type Route } from '../../http/route';
import { csrfTokenOf } from '../../http/trust';
import { queueJob } from '../../jobs/job-queue';
import { writeLog } from '../log/write-log';
import { isTooCommon } from './known-passwords';
import { passwordFits } from './password';
import { resetJob } from './send-reset';
import { signedInOf } from './signed-in';
import { choosePasswordBy, setPassword } from './tokens';

export function sessionRoutes(limits: Limits): Route[] {
  return [
    open(contracts.readSession, async ({ request, db, deps }) => ({
      csrfToken: csrfTokenOf(request),
      signedIn: request.person ? await signedInOf(db, request.person, today(deps)) : null,
    })),
    open(contracts.signIn, async ({ request, body, db, deps, at }) => {
      const person = await checkPassword({ ...body, db, limits, at });
      await begin(request, { personId: person.id, now: at.now });
      await writeLog(db, { at, person, action: 'signIn', outcome: 'done' });
      return { csrfToken: csrfTokenOf(request, true), signedIn: await signedInOf(db, person, today(deps)) };
    }),
    open(contracts.signOut, async ({ request, db, at }) => {
      const person = request.person ?? null;
      await end(request);
      if (person) await writeLog(db, { at, person, action: 'signOut', outcome: 'done' });
      return { csrfToken: csrfTokenOf(request, true) };
    }),
    open(contracts.askForReset, async ({ body, db, at }) => {
      await useTry(limits.linksFrom, `asked:${at.address}`);
      await useTry(limits.links, `mail:${body.email}`);
      await inTransaction(db, (tx) =>
        queueJob(tx, { kind: resetJob, payload: body, onceKey: `${resetJob} ${at.requestId}`, now: at.now }),
      );
      await writeLog(db, { at, person: null, action: 'askForReset', outcome: 'done' });
      return { sent: true as const };
    }),
    open(contracts.choosePassword, async ({ body, db, at }) => {
      await useTry(limits.linksFrom, `used:${at.address}`);
      refuseCommon(body.password, []);
      const personId = await inTransaction(db, (tx) => choosePasswordBy(tx, { ...body, now: at.now }));
      const person = await readPerson(db, personId);
      await writeLog(db, { at, person, action: 'choosePassword', outcome: 'done' });
      return { chosen: true as const };
    }),
    open(contracts.changePassword, async ({ request, body, db, at }) => {
      const person = request.person;
      if (!person) throw new Problem('not signed in');
      await useTry(limits.links, `password:${person.id}`);
      await checkOwn(db, { personId: person.id, current: body.current });
      refuseCommon(body.password, [person.email, person.name]);
      await inTransaction(db, (tx) =>
        setPassword(tx, { personId: person.id, password: body.password, now: at.now }),
      );
      await begin(request, { personId: person.id, now: at.now });
      await writeLog(db, { at, person, action: 'changePassword', outcome: 'done' });
      return { csrfToken: csrfTokenOf(request, true) };
    }),
  ];
}

function today(deps: Deps): string {
  return dayInZone(deps.clock.now(), 'UTC');
}

type Attempt = { email: string; password: string; db: Database; limits: Limits; at: Circumstances };

/** The same answer and the same work for an unknown address, a wrong password, and an account without one. */
async function checkPassword({ email, password, db, limits, at }: Attempt) {
  // A try is used before the password is looked at: a hundred at once are a hundred tries.
  await useTry(limits.account, email);
  await useTry(limits.address, at.address);
  const [row] = await db.select().from(people).where(eq(people.email, email));
  const fits = await passwordFits(row?.passwordHash ?? null, password);
  const person = row && fits ? await readPerson(db, row.id) : null;
  if (!person) {
    await writeLog(db, { at, person: null, action: 'signIn', outcome: 'refused' });
    throw new Problem('sign-in refused');
  }
  await Promise.all([limits.account.delete(email), limits.address.reward(at.address)]);
  await db.update(people).set({ lastSignedInAt: at.now }).where(eq(people.id, person.id));
  return person;
}

async function checkOwn(
  db: Database,
  { personId, current }: { personId: string; current: string },
): Promise<void> {
  const [row] = await db.select().from(people).where(eq(people.id, personId));
  if (!(await passwordFits(row?.passwordHash ?? null, current))) {
    throw new Problem('not valid', { fields: [{ path: 'current', message: 'This is not your password' }] });
  }
}

function refuseCommon(password: string, own: readonly string[]): void {
  if (isTooCommon(password, own)) {
    throw new Problem('not valid', {
      fields: [{ path: 'password', message: 'Too easy to guess. Choose another' }],
    });
  }
}

/** A new session id at every sign-in: passport regenerates the session, so a planted id is not adopted. */
function begin(request: Request, { personId, now }: { personId: string; now: string }): Promise<void> {
  return new Promise((resolve, reject) => {
    request.login({ id: personId }, (error: unknown) => {
      if (error) return reject(error as Error);
      request.session.since = now;
      request.session.seen = now;
      resolve();
    });
  });
}

function end(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logout((error: unknown) => (error ? reject(error as Error) : resolve()));
  });
}
