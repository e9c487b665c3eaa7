import type { RequestHandler } from 'express';
import session from 'express-session';
import mysqlSession from 'express-mysql-session';
import passport from 'passport';
import { Problem } from '@/shared/problems/problems';
import type { Deps } from '../deps';
import { readPerson } from './person';

const hour = 3_600_000;

/** Sessions live in MariaDB, so that any server can take the next request. Expired rows are cleared by a job. */
export function sessions(deps: Deps): RequestHandler {
  const { config } = deps;
  const secure = config.PUBLIC_URL.startsWith('https:');
  const Store = mysqlSession(session as never);
  const store = new Store(
    {
      clearExpired: false,
      // How long a session lives is judged by its own instants, below; a write for every request would tell nothing.
      disableTouch: true,
      createDatabaseTable: false,
      expiration: config.SESSION_MAX_HOURS * hour,
      schema: {
        tableName: 'sessions',
        columnNames: { session_id: 'session_id', expires: 'expires', data: 'data' },
      },
    },
    deps.pool as never,
  );
  return session({
    name: secure ? '__Host-tarekeep' : 'tarekeep',
    secret: config.SESSION_SECRET,
    store,
    resave: false,
    saveUninitialized: false,
    proxy: config.TRUST_PROXY,
    cookie: { httpOnly: true, secure, sameSite: 'lax', path: '/', maxAge: config.SESSION_MAX_HOURS * hour },
  });
}

/** Puts request.person in place when the session is good; a void session is ended at once. */
export function currentPerson(deps: Deps): RequestHandler {
  return async (request, _response, next) => {
    const id = request.user?.id;
    if (!id) return next();
    const person = await readPerson(deps.db, id);
    if (person && isLive(request.session, { person, deps })) {
      request.person = person;
      touch(request.session, deps);
      return next();
    }
    request.logout((error: unknown) => {
      next(error ?? (request.path === '/session' ? undefined : new Problem('not signed in')));
    });
  };
}

type Held = { since?: string; seen?: string };
type Judged = { person: { sessionsFrom: string }; deps: Deps };

function isLive(held: Held, { person, deps }: Judged): boolean {
  const now = deps.clock.now().getTime();
  const since = Date.parse(held.since ?? '');
  const seen = Date.parse(held.seen ?? held.since ?? '');
  return (
    since >= Date.parse(person.sessionsFrom) &&
    now - since <= deps.config.SESSION_MAX_HOURS * hour &&
    now - seen <= deps.config.SESSION_IDLE_HOURS * hour
  );
}

/** Written at most once in five minutes: the store is not for every request. */
function touch(held: Held, deps: Deps): void {
  const now = deps.clock.now();
  if (now.getTime() - Date.parse(held.seen ?? held.since ?? '') > 300_000) held.seen = now.toISOString();
}

passport.serializeUser((user, done) => done(null, user.id));
passport.deserializeUser((id: string, done) => done(null, { id }));
