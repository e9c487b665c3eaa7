import { aProduct, type Product } from '../../support/app';
import { aLane, empties, fulls, type Lane } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('send');
  lane = await aLane(product);
});
afterAll(() => product.close());

const pathsOf = (body: { fields?: { path: string }[] }) => (body.fields ?? []).map((field) => field.path);

describe('sending a shipment', () => {
  it('is empties when the coordinator sends, and the partner sees it and is told by mail', async () => {
    const sent = await lane.coordinator.post('/shipments', empties(lane));
    expect(sent.status).toBe(200);
    expect(sent.body).toMatchObject({ contents: 'empties', toCompany: 'Kestrel Coil Works' });
    expect(sent.body.reference).toMatch(/^EM-\d{6}$/);
    const seen = await lane.clerk.get(`/shipments/${sent.body.id}`);
    expect(seen.body).toMatchObject({ state: 'on the way', direction: 'in', mayCount: true });
    expect(seen.body.lines.map((line: { declared: number }) => line.declared)).toEqual([400, 20]);
    const [mails] = await product.deps.pool.query('SELECT to_address, text FROM outbox');
    expect(mails).toEqual([
      {
        to_address: lane.ivo.email,
        text: expect.stringContaining(`/shipments/${sent.body.id}/count`),
      },
    ]);
  });

  it('is fulls when a partner sends', async () => {
    const sent = await lane.clerk.post('/shipments', fulls(lane, { [lane.type.code]: 80 }));
    expect(sent.body).toMatchObject({ contents: 'fulls', toCompany: 'Fennmark Heat Pumps' });
    expect(sent.body.reference).toMatch(/^DN-\d{6}$/);
  });

  it('is refused from a site that is not the own one, and to one of the same side', async () => {
    const other = await product.aCompany({ name: 'Pallwick Fasteners' });
    const foreign = await product.aSite(other);
    const load = fulls(lane, { [lane.type.code]: 1 });
    const from = await lane.clerk.post('/shipments', { ...load, fromSiteId: foreign.id });
    expect([from.status, pathsOf(from.body)]).toEqual([400, ['fromSiteId']]);
    const to = await lane.clerk.post('/shipments', { ...load, toSiteId: foreign.id });
    const unknown = await lane.clerk.post('/shipments', {
      ...load,
      toSiteId: '00000000-0000-7000-8000-000000000000',
    });
    expect([to.status, pathsOf(to.body)]).toEqual([400, ['toSiteId']]);
    expect({ ...unknown.body, requestId: '' }).toEqual({ ...to.body, requestId: '' });
  });

  it('names every bad field at once', async () => {
    const { status, body } = await lane.coordinator.post('/shipments', {
      ...empties(lane),
      leftOn: '2026-02-30',
      lines: [
        { typeCode: lane.type.code, declared: -1 },
        { typeCode: lane.lid.code, declared: 1.5 },
      ],
    });
    expect(status).toBe(400);
    expect(pathsOf(body).sort()).toEqual(['leftOn', 'lines.0.declared', 'lines.1.declared']);
  });

  it('is refused with a day to come, a reference used before, an unknown type, the same type twice', async () => {
    const late = await lane.coordinator.post('/shipments', {
      ...empties(lane),
      leftOn: '2026-03-21',
      expectedOn: '2026-03-22',
    });
    expect([late.status, pathsOf(late.body)]).toEqual([400, ['leftOn']]);
    const named = { ...fulls(lane, { [lane.type.code]: 1 }), reference: 'DN 88120' };
    expect((await lane.clerk.post('/shipments', named)).status).toBe(200);
    const again = await lane.clerk.post('/shipments', named);
    expect([again.status, again.body.code]).toEqual([409, 'already exists']);
    const unknown = await lane.coordinator.post('/shipments', empties(lane, { 'NO-SUCH': 1 }));
    expect([unknown.status, pathsOf(unknown.body)]).toEqual([400, ['lines.0.typeCode']]);
    const twice = await lane.coordinator.post('/shipments', {
      ...empties(lane),
      lines: [
        { typeCode: lane.type.code, declared: 1 },
        { typeCode: lane.type.code, declared: 2 },
      ],
    });
    expect([twice.status, pathsOf(twice.body)]).toEqual([400, ['lines.1.typeCode']]);
  });

  it('is refused into a closed month', async () => {
    await product.deps.pool.query(
      "INSERT INTO months (month, state, reason) VALUES ('2026-02', 'closed', '')",
    );
    const { status, body } = await lane.coordinator.post('/shipments', {
      ...empties(lane),
      leftOn: '2026-02-27',
    });
    expect([status, body.code, body.data]).toEqual([409, 'month closed', { month: '2026-02' }]);
  });

  it('offers a partner the sites of the operator only', async () => {
    const { body } = await lane.clerk.get('/shipment-choices');
    expect(body.contents).toBe('fulls');
    expect(body.from.map((site: { id: string }) => site.id)).toEqual([lane.dock.id]);
    expect(body.to.map((site: { id: string }) => site.id)).toEqual([lane.plant.id]);
  });

  it('is dated by the site: the day changes at its midnight, not at the server’s', async () => {
    const auckland = await product.aSite(lane.operator, { name: 'Far plant', timeZone: 'Pacific/Auckland' });
    // 29 March 2026: clocks go forward in Copenhagen; 23:59 there is 21:59 UTC.
    const form = { ...empties(lane, { [lane.type.code]: 1 }), expectedOn: '2026-04-02' };
    // Moving the clock ends sessions.
    const leave = async (instant: string, sent: { leftOn: string; fromSiteId?: string }) => {
      product.setClock(instant);
      const { status } = await (await product.as(lane.ane)).post('/shipments', { ...form, ...sent });
      return status;
    };
    const beforeMidnight = '2026-03-29T21:59:00.000Z';
    expect(await leave(beforeMidnight, { leftOn: '2026-03-29' })).toBe(200);
    expect(await leave(beforeMidnight, { leftOn: '2026-03-30' })).toBe(400);
    expect(await leave(beforeMidnight, { leftOn: '2026-03-30', fromSiteId: auckland.id })).toBe(200);
    expect(await leave('2026-03-29T22:01:00.000Z', { leftOn: '2026-03-30' })).toBe(200);
    product.setClock('2026-03-20T09:00:00.000Z');
  });
});

