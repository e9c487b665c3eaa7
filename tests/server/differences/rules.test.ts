import { months } from '@/db/schema/statements';
import { companies } from '@/db/schema/companies';
import { eq } from 'drizzle-orm';
import { aScene, type Scene } from './scene';

let scene: Scene;
beforeAll(async () => {
  scene = await aScene('difference-rules');
});
afterAll(() => scene.product.close());

describe('within tolerance', () => {
  it('settles by rule at the counted quantity, and is reported', async () => {
    const { tarnby, orrinDock, orrin, tote, db } = scene;
    await db.update(companies).set({ toleranceUnits: 2 }).where(eq(companies.id, orrin.id));
    const { shipmentId, reference } = await scene.move({
      from: tarnby,
      to: orrinDock,
      declared: { [tote]: 100 },
      counted: { [tote]: 98 },
    });
    expect(await scene.inTransit(shipmentId, tote)).toBe(0);
    expect((await scene.eventsOf(orrin)).at(-1)).toMatchObject({ kind: 'issued', quantity: 98 });
    const { body } = await scene.coordinator.get('/differences', { state: 'settled', search: reference });
    expect(body.rows).toHaveLength(1);
    expect(body.rows[0]).toMatchObject({ kind: 'fewer', units: 2, ways: ['within tolerance'] });
    const open = await scene.coordinator.get('/differences', { search: reference });
    expect(open.body.rows).toEqual([]);
  });

  it('leaves one unit more than the tolerance open', async () => {
    const { tarnby, orrinDock, tote } = scene;
    const { shipmentId } = await scene.move({
      from: tarnby,
      to: orrinDock,
      declared: { [tote]: 100 },
      counted: { [tote]: 97 },
    });
    expect((await scene.theDifference(shipmentId, tote)).state).toBe('open');
  });
});

describe('in a closed month', () => {
  it('puts the count right in it, while the other ways post today', async () => {
    const { tarnby, kestrelDock, tote, db } = scene;
    const february = { from: tarnby, to: kestrelDock, on: '2026-02-10', declared: { [tote]: 100 } };
    const first = await scene.move({ ...february, counted: { [tote]: 92 } });
    const second = await scene.move({ ...february, counted: { [tote]: 94 } });
    const before = await scene.assessed(scene.kestrel, '2026-02', tote);
    await db
      .insert(months)
      .values({ month: '2026-02', state: 'closed' })
      .onDuplicateKeyUpdate({ set: { state: 'closed' } });
    const settle = async (shipmentId: string, body: Record<string, unknown>) =>
      scene.coordinator.post(`/differences/${(await scene.theDifference(shipmentId, tote)).id}/settlements`, {
        reason: 'Counted again',
        ...body,
      });
    expect((await settle(first.shipmentId, { way: 'receiver miscounted', units: 8 })).status).toBe(200);
    expect((await settle(second.shipmentId, { way: 'sender miscounted', units: 6 })).status).toBe(200);
    expect((await scene.entriesOf(first.shipmentId)).at(-1)?.valueDate).toBe('2026-02-10');
    expect((await scene.entriesOf(second.shipmentId)).at(-1)?.valueDate).toBe('2026-03-20');
    const after = await scene.assessed(scene.kestrel, '2026-02', tote);
    expect(after.units.issued - before.units.issued).toBe(8);
    // 8 units from 10 February on, 14 days free: 5 days each in February at 0.03.
    expect(after.charges.dwell.unitDays - before.charges.dwell.unitDays).toBe(8 * 5);
  });
});
