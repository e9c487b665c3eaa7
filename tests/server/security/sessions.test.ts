import { createApp } from '@/server/app';
import { readConfig } from '@/server/config';
import { aProduct, type Product } from '../../support/app';
import { testPassword } from '../../support/builders';
import { ask, cookieOf, type Held, opened, signedIn } from './browser';

let product: Product;
let company: { id: string };
beforeAll(async () => {
  product = await aProduct('sessions');
  company = await product.aCompany();
});
afterAll(() => product.close());
beforeEach(() => product.setClock('2026-03-20T09:00:00.000Z'));

const aClerk = () => product.aPerson(company, ['clerk']);
const at = (path: string, held: Held) => ask(product.app, 'get', path)(held);
const statusOf = async (held: Held): Promise<number> => (await at('/shipments', held)).status;

describe('a session', () => {
  it('gets a new id at sign-in and again at a change of password; the earlier one is worth nothing', async () => {
    const { email } = await aClerk();
    const before = await opened(product.app);
    const answer = await ask(product.app, 'post', '/session')(before).send({ email, password: testPassword });
    const first = { cookie: cookieOf(answer).sent, token: String(answer.body.csrfToken) };
    expect(first.cookie).not.toBe(before.cookie);
    expect(first.token).not.toBe(before.token);
    expect([await statusOf(before), await statusOf(first)]).toEqual([401, 200]);
    const changed = await ask(
      product.app,
      'post',
      '/session/password',
    )(first).send({
      current: testPassword,
      password: 'gulls over the harbour',
    });
    const second = { cookie: cookieOf(changed).sent, token: '' };
    expect(second.cookie).not.toBe(first.cookie);
    expect([await statusOf(first), await statusOf(second)]).toEqual([401, 200]);
  });

  it('does not take an id that someone planted', async () => {
    const { email } = await aClerk();
    for (const planted of ['tarekeep=planted', 'tarekeep=s%3Aplanted.c2lnbmVk']) {
      const before = await ask(product.app, 'get', '/session')({ cookie: planted });
      expect(cookieOf(before).sent).not.toContain('planted');
      const held = { cookie: cookieOf(before).sent, token: String(before.body.csrfToken) };
      await ask(product.app, 'post', '/session')(held).send({ email, password: testPassword });
      expect(await statusOf({ cookie: planted, token: '' })).toBe(401);
    }
  });

  it('ends at once when its person signs out', async () => {
    const held = await signedIn(product.app, (await aClerk()).email);
    expect(await statusOf(held)).toBe(200);
    expect((await ask(product.app, 'delete', '/session')(held)).status).toBe(200);
    expect(await statusOf(held)).toBe(401);
  });

  it('ends at once elsewhere when the password changes', async () => {
    const { email } = await aClerk();
    const elsewhere = await signedIn(product.app, email);
    const here = await signedIn(product.app, email);
    product.setClock('2026-03-20T09:00:01.000Z');
    const changed = await ask(
      product.app,
      'post',
      '/session/password',
    )(here).send({
      current: testPassword,
      password: 'gulls over the harbour',
    });
    expect(changed.status).toBe(200);
    expect(await statusOf(elsewhere)).toBe(401);
  });

  it.each([
    ['the person is disabled', 'UPDATE people SET active = 0 WHERE id = ?'],
    [
      'the company is taken out of use',
      'UPDATE companies c JOIN people p ON p.company_id = c.id SET c.active = 0 WHERE p.id = ?',
    ],
  ])('ends at once when %s', async (_when, sql) => {
    const clerk = await product.aPerson(await product.aCompany(), ['clerk']);
    const held = await signedIn(product.app, clerk.email);
    expect(await statusOf(held)).toBe(200);
    await product.deps.pool.query(sql, [clerk.id]);
    expect(await statusOf(held)).toBe(401);
  });

  it('ends after 12 hours without a request, and not while requests come', async () => {
    const { email } = await aClerk();
    const [idle, busy] = [await signedIn(product.app, email), await signedIn(product.app, email)];
    product.setClock('2026-03-20T20:59:00.000Z');
    expect(await statusOf(busy)).toBe(200);
    product.setClock('2026-03-20T21:00:01.000Z');
    expect([await statusOf(idle), await statusOf(busy)]).toEqual([401, 200]);
  });

  it('ends after 72 hours however many requests come', async () => {
    const held = await signedIn(product.app, (await aClerk()).email);
    const begin = Date.parse('2026-03-20T09:00:00.000Z');
    for (let hours = 10; hours <= 70; hours += 10) {
      product.setClock(new Date(begin + hours * 3_600_000).toISOString());
      expect([hours, await statusOf(held)]).toEqual([hours, 200]);
    }
    product.setClock(new Date(begin + 72 * 3_600_000 + 1000).toISOString());
    expect(await statusOf(held)).toBe(401);
  });
});

