import { aReceipt, anImportScene, aShipment, emptyBook, type ImportScene, rowsIn } from './import-scene';

let scene: ImportScene;
beforeAll(async () => {
  scene = await anImportScene('import-decisions');
});
afterAll(() => scene.product.close());
beforeEach(() => emptyBook(scene.product));

const numbersOf = async (id: string) => (await scene.coordinator.get(`/imports/${id}`)).body.numbers;
const offersOf = async (id: string) =>
  (await scene.coordinator.get(`/imports/${id}/matches`, { state: 'offered' })).body.rows;
const decide = (decision: 'accept' | 'refuse', suggestions: string[]) =>
  scene.coordinator.post('/import-suggestions', { decision, suggestions });

/** Two like loads on one lane and one receipt without a reference: which of the two is meant is not for a machine. */
const twoLikeLoads = () =>
  scene.bringIn([
    aShipment({ reference: 'EM-501', units: 80 }),
    aShipment({ reference: 'EM-502', units: 80 }),
    aReceipt({ reference: '', units: 80 }),
  ]);

describe('a suggestion', () => {
  it('shows both sides, why, and the rival by its reference', async () => {
    const id = await twoLikeLoads();
    expect(await numbersOf(id)).toMatchObject({ offered: 2, unannounced: 1, matches: [] });
    const offers = await offersOf(id);
    expect(
      offers.map((offer: { shipments: { reference: string }[] }) => offer.shipments[0]?.reference).sort(),
    ).toEqual(['EM-501', 'EM-502']);
    expect(offers[0]).toMatchObject({ rule: 'same load', receipts: [{ reference: null }], differences: [] });
    expect(offers[0].why).toMatch(/EM-50[12]/);
    expect(offers[0].score).toBeGreaterThan(0);
  });

  it('when accepted counts its shipment and lets the others of both sides fall away', async () => {
    const id = await twoLikeLoads();
    const offers = await offersOf(id);
    const chosen = offers.find(
      (offer: { shipments: { reference: string }[] }) => offer.shipments[0]?.reference === 'EM-502',
    );
    const { status, body } = await decide('accept', [chosen.id]);
    expect([status, body]).toEqual([200, { decided: 1, skipped: [] }]);
    expect(await numbersOf(id)).toMatchObject({ offered: 0, accepted: 1, unannounced: 0 });
    const [rows] = await scene.product.deps.pool.query(
      'SELECT reference, state FROM shipments ORDER BY reference',
    );
    expect(rows).toEqual([
      { reference: 'EM-501', state: 'on the way' },
      { reference: 'EM-502', state: 'counted' },
    ]);
    const again = await decide('accept', [chosen.id]);
    expect(again.body.skipped).toMatchObject([{ problem: { code: 'state changed' } }]);
    expect(await rowsIn(scene.product, 'counts')).toBe(1);
  });

  it('accepted together with its rival is posted once, and the rival is told', async () => {
    const id = await twoLikeLoads();
    const ids = (await offersOf(id)).map((offer: { id: string }) => offer.id);
    const { body } = await decide('accept', ids);
    expect(body).toMatchObject({ decided: 1, skipped: [{ id: ids[1], problem: { code: 'state changed' } }] });
    expect(await rowsIn(scene.product, 'counts')).toBe(1);
  });

  it('when refused stays refused, also when the next file is compared', async () => {
    const id = await twoLikeLoads();
    const ids = (await offersOf(id)).map((offer: { id: string }) => offer.id);
    expect((await decide('refuse', ids)).body).toEqual({ decided: 2, skipped: [] });
    expect(await numbersOf(id)).toMatchObject({ offered: 0, refused: 2, unannounced: 1 });
    const next = await scene.bringIn([aShipment({ reference: 'EM-777', to: 'ORRIN' })]);
    expect(await numbersOf(next)).toMatchObject({ offered: 0 });
    expect(await rowsIn(scene.product, 'counts')).toBe(0);
  });

  it('that does not exist is not found, and nothing of the request is kept', async () => {
    const id = await twoLikeLoads();
    const [offer] = await offersOf(id);
    const { status } = await decide('refuse', [offer.id, '0190aaaa-0000-7000-8000-000000000000']);
    expect(status).toBe(404);
    expect(await numbersOf(id)).toMatchObject({ offered: 2, refused: 0 });
  });
});

