import { and, eq } from 'drizzle-orm';
import { accounts, partnerEvents } from '@/db/schema/ledger';
import { credits, statements } from '@/db/schema/statements';
import { disputes } from '@/db/schema/differences';
import { terms } from '@/db/schema/companies';
import { inTransaction } from '@/db/transaction';
import { outsideAccount, siteAccount } from '@/server/modules/ledger/accounts';
import { postEntry } from '@/server/modules/ledger/post-entry';
import { recordEvents } from '@/server/modules/ledger/record-events';
import { aDisputeScene, type DisputeScene } from './dispute-scene';

let product: DisputeScene;
/** Each case has a Kestrel and a type of its own. */
let scene: DisputeScene;
beforeAll(async () => {
  product = await aDisputeScene('line-disputes');
});
beforeEach(async () => {
  scene = { ...product, ...(await product.afresh()) };
});
afterAll(() => product.product.close());

const issued = (given: Parameters<DisputeScene['anIssuedStatement']>[0]) =>
  scene.anIssuedStatement({ company: scene.kestrel, ...given });

/** Kestrel has 100 since 2 February and lost 12 of them on 20 February. */
async function twelveLost() {
  const { tarnby, kestrelDock, kestrel, tote, db } = scene;
  await scene.move({
    from: tarnby,
    to: kestrelDock,
    on: '2026-02-02',
    declared: { [tote]: 100 },
    counted: { [tote]: 100 },
  });
  const lossEntry = await inTransaction(db, async (tx) => {
    const entryId = await postEntry(tx, {
      kind: 'lost',
      valueDate: '2026-02-20',
      moves: [
        {
          typeCode: tote,
          from: await siteAccount(tx, kestrelDock),
          to: await outsideAccount(tx, 'lost'),
          units: 12,
          chargedCompanyId: kestrel.id,
        },
      ],
      personId: null,
    });
    await recordEvents(tx, [
      { companyId: kestrel.id, date: '2026-02-20', typeCode: tote, kind: 'lost', quantity: 12, entryId },
    ]);
    return entryId;
  });
  const statement = await issued({
    month: '2026-02',
    lines: [{ component: 'lost', typeCode: tote, quantity: 12, amount: '86.40' }],
  });
  return { lossEntry, statementId: statement.id, lineId: statement.lineIds[0] ?? '' };
}

const claim = (lineId: string, more: Record<string, unknown> = {}) => ({
  subject: 'statement line',
  lineId,
  claimed: 7,
  reason: 'sent them back',
  text: 'Five came back under the foam trays.',
  ...more,
});

const statementOf = async (id: string) =>
  (await scene.db.select().from(statements).where(eq(statements.id, id)))[0];
const heldOf = async (statementId: string) =>
  (await scene.db.select().from(disputes).where(eq(disputes.statementId, statementId))).reduce(
    (total, dispute) => total + Number(dispute.amountHeld),
    0,
  );
const givenCredits = () => scene.db.select().from(credits).where(eq(credits.companyId, scene.kestrel.id));

