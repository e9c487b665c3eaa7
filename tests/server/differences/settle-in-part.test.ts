import { aScene, type Scene } from './scene';

let scene: Scene;
beforeAll(async () => {
  scene = await aScene('settle-parts');
});
afterAll(() => scene.product.close());

const settle = (differenceId: string, body: Record<string, unknown>) =>
  scene.coordinator.post(`/differences/${differenceId}/settlements`, {
    reason: 'Both docks counted again',
    ...body,
  });

/** A shipment of empties to Kestrel with so many declared and counted. */
const toKestrel = (declared: number, counted: number) => {
  const { tarnby, kestrelDock, tote } = scene;
  return scene.move({
    from: tarnby,
    to: kestrelDock,
    declared: { [tote]: declared },
    counted: { [tote]: counted },
  });
};

describe('wrong type', () => {
  it('settles both differences with one entry', async () => {
    const { tarnby, kestrelDock, tote, small } = scene;
    const { shipmentId } = await scene.move({
      from: tarnby,
      to: kestrelDock,
      declared: { [tote]: 100, [small]: 50 },
      counted: { [tote]: 96, [small]: 54 },
    });
    const [missing, surplus] = [
      await scene.theDifference(shipmentId, tote),
      await scene.theDifference(shipmentId, small),
    ];
    const before = [await scene.atSite(tarnby, tote), await scene.atSite(tarnby, small)] as const;
    const answer = await settle(missing.id, { way: 'wrong type', units: 4, swapWithId: surplus.id });
    expect(answer.status).toBe(200);
    expect((await scene.differencesOf(shipmentId)).map(({ state }) => state)).toEqual(['settled', 'settled']);
    expect(await scene.inTransit(shipmentId, tote)).toBe(0);
    expect(await scene.inTransit(shipmentId, small)).toBe(0);
    expect((await scene.atSite(tarnby, tote)) - before[0]).toBe(4);
    expect((await scene.atSite(tarnby, small)) - before[1]).toBe(-4);
    const { body } = await scene.coordinator.get(`/differences/${surplus.id}`);
    expect(body.settlements[0]).toMatchObject({ way: 'wrong type', swappedWith: 'Tote 600×400', units: 4 });
  });

  it('refuses a partner in the swap that differs the same way', async () => {
    const { tarnby, kestrelDock, tote, small } = scene;
    const { shipmentId } = await scene.move({
      from: tarnby,
      to: kestrelDock,
      declared: { [tote]: 100, [small]: 50 },
      counted: { [tote]: 96, [small]: 46 },
    });
    const answer = await settle((await scene.theDifference(shipmentId, tote)).id, {
      way: 'wrong type',
      units: 4,
      swapWithId: (await scene.theDifference(shipmentId, small)).id,
    });
    expect(answer.status).toBe(400);
    expect(answer.body.fields[0].path).toBe('swapWithId');
  });
});

describe('settling in part', () => {
  it('leaves the rest open at its own worth, takes no more than is open, and ends settled', async () => {
    const { shipmentId } = await toKestrel(400, 392);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    expect(Number(difference.atStake)).toBe(144);
    expect((await settle(difference.id, { way: 'sender miscounted', units: 3 })).body.openUnits).toBe(-5);
    expect(Number((await scene.theDifference(shipmentId, scene.tote)).atStake)).toBe(90);
    const tooMany = await settle(difference.id, { way: 'receiver miscounted', units: 6 });
    expect(tooMany.status).toBe(409);
    expect(tooMany.body).toMatchObject({ code: 'more than open', data: { open: 5, asked: 6 } });
    expect((await settle(difference.id, { way: 'receiver miscounted', units: 5 })).body.openUnits).toBe(0);
    const again = await settle(difference.id, { way: 'sender miscounted', units: 1 });
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ code: 'already settled', data: { by: 'Ane Ravn' } });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('lets one of two win who settle the same units at once', async () => {
    const { shipmentId } = await toKestrel(400, 390);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answers = await Promise.all([
      settle(difference.id, { way: 'sender miscounted', units: 10 }),
      settle(difference.id, { way: 'receiver miscounted', units: 10 }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('needs a reason and a whole number above 0', async () => {
    const { shipmentId } = await toKestrel(400, 399);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, { way: 'sender miscounted', units: 0.5, reason: ' ' });
    expect(answer.status).toBe(400);
    expect(answer.body.fields.map(({ path }: { path: string }) => path).sort()).toEqual(['reason', 'units']);
  });
});

describe('who may', () => {
  it('lets finance and auditor look but not settle', async () => {
    const { shipmentId } = await toKestrel(60, 59);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    for (const role of ['finance', 'auditor'] as const) {
      const caller = await scene.product.as(await scene.product.aPerson(scene.operator, [role]));
      const seen = await caller.get(`/differences/${difference.id}`);
      expect(seen.status).toBe(200);
      expect(seen.body.choices).toEqual([]);
      const tried = await caller.post(`/differences/${difference.id}/settlements`, {
        way: 'sender miscounted',
        units: 1,
        reason: 'x',
      });
      expect(tried.status).toBe(403);
    }
  });

  it('shows a partner nothing', async () => {
    const caller = await scene.product.as(await scene.product.aPerson(scene.kestrel, ['manager']));
    expect((await caller.get('/differences')).status).toBe(403);
  });
});
