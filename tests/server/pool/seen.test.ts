import { inTransaction } from '@/db/transaction';
import { outsideAccount, siteAccount } from '@/server/modules/ledger/accounts';
import { postEntry } from '@/server/modules/ledger/post-entry';
import { aProduct, type Product } from '../../support/app';
import { counted, empties, fulls } from '../../support/lane';
import { aPoolScene, type PoolScene } from './scene';

let product: Product;
let scene: PoolScene;
beforeAll(async () => {
  product = await aProduct('pool-seen');
  scene = await aPoolScene(product);
});
afterAll(() => product.close());

type Seen = {
  stretch: string;
  days: number | null;
  sd: number | null;
  units: number;
  unitsOut: number | null;
};

/** As somebody reads it who signs in then: sessions end while the clock moves by days. */
async function seen(): Promise<Record<string, Seen>> {
  const { body } = await (await product.as(scene.sif)).get(`/pool/${scene.type.code}`);
  return Object.fromEntries(body.seen.stretches.map((each: Seen) => [each.stretch, each]));
}

/** Empties or fulls of the lane's type that leave on one day and are counted on another, at nine in the morning. */
async function moved(kind: 'empties' | 'fulls', trip: { units: number; left: string; counted: string }) {
  const [sender, receiver] = kind === 'empties' ? [scene.ane, scene.ivo] : [scene.ivo, scene.ane];
  product.setClock(`${trip.left}T08:00:00.000Z`);
  const form = (kind === 'empties' ? empties : fulls)(scene, { [scene.type.code]: trip.units });
  const leaving = await product.as(sender);
  const sent = await leaving.post('/shipments', { ...form, leftOn: trip.left, expectedOn: trip.counted });
  product.setClock(`${trip.counted}T09:00:00.000Z`);
  const arriving = await product.as(receiver);
  const load = counted({ [scene.type.code]: trip.units });
  const count = await arriving.post(`/shipments/${sent.body.id}/counts`, load);
  if (count.status !== 200) throw new Error(`${count.status} ${JSON.stringify(count.body)}`);
}

/** The plant's stock when the book is opened. */
async function opened(units: number) {
  await inTransaction(product.deps.db, async (tx) => {
    const from = await outsideAccount(tx, 'opening');
    const to = await siteAccount(tx, { id: scene.plant.id, companyId: scene.operator.id });
    const moves = [{ typeCode: scene.type.code, from, to, units }];
    await postEntry(tx, {
      kind: 'opening',
      valueDate: '2026-03-20',
      moves,
      reason: 'Counted',
      personId: null,
    });
  });
}

describe('the loop as the book saw it', () => {
  it('is nothing before anything has moved', async () => {
    const stretches = await seen();
    expect(Object.values(stretches).map(({ days }) => days)).toEqual([null, null, null, null]);
  });

  it('counts the ways in working days, each unit once, and the stocks by Little’s law', async () => {
    await opened(1000);
    // Friday 20 March to Monday 23 March is one working day, Tuesday to Friday three.
    await moved('empties', { units: 300, left: '2026-03-20', counted: '2026-03-23' });
    await moved('empties', { units: 100, left: '2026-03-24', counted: '2026-03-27' });
    await moved('fulls', { units: 200, left: '2026-03-30', counted: '2026-03-31' });
    const stretches = await seen();
    expect(stretches['back']).toMatchObject({ shipments: 2, units: 400 });
    expect(stretches['back']?.days).toBeCloseTo((300 * 1 + 100 * 3) / 400, 12);
    expect(stretches['back']?.sd).toBeCloseTo(Math.sqrt((300 * 0.5 ** 2 + 100 * 1.5 ** 2) / 400), 12);
    expect(stretches['to the plant']).toMatchObject({ days: 1, sd: 0, shipments: 1, units: 200 });
    // Working days 20 to 31 March: 8. At the partner at the end of each: 0, 300 × 4, 400, 200, 200; 200 left as fulls.
    expect(stretches['at the partner']).toMatchObject({ units: 250, unitsOut: 200, days: 10 });
    // At the plant, of 1 000: 700, 700, 600 × 5, 800; 400 left as empties.
    expect(stretches['at the plant']).toMatchObject({ units: 650, unitsOut: 400, days: 13 });
  });

  it('does not see a stock that the book has below zero', async () => {
    await moved('fulls', { units: 5000, left: '2026-04-01', counted: '2026-04-02' });
    expect((await seen())['at the partner']?.days).toBeNull();
  });

  it('leaves out what is older than 60 days', async () => {
    expect((await seen())['back']?.units).toBe(400);
    product.setClock('2026-06-30T09:00:00.000Z');
    const { body } = await (await product.as(scene.sif)).get(`/pool/${scene.type.code}`);
    expect(body.seen).toMatchObject({ from: '2026-05-02', to: '2026-06-30' });
    const back = body.seen.stretches.find((each: Seen) => each.stretch === 'back');
    expect(back).toMatchObject({ days: null, units: 0 });
  });
});
