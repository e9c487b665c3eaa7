import { jobs, receipts } from '@/db/schema/work';
import { runImport } from '@/server/modules/imports/run-import';
import { eq } from 'drizzle-orm';
import { csvOf, type MonthRow } from '../../support/month-file';
import { aReceipt, anImportScene, aShipment, emptyBook, type ImportScene, rowsIn } from './import-scene';

let scene: ImportScene;
beforeAll(async () => {
  scene = await anImportScene('import-posting');
});
afterAll(() => scene.product.close());
beforeEach(() => emptyBook(scene.product));

const numbersOf = async (id: string) => (await scene.coordinator.get(`/imports/${id}`)).body.numbers;
const matchesOf = async (id: string, query: Record<string, string> = {}) =>
  (await scene.coordinator.get(`/imports/${id}/matches`, query)).body.rows;

describe('a confirmed file', () => {
  it('posts its shipments, counts them by its receipts and opens what differs', async () => {
    const id = await scene.bringIn([
      aShipment(),
      aShipment({ type: 'LID-128', units: 20 }),
      aReceipt({ reference: 'em 1001', units: 392, damaged: 3, dirty: 2 }),
      aReceipt({ reference: 'em 1001', type: 'LID-128', units: 20 }),
      aShipment({ reference: 'EM-1002', to: 'ORRIN' }),
    ]);
    const numbers = await numbersOf(id);
    expect(numbers.shipments).toEqual({ posted: 2, known: 0, refused: 0 });
    expect(numbers.matches).toEqual([{ rule: 'same reference', groups: 1 }]);
    expect(numbers).toMatchObject({ onTheWay: 1, overdue: 1, unannounced: 0, duplicates: 0 });
    const [lines] = await scene.product.deps.pool.query(
      `SELECT l.type_code, l.counted, l.damaged, l.dirty, c.source, s.origin, s.state
         FROM count_lines l JOIN counts c ON c.id = l.count_id JOIN shipments s ON s.id = c.shipment_id
        ORDER BY l.type_code DESC`,
    );
    expect(lines).toEqual([
      {
        type_code: 'TOTE-64',
        counted: 392,
        damaged: 3,
        dirty: 2,
        source: 'import',
        origin: 'import',
        state: 'counted',
      },
      {
        type_code: 'LID-128',
        counted: 20,
        damaged: 0,
        dirty: 0,
        source: 'import',
        origin: 'import',
        state: 'counted',
      },
    ]);
    const [open] = await scene.product.deps.pool.query(
      'SELECT type_code, open_units, state FROM differences',
    );
    expect(open).toEqual([{ type_code: 'TOTE-64', open_units: -8, state: 'open' }]);
    const [match] = await matchesOf(id);
    expect(match).toMatchObject({
      rule: 'same reference',
      shipments: [{ reference: 'EM-1001', from: 'Tarnby Assembly', to: 'Pallwick Fasteners' }],
      receipts: [{ reference: 'em 1001', day: '2026-03-03' }],
      differences: [{ typeCode: 'TOTE-64', declared: 400, counted: 392 }],
    });
  });

  it('is posted once, however often it is confirmed', async () => {
    const { body } = await scene.upload(csvOf([aShipment(), aReceipt()]));
    const path = `/imports/${body.id}/confirmation`;
    const answers = await Promise.all([1, 2, 3].map(() => scene.coordinator.post(path, { leaveOut: 0 })));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
    await scene.product.runJobs();
    await scene.coordinator.post(path, { leaveOut: 0 });
    await scene.product.runJobs();
    expect(await rowsIn(scene.product, 'jobs')).toBe(1);
    expect(await rowsIn(scene.product, 'shipments')).toBe(1);
    expect(await rowsIn(scene.product, 'counts')).toBe(1);
    expect(await rowsIn(scene.product, 'ledger_entries')).toBe(2);
  });

  it('leaves bad rows out only when their number is said', async () => {
    const { body } = await scene.upload(
      csvOf([aShipment(), aShipment({ reference: 'EM-2', type: 'CRATE-9' })]),
    );
    const path = `/imports/${body.id}/confirmation`;
    const silent = await scene.coordinator.post(path, { leaveOut: 0 });
    expect([silent.status, silent.body.fields[0].path]).toEqual([400, 'leaveOut']);
    expect(await rowsIn(scene.product, 'jobs')).toBe(0);
    expect((await scene.coordinator.post(path, { leaveOut: 1 })).body.state).toBe('running');
    await scene.product.runJobs();
    expect(await rowsIn(scene.product, 'shipments')).toBe(1);
  });

  it('takes a shipment that the book holds alike as that one, and reports one that says otherwise', async () => {
    await scene.bringIn([aShipment(), aShipment({ reference: 'EM-1002' })]);
    const id = await scene.bringIn([
      aShipment(),
      aShipment({ reference: 'EM-1002', units: 401 }),
      aReceipt(),
    ]);
    const numbers = await numbersOf(id);
    expect(numbers.shipments).toEqual({ posted: 0, known: 1, refused: 1 });
    expect(numbers.matches).toEqual([{ rule: 'same reference', groups: 1 }]);
    const { body } = await scene.coordinator.get(`/imports/${id}/shipments`, { outcome: 'refused' });
    expect(body.rows).toMatchObject([
      { rowNo: 3, reference: 'EM-1002', problem: { code: 'already exists' }, shipmentId: expect.any(String) },
    ]);
    expect(await rowsIn(scene.product, 'shipments')).toBe(2);
  });

  it('reports what a month that was closed meanwhile refuses, and posts the rest', async () => {
    const { body } = await scene.upload(
      csvOf([aShipment({ date: '2026-02-27' }), aShipment({ reference: 'EM-1002' })]),
    );
    await scene.product.deps.pool.query("INSERT INTO months (month, state) VALUES ('2026-02', 'closed')");
    await scene.coordinator.post(`/imports/${body.id}/confirmation`, { leaveOut: 0 });
    await scene.product.runJobs();
    expect((await numbersOf(body.id)).shipments).toEqual({ posted: 1, known: 0, refused: 1 });
    const { body: page } = await scene.coordinator.get(`/imports/${body.id}/shipments`, {
      outcome: 'refused',
    });
    expect(page.rows[0].problem).toEqual({ code: 'month closed', data: { month: '2026-02' } });
  });
});