describe('a line of lost units of a closed month', () => {
  it('is held out of what is due, then taken back: the month assessed again differs by what was accepted', async () => {
    const { lossEntry, statementId, lineId } = await twelveLost();
    const before = await scene.assessed(scene.kestrel, '2026-02', scene.tote);
    const opened = await scene.clerk.post('/disputes', claim(lineId));
    expect(opened.body).toMatchObject({ state: 'open', amountHeld: '36.00' });
    expect((await statementOf(statementId))?.answer).toBe('disputed');
    expect(await heldOf(statementId)).toBe(36);

    const answer = await scene.answer(scene.finance, String(opened.body.id), { step: 'accept' });
    expect(answer.body).toMatchObject({ state: 'accepted', acceptedUnits: 5, acceptedAmount: '36.00' });
    expect(await heldOf(statementId)).toBe(0);
    expect((await statementOf(statementId))?.answer).toBe('awaited');
    const after = await scene.assessed(scene.kestrel, '2026-02', scene.tote);
    expect(before.units.lost - after.units.lost).toBe(5);
    // In service since 2024-06-01, so 20 whole months of 60: 18.00 × 40/60 = 12.00, less the deposit of 4.50.
    expect(Number(before.charges.loss.amount) - Number(after.charges.loss.amount)).toBeCloseTo(5 * 7.5, 9);
    expect(await givenCredits()).toEqual([]);
    expect(await scene.lostUnits(scene.tote)).toBe(7);
    expect(await scene.atSite(scene.kestrelDock, scene.tote)).toBe(93);
    const corrections = await scene.db
      .select()
      .from(partnerEvents)
      .where(and(eq(partnerEvents.companyId, scene.kestrel.id), eq(partnerEvents.kind, 'corrected')));
    expect(corrections.map(({ quantity, date }) => [quantity, date])).toEqual([[-5, '2026-02-20']]);
    expect(corrections[0]?.disputeId).toBe(opened.body.id);
    expect(lossEntry).toBeGreaterThan(0);
  });

  it('puts right the count of the shipment on which they came back', async () => {
    const { lineId } = await twelveLost();
    const { tarnby, kestrelDock, tote } = scene;
    const back = await scene.move({
      from: kestrelDock,
      to: tarnby,
      on: '2026-03-04',
      declared: { [tote]: 50 },
      counted: { [tote]: 50 },
    });
    const plant = await scene.atSite(tarnby, tote);
    const opened = await scene.clerk.post('/disputes', claim(lineId, { shipmentId: back.shipmentId }));
    const id = String(opened.body.id);
    expect((await scene.read(scene.clerk, id)).reference).toBe(back.reference);
    const answer = await scene.answer(scene.coordinator, id, {
      step: 'accept in part',
      units: 3,
      text: 'Three were in the tray stack.',
    });
    expect(answer.body).toMatchObject({ acceptedUnits: 3, acceptedAmount: '21.60' });
    expect((await scene.atSite(tarnby, tote)) - plant).toBe(3);
    expect(await scene.lostUnits(tote)).toBe(9);
    const march = await scene.assessed(scene.kestrel, '2026-03', tote);
    expect(march.units).toMatchObject({ opening: 91, returned: 53, closing: 38 });
  });

  it('gives a credit where the loss came by age, which has no entry to take back', async () => {
    const { tarnby, kestrelDock, kestrel, tote, db } = scene;
    await db.update(terms).set({ lostAfterDays: 20 }).where(eq(terms.companyId, kestrel.id));
    await scene.move({
      from: tarnby,
      to: kestrelDock,
      on: '2026-02-02',
      declared: { [tote]: 12 },
      counted: { [tote]: 12 },
    });
    expect((await scene.assessed(kestrel, '2026-02', tote)).units.lost).toBe(12);
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'lost', typeCode: tote, quantity: 12, amount: '86.40' }],
    });
    const opened = await scene.clerk.post('/disputes', claim(lineIds[0] ?? ''));
    await scene.answer(scene.finance, String(opened.body.id), { step: 'accept' });
    const [credit, ...more] = await givenCredits();
    expect(more).toEqual([]);
    expect(credit).toMatchObject({ companyId: kestrel.id, typeCode: tote, month: '2026-03' });
    expect(Number(credit?.amount)).toBe(-36);
  });

  it('gives no credit besides, where the count put right undoes the loss by age', async () => {
    const { tarnby, kestrelDock, kestrel, tote, db } = scene;
    await db.update(terms).set({ lostAfterDays: 20 }).where(eq(terms.companyId, kestrel.id));
    await scene.move({
      from: tarnby,
      to: kestrelDock,
      on: '2026-02-02',
      declared: { [tote]: 20 },
      counted: { [tote]: 20 },
    });
    const back = await scene.move({
      from: kestrelDock,
      to: tarnby,
      on: '2026-02-10',
      declared: { [tote]: 8 },
      counted: { [tote]: 8 },
    });
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'lost', typeCode: tote, quantity: 12, amount: '86.40' }],
    });
    const opened = await scene.clerk.post(
      '/disputes',
      claim(lineIds[0] ?? '', { shipmentId: back.shipmentId }),
    );
    await scene.answer(scene.finance, String(opened.body.id), { step: 'accept' });
    expect((await scene.assessed(kestrel, '2026-02', tote)).units).toMatchObject({ returned: 13, lost: 7 });
    expect(await givenCredits()).toEqual([]);
  });

  it('goes back to the sender where the partner had borne a loss on the way to it', async () => {
    const { tarnby, kestrelDock, kestrel, tote } = scene;
    scene.product.setClock('2026-02-20T09:00:00.000Z');
    const { shipmentId } = await scene.move({
      from: tarnby,
      to: kestrelDock,
      on: '2026-02-10',
      declared: { [tote]: 50 },
      counted: { [tote]: 44 },
    });
    await scene.coordinator.post(
      `/differences/${(await scene.theDifference(shipmentId, tote)).id}/settlements`,
      { way: 'lost on the way', units: 6, bearerCompanyId: kestrel.id, reason: 'Nobody has them' },
    );
    scene.product.setClock('2026-03-20T09:00:00.000Z');
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'lost', typeCode: tote, quantity: 6, amount: '45.00' }],
    });
    const opened = await scene.clerk.post(
      '/disputes',
      claim(lineIds[0] ?? '', { claimed: 0, reason: 'never arrived' }),
    );
    expect(opened.body.amountHeld).toBe('45.00');
    await scene.answer(scene.finance, String(opened.body.id), { step: 'accept' });
    expect((await scene.assessed(kestrel, '2026-02', tote)).units).toMatchObject({
      issued: 44,
      lost: 0,
      closing: 44,
    });
    expect(await scene.lostUnits(tote)).toBe(0);
    expect(await scene.inTransit(shipmentId, tote)).toBe(0);
    expect(await scene.atSite(kestrelDock, tote)).toBe(44);
    expect(await givenCredits()).toEqual([]);
    const outside = await scene.db.select().from(accounts).where(eq(accounts.kind, 'lost'));
    expect(outside).toHaveLength(1);
  });
});

