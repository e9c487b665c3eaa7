import { aProduct, type Product } from '../../support/app';
import { aLane, counted, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('adjust');
  lane = await aLane(product);
});
afterAll(() => product.close());

type Given = { kind: string; units: number; siteId?: string; on?: string; typeCode?: string };
const adjust = (given: Given) =>
  lane.coordinator.post('/adjustments', {
    siteId: lane.plant.id,
    typeCode: lane.type.code,
    on: '2026-03-20',
    reason: 'Yard walk of 20 March',
    ...given,
  });
const atPlant = async (): Promise<number> =>
  (await lane.coordinator.get(`/balances/${lane.operator.id}/${lane.type.code}`)).body.atSites as number;
const eventsOf = async () => {
  const [rows] = await product.deps.pool.query(
    'SELECT kind, quantity, date FROM partner_events WHERE company_id = ? ORDER BY id',
    [lane.partner.id],
  );
  return rows;
};

describe('adjusting stock', () => {
  it('brings units in and takes them out, each way by its name', async () => {
    const before = await atPlant();
    for (const given of [
      { kind: 'opening', units: 1000 },
      { kind: 'bought', units: 200 },
      { kind: 'found', units: 5 },
      { kind: 'scrapped', units: 30 },
      { kind: 'lost', units: 2 },
    ])
      expect((await adjust(given)).status).toBe(200);
    expect(await atPlant()).toBe(before + 1000 + 200 + 5 - 30 - 2);
    expect(await eventsOf()).toEqual([]);
  });

  it('refuses more than stands there, a day to come, an unknown type, and a count that is none', async () => {
    const tooMany = await adjust({ kind: 'scrapped', units: 1_000_000 });
    expect([tooMany.status, tooMany.body.code]).toEqual([409, 'not enough units']);
    const paths = async (given: Given) =>
      ((await adjust(given)).body.fields ?? []).map((field: { path: string }) => field.path);
    expect(await paths({ kind: 'bought', units: 1, on: '2026-03-21' })).toEqual(['on']);
    expect(await paths({ kind: 'bought', units: 1, typeCode: 'NO-SUCH' })).toEqual(['typeCode']);
    expect(await paths({ kind: 'bought', units: 0 })).toEqual(['units']);
    expect(await paths({ kind: 'bought', units: 1.5 })).toEqual(['units']);
    expect(await paths({ kind: 'bought', units: 1, siteId: lane.dock.id })).toEqual(['siteId']);
  });

  it('in a closed month is refused', async () => {
    await product.deps.pool.query(
      "INSERT INTO months (month, state, reason) VALUES ('2026-01', 'closed', '')",
    );
    const { status, body } = await adjust({ kind: 'bought', units: 1, on: '2026-01-31' });
    expect([status, body.code]).toEqual([409, 'month closed']);
  });

  it('at a partner’s site enters its assessment, and is refused where that cannot be', async () => {
    const id = await sentEmpties(lane, { [lane.type.code]: 50 });
    await lane.clerk.post(`/shipments/${id}/counts`, counted({ [lane.type.code]: 50 }));
    const there = { siteId: lane.dock.id };
    expect((await adjust({ ...there, kind: 'lost', units: 6 })).status).toBe(200);
    expect(await eventsOf()).toEqual([
      { kind: 'issued', quantity: 50, date: '2026-03-20' },
      { kind: 'lost', quantity: 6, date: '2026-03-20' },
    ]);
    const found = await adjust({ ...there, kind: 'found', units: 7 });
    expect([found.status, found.body.code]).toEqual([409, 'cannot be reckoned']);
    expect(await eventsOf()).toHaveLength(2);
  });

  it('is for the coordinator alone', async () => {
    const finance = await product.as(await product.aPerson(lane.operator, ['finance']));
    const body = { kind: 'bought', siteId: lane.plant.id, typeCode: lane.type.code, units: 1 };
    const given = { ...body, on: '2026-03-20', reason: 'x' };
    expect((await finance.post('/adjustments', given)).status).toBe(403);
    expect((await lane.clerk.post('/adjustments', given)).status).toBe(403);
  });
});

describe('taking an adjustment back', () => {
  it('posts an entry that names it, on its day; a second time, even at the same moment, is refused', async () => {
    const before = await atPlant();
    const { body } = await adjust({ kind: 'bought', units: 12, on: '2026-03-18' });
    const path = `/entries/${body.entryId}/reversals`;
    const back = () => lane.coordinator.post(path, { reason: 'Booked twice' });
    const answers = await Promise.all([back(), back(), back()]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409, 409]);
    const refused = answers.find((answer) => answer.status === 409)?.body;
    expect(refused).toMatchObject({ code: 'already settled', data: { by: 'Ane Ravn' } });
    expect(await atPlant()).toBe(before);
    const movements = await lane.coordinator.get(`/balances/${lane.operator.id}/${lane.type.code}/movements`);
    const [correction] = movements.body.rows.filter((row: { kind: string }) => row.kind === 'correction');
    expect(correction).toMatchObject({ correctsEntryId: body.entryId, valueDate: '2026-03-18', units: -12 });
  });

  it('takes the partner’s loss back too', async () => {
    const { body } = await adjust({ siteId: lane.dock.id, kind: 'lost', units: 3 });
    const { status } = await lane.coordinator.post(`/entries/${body.entryId}/reversals`, { reason: 'Found' });
    expect(status).toBe(200);
    const rows = (await eventsOf()) as { kind: string; quantity: number }[];
    expect(rows.slice(-2)).toEqual([
      { kind: 'lost', quantity: 3, date: '2026-03-20' },
      { kind: 'corrected', quantity: -3, date: '2026-03-20' },
    ]);
  });

  it('reaches into a closed month, since it is a correction', async () => {
    const { body } = await adjust({ kind: 'found', units: 4, on: '2026-02-10' });
    await product.deps.pool.query("UPDATE months SET state = 'closed' WHERE month = '2026-02'");
    const { status } = await lane.coordinator.post(`/entries/${body.entryId}/reversals`, { reason: 'No' });
    expect(status).toBe(200);
  });

  it('is not for shipments, nor for what is no entry', async () => {
    const id = await sentEmpties(lane, { [lane.type.code]: 1 });
    const { body } = await lane.coordinator.get(`/shipments/${id}`);
    for (const entry of [body.entries[0].id, 999_999_999, 'x']) {
      const { status } = await lane.coordinator.post(`/entries/${entry}/reversals`, { reason: 'No' });
      expect(status).toBe(404);
    }
  });
});
