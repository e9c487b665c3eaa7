import type { Express } from 'express';
import request, { type Response, type Test } from 'supertest';
import { testPassword } from '../../support/builders';

type Asked = { cookie?: string; token?: string; headers?: Record<string, string> };

/** One request by hand, with the cookie and headers that the case wants. */
export function ask(app: Express, method: 'get' | 'post' | 'delete', path: string) {
  return ({ cookie, token, headers = {} }: Asked = {}): Test => {
    const test = request(app)[method](`/api${path}`);
    if (cookie) test.set('cookie', cookie);
    if (token) test.set('x-csrf-token', token);
    for (const [name, value] of Object.entries(headers)) test.set(name, value);
    return test;
  };
}

/** The session cookie that an answer sets, whole and as a browser would send it back. */
export function cookieOf({ headers }: Response): { whole: string; sent: string } {
  const [whole = ''] = (headers['set-cookie'] as unknown as string[] | undefined) ?? [];
  return { whole, sent: whole.split(';')[0] ?? '' };
}

export type Held = { cookie: string; token: string };

/** Opens a session as a stranger, with a cookie of the caller's choice at first if one is given. */
export async function opened(app: Express, headers: Record<string, string> = {}): Promise<Held> {
  const answer = await ask(app, 'get', '/session')({ headers });
  return { cookie: cookieOf(answer).sent, token: String(answer.body.csrfToken) };
}

export async function signedIn(
  app: Express,
  email: string,
  { password = testPassword, headers = {} }: { password?: string; headers?: Record<string, string> } = {},
): Promise<Held> {
  const before = await opened(app, headers);
  const answer = await ask(app, 'post', '/session')({ ...before, headers }).send({ email, password });
  if (answer.status !== 200) throw new Error(`sign-in answered ${answer.status} ${answer.text}`);
  return { cookie: cookieOf(answer).sent, token: String(answer.body.csrfToken) };
}
