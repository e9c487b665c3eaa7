import { Writable } from 'node:stream';
import { sql } from 'drizzle-orm';
import { createApp } from '@/server/app';
import { loggerOf } from '@/server/http/logger';
import { people } from '@/db/schema/companies';
import { aProduct, type Product } from '../../support/app';
import { testPassword } from '../../support/builders';
import { Caller } from '../../support/caller';
import { aLane, counted, empties, type Lane } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('log-rows');
  lane = await aLane(product);
});
afterAll(() => product.close());

type LogRow = {
  at: string;
  person_id: string | null;
  action: string;
  outcome: string;
  subject_id: string | null;
  request_id: string;
  address: string;
};
const latest = async (requestId: unknown): Promise<LogRow | undefined> =>
  ((await product.deps.pool.query('SELECT * FROM log WHERE request_id = ?', [requestId]))[0] as LogRow[])[0];
type Answer = { status: number; headers: Record<string, string>; body: Record<string, unknown> };

describe('the log', () => {
  it('has a row for each sign-in, refusal, posting, correction, export and change of roles', async () => {
    const admin = await product.aPerson(lane.operator, ['administrator']);
    const administrator = await product.as(admin);
    const stranger = await product.stranger();
    const adjustment = {
      kind: 'bought',
      siteId: lane.plant.id,
      typeCode: lane.type.code,
      units: 9,
      on: '2026-03-20',
      reason: 'x',
    };
    const bought = await lane.coordinator.post('/adjustments', adjustment);
    const sent = await lane.coordinator.post('/shipments', empties(lane, { [lane.type.code]: 5 }));
    const steps: [string, string, string | null, PromiseLike<unknown>][] = [
      ['signIn', 'refused', null, stranger.post('/session', { email: lane.ivo.email, password: 'wrong' })],
      [
        'signIn',
        'done',
        lane.ivo.id,
        stranger.post('/session', { email: lane.ivo.email, password: testPassword }),
      ],
      ['refused', 'not allowed', lane.ivo.id, lane.clerk.post('/adjustments', adjustment)],
      [
        'refused',
        'request not trusted',
        null,
        lane.clerk.post('/shipments', {}, { headers: { origin: 'https://evil.example' } }),
      ],
      [
        'countShipment',
        'done',
        lane.ivo.id,
        lane.clerk.post(`/shipments/${sent.body.id}/counts`, counted({ [lane.type.code]: 5 })),
      ],
      [
        'reverseEntry',
        'done',
        lane.ane.id,
        lane.coordinator.post(`/entries/${bought.body.entryId}/reversals`, { reason: 'x' }),
      ],
      ['importTemplate', 'done', lane.ane.id, lane.coordinator.get('/import-template', { as: 'csv' })],
      ['downloadShipments', 'done', lane.ane.id, lane.coordinator.get('/shipments.xlsx')],
      [
        'changePerson',
        'done',
        admin.id,
        administrator.put(`/people/${lane.ivo.id}`, { name: 'I. Madsen', roles: ['manager'], active: true }),
      ],
    ];
    for (const [action, outcome, personId, step] of steps) {
      const { headers } = (await step) as Answer;
      const row = await latest(headers['x-request-id']);
      expect({ action: row?.action, outcome: row?.outcome, personId: row?.person_id }).toEqual({
        action,
        outcome,
        personId,
      });
      expect(row?.at).toMatch(/^2026-03-20 09:00:00/);
      expect(row?.address).toMatch(/127\.0\.0\.1|::1/);
    }
  });

  it('holds no password, token or cookie in its rows, nor does the program write one out', async () => {
    const written: string[] = [];
    const sink = new Writable({
      write: (chunk: Buffer, _encoding, done) => {
        written.push(chunk.toString());
        done();
      },
    });
    const logger = loggerOf('debug', sink);
    const app = createApp({ ...product.deps, logger });
    const { email } = await product.aPerson(lane.partner, ['clerk']);
    const caller = await Caller.signedIn(app, email);
    await caller.post('/session/password', { current: testPassword, password: 'gulls over the harbour' });
    await caller.post('/passwords', { token: 'a-token-that-is-not-one', password: 'gulls over the harbour' });
    await caller.get('/shipments', { search: 'looked-for' });
    const secret = 'a-hash-that-must-not-show';
    await product.deps.db
      .update(people)
      .set({ passwordHash: secret, name: sql`no_such_column` })
      .catch((error: unknown) => logger.error({ err: error }, 'failed'));
    const all = written.join('') + JSON.stringify((await product.deps.pool.query('SELECT * FROM log'))[0]);
    expect(written.join('')).toContain('no_such_column');
    for (const hidden of [
      testPassword,
      'gulls over the harbour',
      'a-token-that-is-not-one',
      caller.token,
      secret,
      'tarekeep=s',
      'looked-for',
    ])
      expect([hidden, all.includes(hidden)]).toEqual([hidden, false]);
  });
});