describe('the cookie', () => {
  it('behind https is __Host-, Secure, HttpOnly and SameSite, and its value stands nowhere else', async () => {
    const { config } = product.deps;
    const environment = { DATABASE_URL: config.DATABASE_URL, SESSION_SECRET: config.SESSION_SECRET };
    const given = { ...environment, PUBLIC_URL: 'https://tarekeep.example', TRUST_PROXY: 'yes' };
    const app = createApp({ ...product.deps, config: readConfig(given) });
    const headers = { 'x-forwarded-proto': 'https', host: 'tarekeep.example' };
    const { email } = await aClerk();
    const before = await opened(app, headers);
    const answer = await ask(
      app,
      'post',
      '/session',
    )({ ...before, headers }).send({ email, password: testPassword });
    const { whole, sent } = cookieOf(answer);
    expect(whole).toMatch(/^__Host-tarekeep=/);
    for (const flag of ['; Path=/', '; HttpOnly', '; Secure', '; SameSite=Lax'])
      expect(whole).toContain(flag);
    expect(whole).not.toContain('Domain=');
    expect(answer.text).not.toContain(decodeURIComponent(sent.split('=')[1] ?? '').slice(2, 20));
    expect(answer.headers['strict-transport-security']).toContain('max-age=31536000');
  });
});

describe('a request forged by another page', () => {
  const wanted = { name: 'Forged', email: 'forged@kind.example', roles: ['clerk'] };

  it('is refused in every dress, and has no effect', async () => {
    const manager = await product.aPerson(company, ['manager']);
    const held = await signedIn(product.app, manager.email);
    const other = await signedIn(product.app, (await aClerk()).email);
    const key = { 'idempotency-key': 'forged-request' };
    const post = (asked: Parameters<ReturnType<typeof ask>>[0]) =>
      ask(product.app, 'post', '/people')({ ...held, ...asked, headers: { ...key, ...asked?.headers } });
    const json = JSON.stringify(wanted);
    const attempts: Record<string, Promise<{ status: number }>> = {
      'another origin': post({ headers: { origin: 'https://evil.example' } }).send(wanted),
      'no origin to tell': post({ headers: { origin: 'null' } }).send(wanted),
      'another site': post({ headers: { 'sec-fetch-site': 'cross-site' } }).send(wanted),
      'a neighbour': post({ headers: { 'sec-fetch-site': 'same-site' } }).send(wanted),
      'without a token': post({ token: '' }).send(wanted),
      'with the token of someone else': post({ token: other.token }).send(wanted),
      'as plain text': post({ headers: { 'content-type': 'text/plain' } }).send(json),
      'as a form': post({ headers: { 'content-type': 'application/x-www-form-urlencoded' } }).send(
        `body=${json}`,
      ),
      'without a kind': post({ headers: { 'content-type': '' } }).send(json),
      'as a GET': ask(
        product.app,
        'get',
        `/people?_method=POST&body=${encodeURIComponent(json)}`,
      )({
        ...held,
        headers: { 'x-http-method-override': 'POST' },
      }),
    };
    for (const [dress, attempt] of Object.entries(attempts)) {
      const { status } = await attempt;
      expect([dress, dress === 'as a GET' ? status === 200 : [403, 415].includes(status)]).toEqual([
        dress,
        true,
      ]);
    }
    const [rows] = await product.deps.pool.query('SELECT 1 FROM people WHERE email = ?', [wanted.email]);
    expect(rows).toEqual([]);
    expect((await post({}).send(wanted)).status).toBe(200);
  });
});
