import exceljs from 'exceljs';
import { aProduct, type Product } from '../../support/app';
import type { Caller } from '../../support/caller';
import { aLane, counted, fulls, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('spreadsheets');
  lane = await aLane(product);
});
afterAll(() => product.close());

async function rowsOf(caller: Caller, path: string, query: Record<string, string> = {}) {
  const { status, body, headers } = await caller.get(path, query).responseType('blob');
  expect([status, headers['content-type']]).toEqual([
    200,
    'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  ]);
  const book = new exceljs.Workbook();
  await book.xlsx.load(body as never);
  const rows: unknown[][] = [];
  book.worksheets[0]?.eachRow((row) => rows.push((row.values as unknown[]).slice(1)));
  return rows.slice(1);
}

describe('lists as spreadsheets', () => {
  it('hold every shipment of the list, dates as dates, and text that is no formula', async () => {
    const id = await sentEmpties(lane, { [lane.type.code]: 400, [lane.lid.code]: 20 });
    await lane.clerk.post(`/shipments/${id}/counts`, counted({ [lane.type.code]: 392, [lane.lid.code]: 20 }));
    const named = { ...fulls(lane, { [lane.type.code]: 5 }), reference: '=1+1' };
    expect((await lane.clerk.post('/shipments', named)).status).toBe(200);
    const rows = await rowsOf(lane.coordinator, '/shipments.xlsx');
    expect(rows).toHaveLength(3);
    const fullsRow = rows.find((row) => row[0] === '=1+1');
    expect(fullsRow?.slice(0, 2)).toEqual(['=1+1', 'fulls']);
    const short = rows.find((row) => row[9] === 400);
    expect(short?.[4]).toEqual(new Date('2026-03-20T00:00:00.000Z'));
    expect(short?.slice(9)).toEqual([400, 392, 0, 0, -8]);
    expect(await rowsOf(lane.coordinator, '/shipments.xlsx', { contents: 'fulls' })).toHaveLength(1);
  });

  it('hold the balances of the day, and of a partner its own alone', async () => {
    const all = await rowsOf(lane.coordinator, '/balances.xlsx');
    const { body } = await lane.coordinator.get('/balances');
    expect(all.map((row) => row[4])).toEqual(body.rows.map((row: { held: number }) => row.held));
    const own = await rowsOf(lane.clerk, '/balances.xlsx');
    expect(new Set(own.map((row) => row[0]))).toEqual(new Set(['Kestrel Coil Works']));
    const other = await product.as(await product.aPerson(await product.aCompany(), ['manager']));
    expect(await rowsOf(other, '/balances.xlsx')).toEqual([]);
    expect(await rowsOf(other, '/shipments.xlsx')).toEqual([]);
  });
});
