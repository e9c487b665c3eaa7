import { createConnection } from 'mysql2/promise';
import { aProduct, type Product } from '../../support/app';
import { aLane, empties, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('waiting', { REQUEST_SECONDS: '2' });
  lane = await aLane(product);
  await sentEmpties(lane, { [lane.type.code]: 1 });
});
afterAll(() => product.close());

async function timed<Result>(act: () => PromiseLike<Result>): Promise<{ answer: Result; seconds: number }> {
  const begin = Date.now();
  const answer = await act();
  return { answer, seconds: (Date.now() - begin) / 1000 };
}
const send = () => lane.coordinator.post('/shipments', empties(lane, { [lane.type.code]: 3 }));
const shipments = async (): Promise<number> =>
  Number(
    ((await product.deps.pool.query('SELECT COUNT(*) AS n FROM shipments'))[0] as { n: number }[])[0]?.n,
  );

describe('a request that would wait too long', () => {
  it('for locked rows is answered 503 in time, and works again when the lock is gone', async () => {
    const holder = await createConnection({ uri: product.database.ownerUrl });
    await holder.query('START TRANSACTION');
    await holder.query('SELECT * FROM balances FOR UPDATE');
    const { answer, seconds } = await timed(send);
    expect([answer.status, answer.body.code]).toEqual([503, 'database away']);
    expect(answer.headers['retry-after']).toBe('5');
    expect(answer.headers['x-request-id']).toBe(answer.body.requestId);
    expect(seconds).toBeLessThan(4);
    // Reading does not wait for it.
    expect((await lane.coordinator.get('/shipments')).status).toBe(200);
    await holder.query('ROLLBACK');
    await holder.end();
    expect((await send()).status).toBe(200);
  });

  it('under the same key tells afterwards what became of it: one effect', async () => {
    const before = await shipments();
    const holder = await createConnection({ uri: product.database.ownerUrl });
    await holder.query('START TRANSACTION');
    await holder.query('SELECT * FROM balances FOR UPDATE');
    const again = () =>
      lane.coordinator.post('/shipments', empties(lane, { [lane.type.code]: 3 }), {
        key: 'kept-for-retries',
      });
    expect((await again()).status).toBe(503);
    await holder.query('ROLLBACK');
    await holder.end();
    const answers = [await again(), await again()];
    expect(answers.map(({ status }) => status)).toEqual([200, 200]);
    expect(answers[1]?.body).toEqual(answers[0]?.body);
    expect(await shipments()).toBe(before + 1);
  });

  it('for a connection is answered 503 in time, and all connections come back', async () => {
    const taken = await Promise.all(Array.from({ length: 8 }, () => product.deps.pool.getConnection()));
    const asked = Array.from({ length: 12 }, () => timed(() => lane.coordinator.get('/shipments')));
    for (const { answer, seconds } of await Promise.all(asked)) {
      expect(answer.status).toBe(503);
      expect(seconds).toBeLessThan(4);
    }
    for (const each of taken) each.release();
    const after = await Promise.all(Array.from({ length: 20 }, () => lane.coordinator.get('/shipments')));
    expect(after.map(({ status }) => status)).toEqual(Array(20).fill(200));
  });
});
