import { v7 as newId } from 'uuid';
import { type Role, roles, rolesFor } from '@/shared/access/abilities';
import { mayWith } from '@/shared/access/abilities';
import { rateLimits } from '@/server/http/rate-limit';
import type { Route } from '@/server/http/route';
import { allRoutes } from '@/server/routes';
import { aProduct, type Product } from '../../support/app';
import type { Caller, Response } from '../../support/caller';

let product: Product;
let routes: Route[];
let callers: Map<Role, Caller>;

beforeAll(async () => {
  product = await aProduct('every-route');
  routes = allRoutes(product.deps, rateLimits(product.deps.pool));
  const operator = await product.aCompany({ kind: 'operator' });
  const partner = await product.aCompany();
  callers = new Map();
  for (const role of roles) {
    const company = rolesFor('operator').includes(role) ? operator : partner;
    callers.set(role, await product.as(await product.aPerson(company, [role])));
  }
});
afterAll(() => product.close());

/** The route with an unknown id in every place, an empty body, no file. */
function call(caller: Caller, { operation }: Route): Promise<Response> {
  const path = operation.path.replace(/:[A-Za-z]+/g, () => newId());
  if (operation.method === 'GET') return caller.get(path) as unknown as Promise<Response>;
  if (operation.sends === 'files')
    return caller.form(path).field('body', '{}') as unknown as Promise<Response>;
  const send = { POST: caller.post, PUT: caller.put, DELETE: caller.post }[operation.method].bind(caller);
  return (operation.method === 'DELETE'
    ? caller.delete(path)
    : send(path, {})) as unknown as Promise<Response>;
}

const guarded = (): Extract<Route, { ability: string }>[] =>
  routes.filter((route): route is Extract<Route, { ability: string }> => route.ability !== null);

describe('every route', () => {
  it('is known by one name and one place', () => {
    const names = routes.map((route) => route.operation.name);
    const places = routes.map((route) => `${route.operation.method} ${route.operation.path}`);
    expect(new Set(names).size).toBe(names.length);
    expect(new Set(places).size).toBe(places.length);
  });

  it('that needs no sign-in is one of these few', () => {
    const open = routes.filter((route) => route.ability === null).map((route) => route.operation.name);
    expect(open.sort()).toEqual(
      [
        'askForReset',
        'changePassword',
        'choosePassword',
        'readHealth',
        'readSession',
        'signIn',
        'signOut',
      ].sort(),
    );
  });

  it('answers nobody without a sign-in', async () => {
    const stranger = await product.stranger();
    for (const route of guarded()) {
      const response = await call(stranger, route);
      expect([route.operation.name, response.status]).toEqual([route.operation.name, 401]);
    }
  });

  it.each(roles)('lets a %s do what the table of abilities says, and no more', async (role) => {
    const caller = callers.get(role);
    if (!caller) throw new Error('no caller');
    for (const route of guarded()) {
      const { status } = await call(caller, route);
      const allowed = mayWith([role], route.ability);
      const refused = status === 403 || status === 401;
      expect([route.operation.name, refused, status < 500]).toEqual([route.operation.name, !allowed, true]);
    }
  });

  it('that changes something refuses a request from another origin, of another kind, or without a key', async () => {
    const caller = callers.get('coordinator');
    if (!caller) throw new Error('no caller');
    const changing = guarded().filter(
      (route) => route.operation.method === 'POST' && route.operation.sends === 'json',
    );
    for (const route of changing.filter((each) => mayWith(['coordinator'], each.ability))) {
      const path = route.operation.path.replace(/:[A-Za-z]+/g, () => newId());
      const evil = await caller.post(path, {}, { headers: { origin: 'https://evil.example' } });
      const text = await caller.post(path, 'x', { headers: { 'content-type': 'text/plain' } });
      const keyless = await caller.post(path, {}, { headers: { 'idempotency-key': '' } });
      expect([route.operation.name, evil.status, text.status]).toEqual([route.operation.name, 403, 415]);
      if (route.operation.keyed) expect([400, 404]).toContain(keyless.status);
    }
  });
});
