import { csvOf, monthFileHeads, type MonthRow, xlsxOf } from '../../support/month-file';
import { aReceipt, anImportScene, aShipment, type ImportScene, rowsIn } from './import-scene';

let scene: ImportScene;
beforeAll(async () => {
  scene = await anImportScene('import-preview');
});
afterAll(() => scene.product.close());

const good = [aShipment(), aShipment({ type: 'LID-128', units: 20 }), aReceipt({ units: 392, damaged: 3 })];

type Wrong = { column: string; reason: string; what: string; wrong: Partial<MonthRow> };

async function previewOf(rows: readonly MonthRow[]) {
  const { body } = await scene.upload(csvOf(rows));
  const read = await scene.coordinator.get(`/imports/${body.id}/rows`);
  return {
    sent: body,
    rows: read.body.rows as { rowNo: number; problems: { column: string; reason: string }[] }[],
  };
}

describe('the preview of a file', () => {
  it('holds the rows of a CSV and posts none of them', async () => {
    const { status, body } = await scene.upload(csvOf(good, { bom: true }));
    expect([status, body.rowsGood, body.rowsBad]).toEqual([200, 3, 0]);
    const { body: head } = await scene.coordinator.get(`/imports/${body.id}`);
    expect(head).toMatchObject({ state: 'preview', fileName: 'march.csv', by: 'Ane Ravn', numbers: null });
    expect(head.totals).toMatchObject({ shipments: 1, receipts: 1, declared: 420, counted: 392 });
    expect(await rowsIn(scene.product, 'shipments')).toBe(0);
    expect(await rowsIn(scene.product, 'ledger_entries')).toBe(0);
  });

  it('reads the same from XLSX, where days are dates and units are numbers', async () => {
    const { status, body } = await scene.upload(await xlsxOf(good), 'march.xlsx');
    expect([status, body.rowsGood, body.rowsBad]).toEqual([200, 3, 0]);
    const { body: page } = await scene.coordinator.get(`/imports/${body.id}/rows`);
    expect(page.rows[2]).toMatchObject({
      rowNo: 4,
      cells: { side: 'receipt', date: '2026-03-03', units: '392', damaged: '3', dirty: '' },
    });
  });

  it.each([
    ['comma', csvOf(good, { delimiter: ',' })],
    ['tab', csvOf(good, { delimiter: '\t' })],
    ['UTF-16 with tabs', Buffer.from(`\ufeff${csvOf(good, { delimiter: '\t' }).toString()}`, 'utf16le')],
  ])('takes columns parted by %s', async (_name, file) => {
    expect((await scene.upload(file)).body).toMatchObject({ rowsGood: 3, rowsBad: 0 });
  });

  it('takes heads in any order and writing, and passes over columns it does not know', async () => {
    const file = Buffer.from(
      'UNITS;container_type;our remark;date;to-site;From Site;reference;side\n400;tote-64;x;2.3.2026;pallwick;tarnby;EM-7;Shipment\n',
    );
    const { body } = await scene.upload(file);
    expect(body).toMatchObject({ rowsGood: 1, rowsBad: 0 });
    const page = await scene.coordinator.get(`/imports/${body.id}/rows`);
    expect(page.body.rows[0].cells).toMatchObject({ reference: 'EM-7', type: 'tote-64', date: '2.3.2026' });
  });

  it.each<Wrong>([
    { column: 'side', reason: 'empty', what: 'a row without a side', wrong: { side: '' as 'shipment' } },
    { column: 'side', reason: 'side unknown', what: 'another side', wrong: { side: 'sent' as 'shipment' } },
    {
      column: 'reference',
      reason: 'reference missing',
      what: 'a shipment without a reference',
      wrong: { reference: '' },
    },
    {
      column: 'reference',
      reason: 'too long',
      what: 'a reference of 41 characters',
      wrong: { reference: 'R'.repeat(41) },
    },
    { column: 'from', reason: 'site unknown', what: 'an unknown site', wrong: { from: 'NOWHERE' } },
    { column: 'to', reason: 'same site', what: 'the same site twice', wrong: { to: 'TARNBY' } },
    { column: 'date', reason: 'not a day', what: '30 February', wrong: { date: '30.2.2026' } },
    { column: 'date', reason: 'not a day', what: 'a day in another writing', wrong: { date: '03/02/2026' } },
    { column: 'date', reason: 'future', what: 'a day to come', wrong: { date: '2026-03-21' } },
    {
      column: 'date',
      reason: 'month closed',
      what: 'a day in a closed month',
      wrong: { date: '2026-01-15' },
    },
    { column: 'type', reason: 'type unknown', what: 'an unknown type', wrong: { type: 'CRATE-9' } },
    {
      column: 'type',
      reason: 'no terms',
      what: 'a type the receiver has no terms for',
      wrong: { type: 'RACK-CP' },
    },
    { column: 'units', reason: 'empty', what: 'no units', wrong: { units: '' } },
    { column: 'units', reason: 'negative', what: 'negative units', wrong: { units: -4 } },
    { column: 'units', reason: 'fraction', what: 'fractional units', wrong: { units: '12.5' } },
    { column: 'units', reason: 'not a number', what: 'units in words', wrong: { units: 'many' } },
    { column: 'units', reason: 'not a number', what: 'units with a sign between', wrong: { units: '1.000' } },
    {
      column: 'units',
      reason: 'too many units',
      what: 'more units than a row can hold',
      wrong: { units: 1_000_000_001 },
    },
    { column: 'units', reason: 'nothing declared', what: 'a shipment of nothing', wrong: { units: 0 } },
    { column: 'damaged', reason: 'only for receipts', what: 'damage on a shipment', wrong: { damaged: 2 } },
  ])('names row 3 and the column $column with "$reason" for $what', async ({ column, reason, wrong }) => {
    await scene.product.deps.pool.query(
      "INSERT IGNORE INTO months (month, state) VALUES ('2026-01', 'closed')",
    );
    const { sent, rows } = await previewOf([aShipment(), aShipment({ reference: 'EM-1002', ...wrong })]);
    expect([sent.rowsGood, sent.rowsBad]).toEqual([1, 1]);
    expect(rows[0]).toMatchObject({ rowNo: 3, problems: [{ column, reason }] });
    expect(rows[0]?.problems).toHaveLength(1);
  });

  it('names all that is wrong with a row at once', async () => {
    const { rows } = await previewOf([aShipment({ reference: '', from: 'NOWHERE', units: '1.5' })]);
    expect(rows[0]?.problems.map(({ column }) => column)).toEqual(['from', 'units', 'reference']);
  });

  it('refuses more damaged than counted on a receipt', async () => {
    const { rows } = await previewOf([aReceipt({ units: 10, damaged: 11 })]);
    expect(rows[0]?.problems).toEqual([
      { column: 'damaged', reason: 'more than counted', data: { value: 11, counted: 10 } },
    ]);
  });

  it('tells a shipment that stands twice with another site or day, and a type that stands twice', async () => {
    const { rows } = await previewOf([
      aShipment(),
      aShipment({ to: 'ORRIN', type: 'LID-128' }),
      aShipment({ date: '2026-03-04', type: 'LID-128' }),
      aShipment(),
    ]);
    expect(rows.map(({ rowNo, problems }) => [rowNo, problems[0]?.column, problems[0]?.reason])).toEqual([
      [3, 'reference', 'same reference, other shipment'],
      [4, 'reference', 'same reference, other shipment'],
      [5, 'type', 'type twice'],
      [2, undefined, undefined],
    ]);
  });

  it('gives rows page by page, bad ones first, and by filter', async () => {
    const rows = [...Array(6)].map((_, at) => aShipment({ reference: `P-${at}`, units: at % 2 ? -1 : 8 }));
    const { body } = await scene.upload(csvOf(rows));
    const path = `/imports/${body.id}/rows`;
    const first = await scene.coordinator.get(path, { limit: '4' });
    const second = await scene.coordinator.get(path, { limit: '4', after: first.body.next });
    const numbers = (page: { body: { rows: { rowNo: number }[] } }) =>
      page.body.rows.map(({ rowNo }) => rowNo);
    expect([numbers(first), numbers(second), second.body.next]).toEqual([[3, 5, 7, 2], [4, 6], null]);
    expect(numbers(await scene.coordinator.get(path, { only: 'good' }))).toEqual([2, 4, 6]);
  });

  it('gives the bad rows back as a file with the reason in words', async () => {
    const { body } = await scene.upload(
      csvOf([aShipment(), aShipment({ reference: '=SUM(A1)', type: 'CRATE-9' })]),
    );
    const file = await scene.coordinator.get(`/imports/${body.id}/bad-rows`);
    expect(file.headers['content-disposition']).toContain('bad rows of march.csv');
    const [head, row] = file.text.replace('\ufeff', '').trim().split('\n');
    expect(head).toBe([...monthFileHeads, 'Row', 'What is wrong'].join(';'));
    expect(row).toContain("'=SUM(A1)");
    expect(row).toContain(';3;Container type: “CRATE-9” is no container type of the book.');
  });

  it.each(['csv', 'xlsx'])('gives a template as %s that can be filled in and sent back', async (as) => {
    const file = await scene.coordinator
      .get('/import-template', { as })
      .buffer(true)
      .parse((response, done) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('end', () => done(null, Buffer.concat(parts)));
      });
    const sent = await scene.upload(file.body as Buffer, `template.${as}`);
    expect([sent.status, sent.body.rowsGood, sent.body.rowsBad]).toEqual([200, 4, 0]);
  });

  it('can be put aside, after which it cannot be confirmed', async () => {
    const { body } = await scene.upload(csvOf(good));
    expect((await scene.coordinator.post(`/imports/${body.id}/drop`)).body.state).toBe('dropped');
    const late = await scene.coordinator.post(`/imports/${body.id}/confirmation`, { leaveOut: 0 });
    expect([late.status, late.body.code]).toEqual([409, 'state changed']);
  });
});

describe('the list of imports', () => {
  it('gives the newest first, page by page, and refuses a key that it did not give out', async () => {
    const ids: string[] = [];
    for (const name of ['one.csv', 'two.csv', 'three.csv'])
      ids.unshift((await scene.upload(csvOf(good), name)).body.id);
    const first = await scene.coordinator.get('/imports', { limit: '2', state: 'preview' });
    const second = await scene.coordinator.get('/imports', {
      limit: '2',
      state: 'preview',
      after: first.body.next,
    });
    const idsOf = (page: { body: { rows: { id: string }[] } }) => page.body.rows.map(({ id }) => id);
    expect([...idsOf(first), ...idsOf(second)].slice(0, 3)).toEqual(ids);
    expect((await scene.coordinator.get('/imports', { after: 'made up' })).status).toBe(400);
  });
});
