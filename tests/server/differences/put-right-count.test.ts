import { inTransaction } from '@/db/transaction';
import { putRightCount } from '@/server/modules/differences/put-right-count';
import { v7 as newId } from 'uuid';
import { aScene, now, type Scene } from './scene';

let scene: Scene;
beforeAll(async () => {
  scene = await aScene('put-right');
});
afterAll(() => scene.product.close());

const putRight = (shipmentId: string, by: number) =>
  inTransaction(scene.db, (tx) =>
    putRightCount(tx, {
      shipmentId,
      typeCode: scene.tote,
      by,
      reason: 'The signed note says so',
      disputeId: newId(),
      personId: scene.ane.id,
      now,
      today: '2026-03-20',
    }),
  );

const settle = async (shipmentId: string, body: Record<string, unknown>) => {
  const difference = await scene.theDifference(shipmentId, scene.tote);
  const answer = await scene.coordinator.post(`/differences/${difference.id}/settlements`, {
    reason: 'Nobody has them',
    ...body,
  });
  expect(answer.status).toBe(200);
};

const toKestrel = (declared: number, counted: number) => {
  const { tarnby, kestrelDock, tote } = scene;
  return scene.move({
    from: tarnby,
    to: kestrelDock,
    declared: { [tote]: declared },
    counted: { [tote]: counted },
  });
};

describe('putting a count right', () => {
  it('uses up an open difference first and takes the rest from the sender', async () => {
    const { shipmentId, countId } = await toKestrel(100, 92);
    const sender = await scene.atSite(scene.tarnby, scene.tote);
    const receiver = await scene.atSite(scene.kestrelDock, scene.tote);
    expect((await putRight(shipmentId, 11)).counted).toBe(103);
    expect(await scene.theDifference(shipmentId, scene.tote)).toMatchObject({
      state: 'settled',
      openUnits: 0,
    });
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    expect((await scene.atSite(scene.tarnby, scene.tote)) - sender).toBe(-3);
    expect((await scene.atSite(scene.kestrelDock, scene.tote)) - receiver).toBe(11);
    const entries = await scene.entriesOf(shipmentId);
    expect(entries.map(({ kind }) => kind)).toEqual(['sent', 'counted', 'receiver miscounted', 'correction']);
    expect(entries.slice(2).map((entry) => [entry.valueDate, entry.correctsEntryId, entry.countId])).toEqual([
      ['2026-03-02', entries[1]?.id, countId],
      ['2026-03-02', entries[1]?.id, countId],
    ]);
    const corrected = (await scene.eventsOf(scene.kestrel)).slice(-2);
    expect(corrected.map(({ quantity, corrects }) => [quantity, corrects])).toEqual([
      [8, true],
      [3, true],
    ]);
  });

  it('moves units back to the sender where the count had too many', async () => {
    const { shipmentId } = await toKestrel(100, 100);
    const sender = await scene.atSite(scene.tarnby, scene.tote);
    expect((await putRight(shipmentId, -8)).counted).toBe(92);
    expect((await scene.atSite(scene.tarnby, scene.tote)) - sender).toBe(8);
    expect((await putRight(shipmentId, -2)).counted).toBe(90);
    expect((await scene.eventsOf(scene.kestrel)).at(-1)).toMatchObject({ kind: 'corrected', quantity: -2 });
  });

  it('takes what the sender had been given back, once its miscount was settled', async () => {
    const { shipmentId } = await toKestrel(100, 95);
    const sender = await scene.atSite(scene.tarnby, scene.tote);
    await settle(shipmentId, { way: 'sender miscounted', units: 5 });
    await putRight(shipmentId, 5);
    expect(await scene.atSite(scene.tarnby, scene.tote)).toBe(sender);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('takes back what was written off on the way, with the loss of who bore it', async () => {
    const { shipmentId } = await toKestrel(100, 94);
    const before = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    const lostBefore = await scene.lostUnits(scene.tote);
    await settle(shipmentId, { way: 'lost on the way', units: 6, bearerCompanyId: scene.kestrel.id });
    expect((await scene.assessed(scene.kestrel, '2026-03', scene.tote)).units.lost - before.units.lost).toBe(
      6,
    );
    await putRight(shipmentId, 4);
    const after = await scene.assessed(scene.kestrel, '2026-03', scene.tote);
    expect(after.units.lost - before.units.lost).toBe(2);
    expect(after.units.issued - before.units.issued).toBe(6);
    expect(after.units.closing - before.units.closing).toBe(4);
    expect((await scene.lostUnits(scene.tote)) - lostBefore).toBe(2);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
    const sender = await scene.atSite(scene.tarnby, scene.tote);
    await putRight(shipmentId, 3);
    expect((await scene.lostUnits(scene.tote)) - lostBefore).toBe(0);
    expect((await scene.atSite(scene.tarnby, scene.tote)) - sender).toBe(-1);
    expect(await scene.inTransit(shipmentId, scene.tote)).toBe(0);
  });

  it('never goes below zero', async () => {
    const { shipmentId } = await toKestrel(100, 10);
    const entries = await scene.entriesOf(shipmentId);
    await expect(putRight(shipmentId, -11)).rejects.toMatchObject({ code: 'cannot be reckoned' });
    expect(await scene.entriesOf(shipmentId)).toEqual(entries);
    expect((await putRight(shipmentId, -10)).counted).toBe(0);
  });
});
