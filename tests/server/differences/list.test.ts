import { v7 as newId } from 'uuid';
import { imports, receiptLines, receipts } from '@/db/schema/work';
import type { DifferenceRow } from '@/shared/contracts/differences';
import { aScene, now, type Scene } from './scene';

let scene: Scene;
const shipments: Record<string, { shipmentId: string; reference: string }> = {};

beforeAll(async () => {
  scene = await aScene('difference-list');
  const { tarnby, ostrel, kestrelDock, orrinDock, tote, small } = scene;
  shipments.fewer = await scene.move({
    from: tarnby,
    to: kestrelDock,
    on: '2026-03-12',
    declared: { [tote]: 400 },
    counted: { [tote]: 392 },
  });
  shipments.more = await scene.move({
    from: orrinDock,
    to: tarnby,
    on: '2026-03-16',
    declared: { [small]: 20 },
    counted: { [small]: 21 },
  });
  const late = await scene.send({
    from: tarnby,
    to: orrinDock,
    on: '2026-03-09',
    declared: { [tote]: 60, [small]: 5 },
  });
  shipments.overdue = { shipmentId: late.id, reference: late.reference };
  // Seven days on the way on 20 March: not yet more than the partner's seven.
  await scene.send({ from: ostrel, to: kestrelDock, on: '2026-03-13', declared: { [tote]: 10 } });
  await anUnannouncedReceipt();
});
afterAll(() => scene.product.close());

async function anUnannouncedReceipt(): Promise<void> {
  const { db, ane, orrinDock, ostrel, tote } = scene;
  const importId = newId();
  const receiptId = newId();
  await db.insert(imports).values({
    id: importId,
    fileName: 'march.csv',
    state: 'done',
    rowsGood: 1,
    rowsBad: 0,
    createdBy: ane.id,
    createdAt: now,
  });
  await db.insert(receipts).values({
    id: receiptId,
    importId,
    reference: null,
    fromSiteId: orrinDock.id,
    toSiteId: ostrel.id,
    countedOn: '2026-03-19',
    state: 'unannounced',
    rowNo: 1,
    createdAt: now,
  });
  await db.insert(receiptLines).values({ receiptId, typeCode: tote, counted: 24 });
}

const asked = async (query: Record<string, string> = {}): Promise<DifferenceRow[]> => {
  const answer = await scene.coordinator.get('/differences', query);
  expect(answer.status).toBe(200);
  return answer.body.rows as DifferenceRow[];
};

describe('the list of differences', () => {
  it('holds all four kinds, oldest first, with the money at stake', async () => {
    const rows = await asked();
    expect(
      rows.map(({ kind, units, days, atStake, currency }) => [kind, units, days, atStake, currency]),
    ).toEqual([
      ['overdue', 65, 11, '1170.00', 'EUR'],
      ['fewer', 8, 8, '144.00', 'EUR'],
      ['more', 1, 4, '18.00', 'EUR'],
      ['unannounced', 24, 1, '432.00', 'EUR'],
    ]);
    expect(rows[0]?.lines.map(({ typeName, units }) => [typeName, units])).toEqual([
      ['Tote 600×400', 60],
      ['Tote 400×300', 5],
    ]);
    expect(rows[1]).toMatchObject({
      reference: shipments.fewer?.reference,
      from: { company: 'Fennmark Heat Pumps', site: 'Tarnby Assembly' },
      to: { company: 'Kestrel Coil Works' },
    });
  });

  it.each([
    [{ kind: 'fewer' }, ['fewer']],
    [{ kind: 'unannounced' }, ['unannounced']],
    [{ state: 'settled' }, []],
  ])('narrows to %j', async (query, kinds) => {
    expect((await asked(query as Record<string, string>)).map(({ kind }) => kind)).toEqual(kinds);
  });

  it('narrows by partner, type and part of a reference', async () => {
    expect((await asked({ partner: scene.kestrel.id })).map(({ kind }) => kind)).toEqual(['fewer']);
    expect((await asked({ type: scene.small })).map(({ kind }) => kind)).toEqual(['overdue', 'more']);
    const part = (shipments.overdue?.reference ?? '').slice(-5).toLowerCase();
    expect((await asked({ search: part })).map(({ kind }) => kind)).toEqual(['overdue']);
    expect(await asked({ search: '%' })).toEqual([]);
  });

  it('goes through all pages without leaving out or repeating a row', async () => {
    const seen: string[] = [];
    let after: string | null = null;
    for (let page = 0; page < 6; page += 1) {
      const query: Record<string, string> = { limit: '1', ...(after ? { after } : {}) };
      const { body } = await scene.coordinator.get('/differences', query);
      seen.push(...(body.rows as DifferenceRow[]).map(({ id }) => id));
      after = body.next as string | null;
      if (after === null) break;
    }
    expect(seen).toEqual((await asked()).map(({ id }) => id));
  });

  it('refuses a key that is none', async () => {
    const answer = await scene.coordinator.get('/differences', { after: 'x' });
    expect(answer.status).toBe(400);
  });

  it('shows the other side of one: count, bearers and the ways that fit', async () => {
    const [difference] = await scene.differencesOf(shipments.fewer?.shipmentId ?? '');
    const { body } = await scene.coordinator.get(`/differences/${difference?.id}`);
    expect(body).toMatchObject({ declared: 400, counted: 392, openUnits: -8 });
    expect(body.choices).toEqual([
      'sender miscounted',
      'receiver miscounted',
      'lost on the way',
      'turned up later',
    ]);
    expect(
      body.bearers.map(({ company, side }: { company: string; side: string }) => [company, side]),
    ).toEqual([
      ['Fennmark Heat Pumps', 'sender'],
      ['Kestrel Coil Works', 'receiver'],
    ]);
  });

  it('answers not found for an id that is none of its own', async () => {
    expect((await scene.coordinator.get(`/differences/${newId()}`)).status).toBe(404);
  });
});
