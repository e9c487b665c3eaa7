import { aScene, type Scene } from './scene';

let scene: Scene;
beforeAll(async () => {
  scene = await aScene('settle');
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

/** Units held by Kestrel, sent back to the plant. */
const fromKestrel = async (declared: number, counted: number) => {
  const { tarnby, kestrelDock, tote } = scene;
  await toKestrel(Math.max(declared, counted), Math.max(declared, counted));
  return scene.move({
    from: kestrelDock,
    to: tarnby,
    on: '2026-03-09',
    declared: { [tote]: declared },
    counted: { [tote]: counted },
  });
};

describe('the sender miscounted', () => {
  it.each([
    { name: 'fewer came', counted: 392, backAtSender: 8 },
    { name: 'more came', counted: 405, backAtSender: -5 },
  ])('$name: transit is emptied and the sender has $backAtSender back', async ({ counted, backAtSender }) => {
    const { shipmentId } = await toKestrel(400, counted);
    const before = await scene.atSite(scene.tarnby, scene.tote);
    const events = await scene.eventsOf(scene.kestrel);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, { way: 'sender miscounted', units: Math.abs(backAtSender) });
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({ openUnits: 0, way: 'sender miscounted' });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    expect((await scene.atSite(scene.tarnby, scene.tote)) - before).toBe(backAtSender);
    expect(await scene.eventsOf(scene.kestrel)).toEqual(events);
    const entry = (await scene.entriesOf(shipmentId)).at(-1);
    expect(entry).toMatchObject({
      kind: 'sender miscounted',
      valueDate: '2026-03-20',
      reason: 'Both docks counted again',
      personId: scene.ane.id,
      differenceId: difference.id,
    });
  });
});

describe('the receiver miscounted', () => {
  it.each([
    { name: 'fewer came', counted: 392, by: 8 },
    { name: 'more came', counted: 405, by: -5 },
  ])('$name: the count is put right by $by on its own day', async ({ counted, by }) => {
    const { shipmentId } = await toKestrel(400, counted);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, { way: 'receiver miscounted', units: Math.abs(by) });
    expect(answer.status).toBe(200);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    const [, count, entry] = await scene.entriesOf(shipmentId);
    expect(entry).toMatchObject({ valueDate: '2026-03-02', correctsEntryId: count?.id });
    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({
      kind: 'corrected',
      date: '2026-03-02',
      quantity: by,
      corrects: true,
    });
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.issued - before.units.issued).toBe(by);
    expect(Number(after.deposit.charged) - Number(before.deposit.charged)).toBeCloseTo(by * 4.5, 9);
  });

  it('writes the event on the day of the count where nothing at all had been counted', async () => {
    const { shipmentId } = await toKestrel(30, 0);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    expect((await settle(difference.id, { way: 'receiver miscounted', units: 10 })).status).toBe(200);
    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({
      kind: 'issued',
      date: '2026-03-02',
      quantity: 10,
    });
    expect((await settle(difference.id, { way: 'receiver miscounted', units: 20 })).status).toBe(200);
    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({ kind: 'corrected', quantity: 20 });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });
});