describe('the list of shipments', () => {
  beforeAll(async () => {
    lane.coordinator = await product.as(lane.ane);
  });

  it('pages by key without losing or repeating one, newest first', async () => {
    const all = (await lane.coordinator.get('/shipments', { limit: '200' })).body;
    const seen: string[] = [];
    let after: string | null = null;
    do {
      const page: { rows: { id: string }[]; next: string | null } = (
        await lane.coordinator.get('/shipments', { limit: '2', ...(after ? { after } : {}) })
      ).body;
      seen.push(...page.rows.map((row) => row.id));
      after = page.next;
    } while (after);
    expect(seen).toEqual(all.rows.map((row: { id: string }) => row.id));
    const days = all.rows.map((row: { leftOn: string }) => row.leftOn);
    expect(days).toEqual([...days].sort().reverse());
  });

  it('is narrowed by direction, contents and a part of the reference', async () => {
    const inward = await lane.coordinator.get('/shipments', { direction: 'in' });
    expect(inward.body.rows.map((row: { contents: string }) => row.contents)).toEqual(['fulls', 'fulls']);
    const found = await lane.coordinator.get('/shipments', { search: 'dn 881' });
    expect(found.body.rows.map((row: { reference: string }) => row.reference)).toEqual(['DN 88120']);
    expect((await lane.coordinator.get('/shipments', { search: '%' })).body.rows).toEqual([]);
  });

  it('shows a stranger nothing, and answers a guessed id as it answers no id', async () => {
    const other = await product.aCompany();
    const stranger = await product.as(await product.aPerson(other, ['clerk']));
    expect((await stranger.get('/shipments')).body).toEqual({ rows: [], next: null });
    const [row] = (await lane.coordinator.get('/shipments')).body.rows;
    const guessed = await stranger.get(`/shipments/${row.id}`);
    const nothing = await stranger.get('/shipments/00000000-0000-7000-8000-000000000000');
    expect([guessed.status, nothing.status]).toEqual([404, 404]);
    expect({ ...guessed.body, requestId: '' }).toEqual({ ...nothing.body, requestId: '' });
  });
});