describe('a receipt that nobody announced', () => {
  const bringOne = () =>
    scene.bringIn([aReceipt({ reference: 'X-1', from: 'ORRIN', to: 'TARNBY', units: 40 })]);

  it('stands in the list of what is unannounced with its lane, units and what is at stake', async () => {
    await bringOne();
    const { body } = await scene.coordinator.get('/differences', { kind: 'unannounced' });
    expect(body.rows).toMatchObject([
      {
        reference: 'X-1',
        from: { company: 'Orrin Sheet Metal' },
        to: { site: 'Tarnby Assembly' },
        lines: [{ typeCode: 'TOTE-64', units: 40 }],
        units: 40,
        atStake: '720.00',
        currency: 'EUR',
      },
    ]);
  });

  it('is booked as a shipment that declares nothing: counted and not declared', async () => {
    const id = await bringOne();
    const { body } = await scene.coordinator.get(`/imports/${id}/receipts`, { state: 'unannounced' });
    const receipts = [body.rows[0].id];
    const booked = await scene.coordinator.post('/import-receipts/booking', { receipts });
    expect(booked.body).toEqual({ booked: 1, skipped: [] });
    const [rows] = await scene.product.deps.pool.query(
      `SELECT s.reference, s.origin, s.state, s.contents, d.declared, d.counted, d.open_units
         FROM shipments s JOIN differences d ON d.shipment_id = s.id`,
    );
    expect(rows).toEqual([
      {
        reference: 'X-1',
        origin: 'unannounced',
        state: 'counted',
        contents: 'fulls',
        declared: 0,
        counted: 40,
        open_units: 40,
      },
    ]);
    const left = await scene.coordinator.get('/differences', { kind: 'unannounced' });
    expect(left.body.rows).toEqual([]);
    const page = await scene.coordinator.get(`/imports/${id}/receipts`, { state: 'booked' });
    expect(page.body.rows[0]).toMatchObject({ state: 'booked', shipment: { reference: 'X-1' } });
    expect(await numbersOf(id)).toMatchObject({ booked: 1, unannounced: 0, accepted: 0 });
    const twice = await scene.coordinator.post('/import-receipts/booking', { receipts });
    expect(twice.body.skipped).toMatchObject([{ problem: { code: 'state changed' } }]);
    expect(await rowsIn(scene.product, 'shipments')).toBe(1);
  });
});

describe('who may bring in movements', () => {
  it('is the coordinator: a partner is refused every route, a stranger is asked to sign in', async () => {
    const id = await twoLikeLoads();
    const stranger = await scene.product.stranger();
    const tried = (caller: typeof scene.clerk) => [
      caller.get('/imports'),
      caller.get(`/imports/${id}`),
      caller.get(`/imports/${id}/rows`),
      caller.get(`/imports/${id}/bad-rows`),
      caller.get(`/imports/${id}/shipments`),
      caller.get(`/imports/${id}/matches`),
      caller.get(`/imports/${id}/receipts`, { state: 'unannounced' }),
      caller.get('/import-template', { as: 'csv' }),
      caller.form('/imports').attach('file', Buffer.from('x'), 'x.csv'),
      caller.post(`/imports/${id}/confirmation`, { leaveOut: 0 }),
      caller.post(`/imports/${id}/drop`),
      caller.post('/import-suggestions', { decision: 'accept', suggestions: [id] }),
      caller.post('/import-receipts/booking', { receipts: [id] }),
    ];
    const statuses = async (caller: typeof scene.clerk) => {
      const answers: number[] = [];
      for (const asked of tried(caller)) answers.push((await asked).status);
      return new Set(answers);
    };
    expect(await statuses(scene.clerk)).toEqual(new Set([403]));
    expect(await statuses(stranger)).toEqual(new Set([401]));
  });
});
