import { aProduct, type Product } from '../../support/app';
import { testPassword } from '../../support/builders';
import { ask, type Held, opened } from './browser';
import { told } from './route-calls';

let product: Product;
let held: Held;
beforeAll(async () => {
  product = await aProduct('sign-in-attacks');
  held = await opened(product.app);
});
afterAll(() => product.close());
beforeEach(() => forgetTries());

const forgetTries = () => product.deps.pool.query('DELETE FROM rate_limits');
const aClerk = async () => product.aPerson(await product.aCompany(), ['clerk']);
const tryOf = (email: string, password: string, headers: Record<string, string> = {}) =>
  ask(product.app, 'post', '/session')({ ...held, headers }).send({ email, password });
const askReset = (email: string) => ask(product.app, 'post', '/password-resets')(held).send({ email });

// That the time does not tell either is measured in `npm run bench address-known`.
describe('whether an address is known', () => {
  it('is not told in words by signing in', async () => {
    const known = await aClerk();
    const invited = await product.aPerson(await product.aCompany(), ['clerk'], { passwordHash: null });
    const nobody = 'nobody@nowhere.example';
    const answers = [known.email, invited.email, nobody].map(async (email) =>
      told(await tryOf(email, 'wrong')),
    );
    const [first, ...rest] = await Promise.all(answers);
    expect(first?.status).toBe(401);
    for (const answer of rest) expect(answer).toEqual(first);
  });

  it('is not told in words by asking for a new password', async () => {
    const known = await aClerk();
    const answers = [known.email, 'nobody@nowhere.example'].map(async (email) => told(await askReset(email)));
    const [first, second] = await Promise.all(answers);
    expect(first?.status).toBe(200);
    expect(second).toEqual(first);
  });
});

describe('guessing passwords', () => {
  it('ends after ten tries however many come at once', async () => {
    const { email } = await aClerk();
    const answers = await Promise.all(Array.from({ length: 30 }, (_, n) => tryOf(email, `guess ${n}`)));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 401).length).toBeLessThanOrEqual(10);
    expect(statuses.filter((status) => status === 429).length).toBeGreaterThanOrEqual(20);
  });

  it('leaves no transaction open behind it', async () => {
    await Promise.all(Array.from({ length: 12 }, (_, n) => tryOf(`guest${n}@kind.example`, 'wrong')));
    const held = await Promise.all(Array.from({ length: 8 }, () => product.deps.pool.getConnection()));
    const open = await Promise.all(
      held.map(async (each) => (await each.query('SELECT @@in_transaction AS open'))[0]),
    );
    for (const each of held) each.release();
    expect(open.flat()).toEqual(Array.from({ length: 8 }, () => ({ open: 0 })));
  });

  it('is not begun anew by another X-Forwarded-For', async () => {
    const { email } = await aClerk();
    const statuses: number[] = [];
    for (let n = 1; n <= 12; n += 1)
      statuses.push((await tryOf(email, `guess ${n}`, { 'x-forwarded-for': `203.0.113.${n}` })).status);
    expect(statuses).toEqual([...Array(10).fill(401), 429, 429]);
  });

  it('over many accounts ends by the address it comes from', async () => {
    const statuses: number[] = [];
    for (let n = 1; n <= 42; n += 1)
      statuses.push(
        (await tryOf(`somebody${n}@kind.example`, 'summer2026', { 'x-forwarded-for': `203.0.113.${n}` }))
          .status,
      );
    expect(statuses.filter((status) => status === 401)).toHaveLength(40);
    expect(statuses.slice(-2)).toEqual([429, 429]);
  });

  it('locks the right person out for two minutes at most, and the open session not at all', async () => {
    const clerk = await aClerk();
    const caller = await product.as(clerk);
    for (let n = 1; n <= 11; n += 1) await tryOf(clerk.email, `guess ${n}`);
    const locked = await tryOf(clerk.email, testPassword);
    expect(locked.status).toBe(429);
    expect(Number(locked.headers['retry-after'])).toBeLessThanOrEqual(120);
    expect((await caller.get('/shipments')).status).toBe(200);
  });

  it('does not cost the right person anything: signing in gives the tries back', async () => {
    const { email } = await aClerk();
    for (let n = 1; n <= 45; n += 1) {
      const { status } = await tryOf(email, n % 9 === 0 ? testPassword : 'mistyped');
      expect([n, status]).toEqual([n, n % 9 === 0 ? 200 : 401]);
      if (n % 9 === 0) held = await opened(product.app);
      if (n === 27) await product.deps.pool.query("DELETE FROM rate_limits WHERE `key` LIKE 'address%'");
    }
  });
});