describe('a line of another kind', () => {
  it('disputes a daily fee by the money that is too much, and credits what is accepted', async () => {
    const { lineIds, id } = await issued({
      month: '2026-02',
      lines: [{ component: 'daily fee', typeCode: scene.tote, quantity: 2400, amount: '72.00' }],
    });
    const lineId = lineIds[0] ?? '';
    const subject = await scene.clerk.get(`/dispute-subjects/lines/${lineId}`);
    expect(subject.body).toMatchObject({ way: null, amount: '72.00', blocked: null, shipments: [] });
    const tooMuch = await scene.clerk.post('/disputes', claim(lineId, { tooMuch: '72.01' }));
    expect(tooMuch.status).toBe(400);
    expect(tooMuch.body.fields[0].path).toBe('tooMuch');
    const opened = await scene.clerk.post(
      '/disputes',
      claim(lineId, { tooMuch: '24.00', reason: 'wrong rate' }),
    );
    expect(opened.body.amountHeld).toBe('24.00');
    const disputeId = String(opened.body.id);
    const all = await scene.answer(scene.finance, disputeId, {
      step: 'accept in part',
      amount: '24.00',
      text: 'x',
    });
    expect(all.body.fields[0].path).toBe('amount');
    const part = await scene.answer(scene.finance, disputeId, {
      step: 'accept in part',
      amount: '10.50',
      text: 'From the 12th the new rate held.',
    });
    expect(part.body).toMatchObject({
      state: 'accepted in part',
      acceptedUnits: null,
      acceptedAmount: '10.50',
    });
    const given = await givenCredits();
    expect(given.map((credit) => [Number(credit.amount), credit.month, credit.disputeId])).toEqual([
      [-10.5, '2026-03', disputeId],
    ]);
    expect(await heldOf(id)).toBe(0);
  });

  it('credits damaged units at what the line asked for each', async () => {
    const { lineIds } = await issued({
      month: '2026-02',
      lines: [{ component: 'damage', typeCode: scene.tote, quantity: 7, amount: '22.40' }],
    });
    const opened = await scene.clerk.post('/disputes', claim(lineIds[0] ?? '', { claimed: 4 }));
    expect(opened.body.amountHeld).toBe('9.60');
    await scene.answer(scene.finance, String(opened.body.id), { step: 'accept' });
    expect((await givenCredits()).map((credit) => Number(credit.amount))).toEqual([-9.6]);
  });

  it('holds the statement as disputed until the last of its disputes is decided', async () => {
    const line = (component: 'damage' | 'cleaning') => ({
      component,
      typeCode: scene.tote,
      quantity: 10,
      amount: '20.00',
    });
    const { id, lineIds } = await issued({
      month: '2026-02',
      lines: [line('damage'), line('cleaning')],
    });
    const ids = [];
    for (const lineId of lineIds)
      ids.push(String((await scene.clerk.post('/disputes', claim(lineId))).body.id));
    await scene.answer(scene.finance, ids[0] ?? '', { step: 'decline', text: 'The photos show it.' });
    expect((await statementOf(id))?.answer).toBe('disputed');
    expect(await heldOf(id)).toBe(6);
    await scene.clerk.post(`/disputes/${ids[1]}/withdrawal`, { text: 'We found the paper.' });
    expect((await statementOf(id))?.answer).toBe('awaited');
    expect(await heldOf(id)).toBe(0);
    expect(await givenCredits()).toEqual([]);
  });
});
