import { runDue } from '@/server/jobs/schedule';
import { automaticCounts } from '@/server/modules/shipments/auto-count';
import { aProduct, type Product } from '../../support/app';
import { aLane, counted, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('auto-count');
  lane = await aLane(product);
});
afterAll(() => product.close());

/** The hour strikes at an instant, as often as there are servers. */
async function hour(instant: string): Promise<void> {
  product.setClock(instant);
  await Promise.all([runDue(product.deps, [automaticCounts]), runDue(product.deps, [automaticCounts])]);
  await product.runJobs();
}

async function mailsOf(kind: string): Promise<string[]> {
  const [rows] = await product.deps.pool.query(
    'SELECT to_address AS address FROM outbox WHERE kind = ? ORDER BY to_address',
    [kind],
  );
  return (rows as { address: string }[]).map((row) => row.address);
}

// Expected on 21 March, ten days to count: the notice goes on the 31st, the count follows on 1 April.
describe('empties that nobody counts', () => {
  it('are announced to both sides on the last day, and taken as declared on the next, once', async () => {
    const waiting = await sentEmpties(lane, { [lane.type.code]: 40 });
    const done = await sentEmpties(lane, { [lane.type.code]: 30 });
    await lane.clerk.post(`/shipments/${done}/counts`, counted({ [lane.type.code]: 30 }));
    const both = [lane.ane.email, lane.ivo.email].sort();

    await hour('2026-03-30T12:00:00.000Z');
    expect(await mailsOf('count due')).toEqual([]);
    await hour('2026-03-31T12:00:00.000Z');
    await hour('2026-03-31T13:00:00.000Z');
    expect(await mailsOf('count due')).toEqual(both);
    expect((await (await product.as(lane.ane)).get(`/shipments/${waiting}`)).body.state).toBe('on the way');

    await hour('2026-04-01T06:00:00.000Z');
    await hour('2026-04-01T07:00:00.000Z');
    expect(await mailsOf('counted automatically')).toEqual(both);
    const { body } = await (await product.as(lane.ane)).get(`/shipments/${waiting}`);
    expect(body).toMatchObject({ state: 'counted', countedOn: '2026-04-01', differences: [] });
    expect(body.counts).toEqual([expect.objectContaining({ source: 'automatic', by: null })]);
    const [events] = await product.deps.pool.query(
      'SELECT kind, quantity FROM partner_events WHERE shipment_id = ?',
      [waiting],
    );
    expect(events).toEqual([{ kind: 'issued', quantity: 40 }]);
  });

  it('are not taken as counted without a notice on an earlier day, however late it is', async () => {
    product.setClock('2026-03-20T09:00:00.000Z');
    lane.coordinator = await product.as(lane.ane);
    const late = await sentEmpties(lane, { [lane.type.code]: 5 });
    const stateNow = async () => (await (await product.as(lane.ane)).get(`/shipments/${late}`)).body.state;
    await hour('2026-05-20T12:00:00.000Z');
    expect(await stateNow()).toBe('on the way');
    await hour('2026-05-21T12:00:00.000Z');
    expect(await stateNow()).toBe('counted');
  });
});