describe('what the receipts of a file match', () => {
  it('sums a split delivery into one count on the day of the last part', async () => {
    const id = await scene.bringIn([
      aShipment(),
      aReceipt({ units: 150 }),
      aReceipt({ units: 250, date: '2026-03-05' }),
    ]);
    expect((await numbersOf(id)).matches).toEqual([{ rule: 'split delivery', groups: 1 }]);
    const [rows] = await scene.product.deps.pool.query(
      'SELECT c.counted_on, l.counted FROM counts c JOIN count_lines l ON l.count_id = c.id',
    );
    expect(rows).toEqual([{ counted_on: '2026-03-05', counted: 400 }]);
    expect(await rowsIn(scene.product, 'differences')).toBe(0);
  });

  it('divides a combined delivery in the order of the references, the shortage on the last', async () => {
    const id = await scene.bringIn([
      aShipment({ reference: 'EM-2001', units: 100 }),
      aShipment({ reference: 'EM-2002', units: 60 }),
      aReceipt({ reference: 'EM-2002 + EM-2001', units: 155 }),
    ]);
    expect((await numbersOf(id)).matches).toEqual([{ rule: 'combined delivery', groups: 1 }]);
    const [rows] = await scene.product.deps.pool.query(
      `SELECT s.reference, l.counted, c.note FROM shipments s JOIN counts c ON c.shipment_id = s.id
         JOIN count_lines l ON l.count_id = c.id ORDER BY s.reference`,
    );
    expect(rows).toEqual([
      { reference: 'EM-2001', counted: 100, note: 'Counted together with EM-2002.' },
      { reference: 'EM-2002', counted: 55, note: 'Counted together with EM-2001.' },
    ]);
  });

  it('books what was entered at another site where the shipment went, and notes the place', async () => {
    const id = await scene.bringIn([
      aShipment({ reference: 'DN-31', from: 'PALLWICK', to: 'TARNBY' }),
      aReceipt({ reference: 'DN-31', from: 'PALLWICK', to: 'OSTREL' }),
    ]);
    expect((await numbersOf(id)).matches).toEqual([{ rule: 'other site', groups: 1 }]);
    const [rows] = await scene.product.deps.pool.query(
      `SELECT c.note, i.code FROM counts c JOIN shipments s ON s.id = c.shipment_id JOIN sites i ON i.id = s.to_site_id`,
    );
    expect(rows).toEqual([
      { note: 'In the file it stands as counted at Ostrel Compressor Hall.', code: 'TARNBY' },
    ]);
  });

  it('tells a double entry with the receipt that was kept', async () => {
    const id = await scene.bringIn([aShipment(), aReceipt(), aReceipt()]);
    expect(await numbersOf(id)).toMatchObject({ duplicates: 1, unannounced: 0 });
    const { body } = await scene.coordinator.get(`/imports/${id}/receipts`, { state: 'duplicate' });
    expect(body.rows).toMatchObject([
      { rowNo: 4, first: { reference: 'EM-1001', rowNo: 3 }, shipment: { reference: 'EM-1001' } },
    ]);
    expect(await rowsIn(scene.product, 'counts')).toBe(1);
  });

  it('does not count again what a person has counted, and shows the receipt beside that count', async () => {
    await scene.bringIn([aShipment()]);
    const [[shipment]] = (await scene.product.deps.pool.query('SELECT id FROM shipments')) as unknown as [
      { id: string }[],
    ];
    const counted = await scene.clerk.post(`/shipments/${shipment?.id}/counts`, {
      countedOn: '2026-03-03',
      lines: [{ typeCode: 'TOTE-64', counted: 400, damaged: 0, dirty: 0 }],
    });
    expect(counted.status).toBe(200);
    const id = await scene.bringIn([aReceipt({ units: 392 })]);
    expect(await numbersOf(id)).toMatchObject({ notPosted: 1, duplicates: 1, unannounced: 0, matches: [] });
    const [match] = await matchesOf(id, { state: 'not posted' });
    expect(match).toMatchObject({
      problem: { code: 'already counted' },
      shipments: [{ reference: 'EM-1001' }],
    });
    expect(await rowsIn(scene.product, 'counts')).toBe(1);
  });

  it('finds the shipment of a receipt that came with an earlier file', async () => {
    const early = await scene.bringIn([aReceipt({ reference: 'EM-9' })]);
    expect((await numbersOf(early)).unannounced).toBe(1);
    const late = await scene.bringIn([aShipment({ reference: 'EM-9' })]);
    expect((await numbersOf(late)).matches).toEqual([{ rule: 'same reference', groups: 1 }]);
    expect((await numbersOf(early)).unannounced).toBe(0);
  });
});

