import { sendWaiting } from '@/server/mail/send-waiting';
import { aProduct, type Product } from '../../support/app';
import { ask, type Held, opened, signedIn } from './browser';
import { told } from './route-calls';

let product: Product;
let held: Held;
beforeAll(async () => {
  product = await aProduct('links', { PUBLIC_URL: 'http://book.fennmark.example' });
  held = await opened(product.app);
});
afterAll(() => product.close());
beforeEach(async () => {
  product.setClock('2026-03-20T09:00:00.000Z');
  await product.deps.pool.query('DELETE FROM rate_limits');
});

const aClerk = async () => product.aPerson(await product.aCompany(), ['clerk']);
const rows = async (sql: string, given: unknown[] = []) =>
  (await product.deps.pool.query(sql, given))[0] as Record<string, unknown>[];

/** Asks for a link as someone who forgot the password; returns the letter's text. */
async function letterTo(email: string, headers: Record<string, string> = {}): Promise<string> {
  await ask(product.app, 'post', '/password-resets')({ ...held, headers }).send({ email });
  await product.runJobs();
  const [letter] = await rows('SELECT text FROM outbox WHERE to_address = ? ORDER BY id DESC LIMIT 1', [
    email,
  ]);
  if (letter) return String(letter.text);
  throw new Error('no letter came');
}
const tokenIn = (text: string): string => /token=([\w-]+)/.exec(text)?.[1] ?? '';
const choose = (token: string, password = 'tide tables and gulls') =>
  ask(product.app, 'post', '/passwords')(held).send({ token, password });

describe('a link to choose a password', () => {
  it('holds a token of 256 bits of which the database keeps only the hash', async () => {
    const { email, id } = await aClerk();
    const token = tokenIn(await letterTo(email));
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    const kept = JSON.stringify(await rows('SELECT * FROM person_tokens WHERE person_id = ?', [id]));
    expect(kept).not.toContain(token);
    expect(kept).toMatch(/"token_hash":"[0-9a-f]{64}"/);
    expect(JSON.stringify(await rows('SELECT * FROM log'))).not.toContain(token);
  });

  it('stands in the outbox only until it is sent', async () => {
    const { email } = await aClerk();
    const token = tokenIn(await letterTo(email));
    const sent: string[] = [];
    await sendWaiting(product.deps, {
      sendMail: async (mail: { text?: unknown }) => {
        sent.push(String(mail.text));
      },
    } as never);
    expect(sent.some((text) => text.includes(token))).toBe(true);
    expect(JSON.stringify(await rows('SELECT * FROM outbox WHERE to_address = ?', [email]))).not.toContain(
      token,
    );
  });

  it('works once, even for two at the same moment, and ends all sessions', async () => {
    const { email } = await aClerk();
    const session = await signedIn(product.app, email);
    const token = tokenIn(await letterTo(email));
    product.setClock('2026-03-20T09:00:01.000Z');
    const answers = await Promise.all([choose(token), choose(token), choose(token)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 400, 400]);
    expect((await choose(token)).body.code).toBe('link not valid');
    expect((await ask(product.app, 'get', '/shipments')(session)).status).toBe(401);
    await signedIn(product.app, email, { password: 'tide tables and gulls' });
  });

  it('ends after an hour, or when a later one is asked for; all wrong ones are answered alike', async () => {
    const { email } = await aClerk();
    const first = tokenIn(await letterTo(email));
    await product.deps.pool.query('DELETE FROM outbox');
    const second = tokenIn(await letterTo(email));
    expect(second).not.toBe(first);
    const replaced = told(await choose(first));
    product.setClock('2026-03-20T10:00:01.000Z');
    const late = told(await choose(second));
    const guessed = told(await choose('A'.repeat(43)));
    expect(replaced.status).toBe(400);
    expect([late, guessed]).toEqual([replaced, replaced]);
  });

  it('leads to the address that was set, whatever host a request names', async () => {
    const { email } = await aClerk();
    const evil = { host: 'evil.example', 'x-forwarded-host': 'evil.example' };
    const text = await letterTo(email, evil);
    expect(text).toContain('http://book.fennmark.example/choose-password?token=');
    expect(text).not.toContain('evil.example');
  });

  it('is written five times an hour to one address, and a whole office can ask from one network', async () => {
    const { email } = await aClerk();
    const statuses: number[] = [];
    for (let n = 1; n <= 6; n += 1)
      statuses.push((await ask(product.app, 'post', '/password-resets')(held).send({ email })).status);
    expect(statuses).toEqual([200, 200, 200, 200, 200, 429]);
    const colleague = (await aClerk()).email;
    expect((await ask(product.app, 'post', '/password-resets')(held).send({ email: colleague })).status).toBe(
      200,
    );
  });
});