describe('lost on the way', () => {
  it('charges a sender partner that bears it', async () => {
    const { shipmentId } = await fromKestrel(200, 195);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const lostBefore = await scene.lostUnits(scene.tote);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, {
      way: 'lost on the way',
      units: 5,
      bearerCompanyId: scene.kestrel.id,
    });
    expect(answer.status).toBe(200);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    expect((await scene.lostUnits(scene.tote)) - lostBefore).toBe(5);
    const [line] = await scene.linesOf(answer.body.entryId);
    expect(line?.chargedCompanyId).toBe(scene.kestrel.id);
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.lost - before.units.lost).toBe(5);
    expect(Number(after.deposit.forfeited) - Number(before.deposit.forfeited)).toBeCloseTo(22.5, 9);
    // In service since 2024-06-01, so 21 whole months of 60: 18.00 × 39/60 = 11.70, less the deposit of 4.50.
    expect(Number(after.charges.loss.amount) - Number(before.charges.loss.amount)).toBeCloseTo(36, 9);
  });

  it('relieves a sender partner where the plant bears it', async () => {
    const { shipmentId } = await fromKestrel(200, 195);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, {
      way: 'lost on the way',
      units: 5,
      bearerCompanyId: scene.operator.id,
    });
    expect(answer.status).toBe(200);
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.lost).toBe(before.units.lost);
    expect(after.units.returned - before.units.returned).toBe(5);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('issues to a receiver partner what it then loses', async () => {
    const { shipmentId } = await toKestrel(100, 94);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    await settle(difference.id, { way: 'lost on the way', units: 6, bearerCompanyId: scene.kestrel.id });
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.issued - before.units.issued).toBe(6);
    expect(after.units.lost - before.units.lost).toBe(6);
    expect(after.units.closing).toBe(before.units.closing);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('costs a receiver partner nothing where the plant that sent bears it', async () => {
    const { shipmentId } = await toKestrel(100, 94);
    const events = await scene.eventsOf(scene.kestrel);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    await settle(difference.id, { way: 'lost on the way', units: 6, bearerCompanyId: scene.operator.id });
    expect(await scene.eventsOf(scene.kestrel)).toEqual(events);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('between two partners relieves the sender and charges the receiver that bears it', async () => {
    const { kestrelDock, orrinDock, tarnby, tote } = scene;
    await scene.move({ from: tarnby, to: kestrelDock, declared: { [tote]: 50 }, counted: { [tote]: 50 } });
    const { shipmentId } = await scene.move({
      from: kestrelDock,
      to: orrinDock,
      on: '2026-03-10',
      declared: { [tote]: 50 },
      counted: { [tote]: 47 },
    });
    const difference = await scene.theDifference(shipmentId, tote);
    expect(difference.partnerId).toBe(scene.orrin.id);
    await settle(difference.id, { way: 'lost on the way', units: 3, bearerCompanyId: scene.orrin.id });
    expect((await scene.eventsOf(scene.orrin)).map(({ kind, quantity }) => [kind, quantity])).toEqual([
      ['issued', 47],
      ['issued', 3],
      ['lost', 3],
    ]);
    const kestrel = (await scene.eventsOf(scene.kestrel)).slice(-2);
    expect(kestrel.map(({ kind, quantity }) => [kind, quantity])).toEqual([
      ['returned', 47],
      ['returned', 3],
    ]);
    expect(await scene.inTransit(shipmentId, tote)).toBe(0);
  });

  it('needs to know who bears it, and refuses a company that is not party to it', async () => {
    const { shipmentId } = await toKestrel(10, 9);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const nobody = await settle(difference.id, { way: 'lost on the way', units: 1 });
    const outsider = await settle(difference.id, {
      way: 'lost on the way',
      units: 1,
      bearerCompanyId: scene.orrin.id,
    });
    expect([nobody.status, outsider.status]).toEqual([400, 400]);
    expect(nobody.body.fields[0].path).toBe('bearerCompanyId');
    expect(outsider.body.fields[0].path).toBe('bearerCompanyId');
  });

  it('is refused, and nothing kept, where the sender never held so many', async () => {
    const { orrinDock, tarnby, small } = scene;
    const { shipmentId } = await scene.move({
      from: orrinDock,
      to: tarnby,
      declared: { [small]: 40 },
      counted: { [small]: 31 },
    });
    const entries = await scene.entriesOf(shipmentId);
    const difference = await scene.theDifference(shipmentId, small);
    const answer = await settle(difference.id, {
      way: 'lost on the way',
      units: 9,
      bearerCompanyId: scene.orrin.id,
    });
    expect(answer.status).toBe(409);
    expect(answer.body.code).toBe('cannot be reckoned');
    expect(await scene.entriesOf(shipmentId)).toEqual(entries);
    expect(await scene.theDifference(shipmentId, small)).toMatchObject({ state: 'open', openUnits: -9 });
    expect(await scene.inTransit(shipmentId, small)).toBe(9);
  });
});

describe('turned up later', () => {
  it('is a second count, dated the day it turned up', async () => {
    const { shipmentId } = await toKestrel(80, 72);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, { way: 'turned up later', units: 8 });
    expect(answer.status).toBe(200);
    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({
      kind: 'issued',
      date: '2026-03-20',
      quantity: 8,
    });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('cannot be where more came than was declared', async () => {
    const { shipmentId } = await toKestrel(80, 85);
    const difference = await scene.theDifference(shipmentId, scene.tote);
    const answer = await settle(difference.id, { way: 'turned up later', units: 5 });
    expect(answer.status).toBe(400);
    expect(answer.body.fields[0].path).toBe('way');
  });
});
