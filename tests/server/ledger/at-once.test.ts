import { randomUUID } from 'node:crypto';
import { checkBook } from '@/server/modules/balances/check-book';
import { aProduct, type Product } from '../../support/app';
import { aLane, counted, empties, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('at-once');
  lane = await aLane(product);
});
afterAll(() => product.close());

const numberOf = async (sql: string): Promise<number> =>
  Number(((await product.deps.pool.query(sql))[0] as { n: number }[])[0]?.n);
const entries = () => numberOf('SELECT COUNT(*) AS n FROM ledger_entries');
const adjustment = (units: number) => ({
  kind: 'bought',
  siteId: lane.plant.id,
  typeCode: lane.type.code,
  units,
  on: '2026-03-20',
  reason: 'delivery note 88',
});

describe('one key', () => {
  it('twenty times at once has one effect and one answer', async () => {
    const [key, before] = [randomUUID(), await entries()];
    const answers = await Promise.all(
      Array.from({ length: 20 }, () => lane.coordinator.post('/adjustments', adjustment(7), { key })),
    );
    expect(new Set(answers.map(({ status, text }) => `${status} ${text}`)).size).toBe(1);
    expect(answers[0]?.status).toBe(200);
    expect(await entries()).toBe(before + 1);
  });

  it('with other content, or for another operation, is refused; none or a bad one likewise', async () => {
    const [key, before] = [randomUUID(), await entries()];
    await lane.coordinator.post('/adjustments', adjustment(7), { key });
    const other = await lane.coordinator.post('/adjustments', adjustment(8), { key });
    const elsewhere = await lane.coordinator.post('/shipments', empties(lane), { key });
    expect([other.status, other.body.code, elsewhere.status]).toEqual([422, 'key used otherwise', 422]);
    for (const bad of ['', 'short', 'x'.repeat(81), 'with space 1234']) {
      const { status, body } = await lane.coordinator.post('/adjustments', adjustment(7), { key: bad });
      expect([bad, status, body.code]).toEqual([bad, 400, 'key missing']);
    }
    expect(await entries()).toBe(before + 1);
  });

  it('of one person means nothing for another', async () => {
    const [key, before] = [randomUUID(), await entries()];
    const colleague = await product.as(await product.aPerson(lane.operator, ['coordinator']));
    const mine = await lane.coordinator.post('/adjustments', adjustment(5), { key });
    const theirs = await colleague.post('/adjustments', adjustment(6), { key });
    expect([mine.status, theirs.status]).toEqual([200, 200]);
    expect(theirs.body.entryId).not.toBe(mine.body.entryId);
    expect(await entries()).toBe(before + 2);
  });

  it('is free again when the first attempt was refused', async () => {
    const key = randomUUID();
    const refused = await lane.coordinator.post(
      '/adjustments',
      { ...adjustment(1_000_000), kind: 'scrapped' },
      { key },
    );
    expect(refused.status).toBe(409);
    expect((await lane.coordinator.post('/adjustments', adjustment(1), { key })).status).toBe(200);
  });
});

describe('fifty clients', () => {
  it('that send and count for the same partner and type lose nothing and fail nowhere', async () => {
    const code = lane.type.code;
    const ids = await Promise.all(Array.from({ length: 25 }, () => sentEmpties(lane, { [code]: 10 })));
    const held = async () =>
      (await lane.coordinator.get(`/balances/${lane.partner.id}/${code}`)).body.held as number;
    const before = await held();
    const answers = await Promise.all([
      ...ids.map((id, n) => lane.clerk.post(`/shipments/${id}/counts`, counted({ [code]: 10 - (n % 3) }))),
      ...ids.map(() => lane.coordinator.post('/shipments', empties(lane, { [code]: 4 }))),
    ]);
    expect(answers.map(({ status }) => status)).toEqual(Array(50).fill(200));
    const came = ids.reduce((sum, _id, n) => sum + 10 - (n % 3), 0);
    expect(await held()).toBe(before + came);
    expect(await checkBook(product.deps.db)).toEqual({ balances: [], dailyNets: [] });
  });
});
