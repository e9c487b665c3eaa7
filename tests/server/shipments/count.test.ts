import { randomUUID } from 'node:crypto';
import { aProduct, type Product } from '../../support/app';
import { aLane, counted, fulls, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('count');
  lane = await aLane(product);
});
afterAll(() => product.close());

const unitsAt = async (siteId: string, typeCode: string): Promise<number> => {
  const [rows] = await product.deps.pool.query(
    'SELECT b.units FROM balances b JOIN accounts a ON a.id = b.account_id WHERE a.site_id = ? AND b.type_code = ?',
    [siteId, typeCode],
  );
  return Number((rows as { units: number }[])[0]?.units ?? 0);
};

describe('counting a shipment', () => {
  it('as declared moves the units to the receiver and opens no difference', async () => {
    const before = await unitsAt(lane.dock.id, lane.type.code);
    const id = await sentEmpties(lane);
    const { status, body } = await lane.clerk.post(
      `/shipments/${id}/counts`,
      counted({ [lane.type.code]: 400, [lane.lid.code]: 20 }),
    );
    expect(status).toBe(200);
    expect(body).toMatchObject({ shipmentId: id, differences: [] });
    expect(await unitsAt(lane.dock.id, lane.type.code)).toBe(before + 400);
    const { body: seen } = await lane.coordinator.get(`/shipments/${id}`);
    expect(seen).toMatchObject({ state: 'counted', mayCount: false, differences: [] });
    expect(seen.counts[0]).toMatchObject({ by: 'I. Madsen', source: 'person', countedOn: '2026-03-20' });
    expect(seen.entries.map((entry: { kind: string }) => entry.kind)).toEqual(['sent', 'counted']);
  });

  it('with fewer, with damaged ones and with a type never declared opens a difference for each', async () => {
    const id = await sentEmpties(lane, { [lane.type.code]: 400 });
    const { body } = await lane.clerk.post(`/shipments/${id}/counts`, {
      lines: [
        { typeCode: lane.type.code, counted: 392, damaged: 3, dirty: 2 },
        { typeCode: lane.lid.code, counted: 4 },
      ],
    });
    expect(body.differences).toEqual([
      { typeCode: lane.type.code, typeName: lane.type.name, by: -8 },
      { typeCode: lane.lid.code, typeName: lane.lid.name, by: 4 },
    ]);
    const { body: seen } = await lane.coordinator.get(`/shipments/${id}`);
    expect(seen.lines).toEqual([
      expect.objectContaining({ declared: 400, counted: 392, damaged: 3, dirty: 2, openUnits: -8 }),
      expect.objectContaining({ declared: 0, counted: 4, openUnits: 4 }),
    ]);
    const { body: list } = await lane.coordinator.get('/shipments', { state: 'differs' });
    expect(list.rows.map((row: { id: string }) => row.id)).toEqual([id]);
  });

  it('by two people at the same moment succeeds once; the other is told who and when', async () => {
    const second = await product.as(await product.aPerson(lane.partner, ['clerk'], { name: 'B. Holm' }));
    const id = await sentEmpties(lane, { [lane.type.code]: 8 });
    const count = counted({ [lane.type.code]: 8 });
    const answers = await Promise.all([
      lane.clerk.post(`/shipments/${id}/counts`, count),
      second.post(`/shipments/${id}/counts`, count),
    ]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409]);
    const refused = answers.find((answer) => answer.status === 409)?.body;
    expect(refused.code).toBe('already counted');
    expect(['I. Madsen', 'B. Holm']).toContain(refused.data.by);
    expect(refused.data.at).toBe('2026-03-20T09:00:00.000Z');
  });

  it('sent twenty times at once under one key has one effect and one answer', async () => {
    const before = await unitsAt(lane.dock.id, lane.type.code);
    const id = await sentEmpties(lane, { [lane.type.code]: 50 });
    const key = randomUUID();
    const send = (units: number) =>
      lane.clerk.post(`/shipments/${id}/counts`, counted({ [lane.type.code]: units }), { key });
    const answers = await Promise.all(Array.from({ length: 20 }, () => send(50)));
    expect(answers.map((answer) => answer.status)).toEqual(Array.from({ length: 20 }, () => 200));
    expect(new Set(answers.map((answer) => answer.text)).size).toBe(1);
    expect(await unitsAt(lane.dock.id, lane.type.code)).toBe(before + 50);
    const other = await send(49);
    expect([other.status, other.body.code]).toEqual([422, 'key used otherwise']);
  });

  it.each([
    [-1, 'a negative count'],
    [1.5, 'a fraction'],
    [1e308, 'a number no pool can hold'],
    ['8', 'text'],
    [null, 'nothing'],
  ])('refuses %p, %s, naming the field', async (units, _what) => {
    const id = await sentEmpties(lane, { [lane.type.code]: 8 });
    const { status, body } = await lane.clerk.post(`/shipments/${id}/counts`, {
      lines: [{ typeCode: lane.type.code, counted: units }],
    });
    expect([status, body.code, body.fields?.[0]?.path]).toEqual([400, 'not valid', 'lines.0.counted']);
  });

  it('refuses more damaged than counted, and a line left out', async () => {
    const id = await sentEmpties(lane);
    const { body } = await lane.clerk.post(`/shipments/${id}/counts`, {
      lines: [{ typeCode: lane.type.code, counted: 2, damaged: 3 }],
    });
    expect(body.fields.map((field: { path: string }) => field.path)).toEqual(['lines.0.damaged', 'lines']);
  });

  it('of another company’s shipment answers as if it did not exist, before and after its own count', async () => {
    const other = await product.aCompany();
    const stranger = await product.as(await product.aPerson(other, ['clerk']));
    const id = await sentEmpties(lane, { [lane.type.code]: 8 });
    const count = counted({ [lane.type.code]: 8 });
    const nowhere = '00000000-0000-7000-8000-000000000000';
    const plain = ({ status, body }: { status: number; body: object }) => ({
      status,
      body: { ...body, requestId: '' },
    });
    const none = plain(await stranger.post(`/shipments/${nowhere}/counts`, count));
    expect(none.status).toBe(404);
    expect(plain(await stranger.post(`/shipments/${id}/counts`, count))).toEqual(none);
    expect(plain(await lane.coordinator.post(`/shipments/${id}/counts`, count))).toEqual(none);
    await lane.clerk.post(`/shipments/${id}/counts`, count);
    expect(plain(await stranger.post(`/shipments/${id}/counts`, count))).toEqual(none);
  });

  it('of fulls is the plant’s, and gives the partner a return', async () => {
    const sent = await lane.clerk.post('/shipments', fulls(lane, { [lane.type.code]: 40 }));
    const { status } = await lane.coordinator.post(
      `/shipments/${sent.body.id}/counts`,
      counted({ [lane.type.code]: 40 }),
    );
    expect(status).toBe(200);
    const [events] = await product.deps.pool.query(
      'SELECT kind, quantity FROM partner_events WHERE shipment_id = ?',
      [sent.body.id],
    );
    expect(events).toEqual([{ kind: 'returned', quantity: 40 }]);
  });

  it('is dated in the receiver’s zone on the nights when clocks change', async () => {
    const count = async (instant: string): Promise<string> => {
      product.setClock('2026-03-20T09:00:00.000Z');
      lane.coordinator = await product.as(lane.ane);
      const id = await sentEmpties(lane, { [lane.type.code]: 1 });
      // Moving the clock ends sessions.
      product.setClock(instant);
      const clerk = await product.as(lane.ivo);
      await clerk.post(`/shipments/${id}/counts`, counted({ [lane.type.code]: 1 }));
      const { body } = await clerk.get(`/shipments/${id}`);
      return body.entries[1].valueDate as string;
    };
    // Copenhagen: UTC+1 until 29 March 01:00 UTC, then UTC+2; back on 25 October 01:00 UTC.
    expect(await count('2026-03-28T22:59:00.000Z')).toBe('2026-03-28');
    expect(await count('2026-03-28T23:01:00.000Z')).toBe('2026-03-29');
    expect(await count('2026-03-29T21:59:00.000Z')).toBe('2026-03-29');
    expect(await count('2026-03-29T22:01:00.000Z')).toBe('2026-03-30');
    product.setClock('2026-03-20T09:00:00.000Z');
  });
});