describe('a posting that is killed', () => {
  const month = (): MonthRow[] =>
    [...Array(60)].flatMap((_, at) => {
      const reference = `K-${100 + at}`;
      return [
        aShipment({ reference, units: 10 + at }),
        aReceipt({ reference, units: 10 + at - (at % 7 === 0 ? 1 : 0) }),
      ];
    });

  it.each([1, 3, 4, 5, 6])('goes on where it stood after breaking off at step %i of 7', async (breakAt) => {
    const { body } = await scene.upload(csvOf(month()));
    await scene.coordinator.post(`/imports/${body.id}/confirmation`, { leaveOut: 0 });
    const { deps } = scene.product;
    const [job] = await deps.db.select().from(jobs);
    if (!job) throw new Error('no job was queued');
    let told = 0;
    const killed = runImport(deps, job, async () => {
      told += 1;
      if (told === breakAt) throw new Error('killed');
    });
    await expect(killed).rejects.toThrow('killed');
    const halfway = await rowsIn(scene.product, 'counts');
    await scene.product.runJobs();
    expect(halfway).toBeLessThan(60);
    expect(await rowsIn(scene.product, 'shipments')).toBe(60);
    expect(await rowsIn(scene.product, 'counts')).toBe(60);
    expect(await rowsIn(scene.product, 'ledger_entries')).toBe(120);
    expect(await rowsIn(scene.product, 'differences')).toBe(9);
    const matched = await deps.db.select().from(receipts).where(eq(receipts.state, 'matched'));
    expect(matched).toHaveLength(60);
    expect((await scene.coordinator.get(`/imports/${body.id}`)).body).toMatchObject({
      state: 'done',
      progress: { done: 121, of: 121 },
    });
  });

  it('that gave up is told as broken off, and goes on when it is asked to', async () => {
    const { body } = await scene.upload(csvOf(month()));
    const path = `/imports/${body.id}`;
    await scene.coordinator.post(`${path}/confirmation`, { leaveOut: 0 });
    const { deps } = scene.product;
    const [job] = await deps.db.select().from(jobs);
    if (!job) throw new Error('no job was queued');
    const lastTry = runImport(deps, { ...job, attempts: 5 }, () => Promise.reject(new Error('killed')));
    await expect(lastTry).rejects.toThrow('killed');
    await deps.db.update(jobs).set({ state: 'failed' });
    expect((await scene.coordinator.get(path)).body).toMatchObject({ state: 'failed', broken: true });
    await scene.coordinator.post(`${path}/confirmation`, { leaveOut: 0 });
    await scene.product.runJobs();
    expect((await scene.coordinator.get(path)).body.state).toBe('done');
    expect(await rowsIn(scene.product, 'shipments')).toBe(60);
    expect(await rowsIn(scene.product, 'counts')).toBe(60);
  });
});

describe('two files at once', () => {
  it('that hold the same shipments and receipts post each once', async () => {
    const rows = [...Array(25)].flatMap((_, at) => [
      aShipment({ reference: `T-${at}`, units: 20 + at }),
      aReceipt({ reference: `T-${at}`, units: 20 + at }),
    ]);
    const ids: string[] = [];
    for (const name of ['a.csv', 'b.csv']) {
      const { body } = await scene.upload(csvOf(rows), name);
      await scene.coordinator.post(`/imports/${body.id}/confirmation`, { leaveOut: 0 });
      ids.push(body.id);
    }
    await Promise.all([scene.product.runJobs(), scene.product.runJobs()]);
    await scene.product.runJobs();
    expect(await rowsIn(scene.product, 'shipments')).toBe(25);
    expect(await rowsIn(scene.product, 'counts')).toBe(25);
    expect(await rowsIn(scene.product, 'ledger_entries')).toBe(50);
    const states = await Promise.all(ids.map((id) => scene.coordinator.get(`/imports/${id}`)));
    expect(states.map(({ body }) => body.state)).toEqual(['done', 'done']);
  });
});
