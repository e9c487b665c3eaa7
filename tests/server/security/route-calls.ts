import type { Product } from '../../support/app';
import type { Caller, Response } from '../../support/caller';
import { rateLimits } from '@/server/http/rate-limit';
import type { Route } from '@/server/http/route';
import { allRoutes } from '@/server/routes';

export type Guarded = Extract<Route, { ability: string }>;
export type Given = {
  params?: (name: string) => string;
  query?: Record<string, string>;
  body?: unknown;
  headers?: Record<string, string>;
};

export const routesOf = ({ deps }: Product): Route[] => allRoutes(deps, rateLimits(deps.pool));

export const guardedOf = (product: Product): Guarded[] =>
  routesOf(product).filter((route): route is Guarded => route.ability !== null);

export const paramsOf = ({ operation }: Route): string[] =>
  [...operation.path.matchAll(/:([A-Za-z]+)/g)].map((match) => match[1] ?? '');

/** Calls a route as its contract says: method, address, body as JSON or as a form without a file. */
export function callRoute(caller: Caller, { operation }: Route, given: Given = {}): Promise<Response> {
  const { params = () => 'x', query = {}, body = {}, headers = {} } = given;
  const path = operation.path.replace(/:([A-Za-z]+)/g, (_all, name: string) => params(name));
  const sent = { query, headers };
  const test = {
    GET: () => caller.get(path, query),
    POST: () =>
      operation.sends === 'files'
        ? caller.form(path, sent).field('body', JSON.stringify(body))
        : caller.post(path, body, sent),
    PUT: () => caller.put(path, body, sent),
    DELETE: () => caller.delete(path, sent),
  }[operation.method]();
  return test.buffer(true).then((response) => response);
}

/** What two answers must share to tell nobody anything: all but the number of the request. */
export function told({ status, body, text }: Response): { status: number; body: unknown } {
  const said: unknown = typeof body === 'object' && body !== null ? { ...body, requestId: '' } : text;
  return { status, body: said };
}

const uuid = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}/g;

/** Every id in an answer, that of the request apart. */
export function idsIn(response: Response): string[] {
  const own = String(response.headers['x-request-id']);
  return [...(response.text ?? '').matchAll(uuid)].map(([id]) => id).filter((id) => id !== own);
}
