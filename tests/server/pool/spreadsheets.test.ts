import exceljs from 'exceljs';
import { sizePool } from '@/shared/domain/pool-size';
import { aProduct, type Product } from '../../support/app';
import { aPoolScene, partForm, plan, type PoolScene, sizingInput } from './scene';

let product: Product;
let scene: PoolScene;
beforeAll(async () => {
  product = await aProduct('pool-sheets');
  scene = await aPoolScene(product);
  await scene.engineer.put(`/pool/${scene.type.code}/plan`, plan());
});
afterAll(() => product.close());

/** The sheet as rows by head. */
async function sheet(path: string, query: Record<string, string> = {}): Promise<Record<string, unknown>[]> {
  const { status, body } = await scene.engineer.get(path, query).responseType('blob');
  expect(status).toBe(200);
  const book = new exceljs.Workbook();
  await book.xlsx.load(body as never);
  const rows: unknown[][] = [];
  book.worksheets[0]?.eachRow((row) => rows.push((row.values as unknown[]).slice(1)));
  const [heads = [], ...lines] = rows;
  return lines.map((line) => Object.fromEntries(heads.map((head, at) => [String(head), line[at]])));
}

describe('the lists as spreadsheets', () => {
  it('hold each type with its weights as numbers', async () => {
    const rows = await sheet('/container-types.xlsx', { search: scene.type.code });
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({
      Code: scene.type.code,
      'Tare, kg': 2.1,
      'Payload, kg': 25,
      Kind: 'tote',
    });
  });

  it('hold each part with its demand, and a name that begins with = as text', async () => {
    await scene.engineer.post('/parts', partForm(scene, { number: 'HX-2', name: '=1+1' }));
    const rows = await sheet('/parts.xlsx');
    expect(rows.map((row) => row['Part number'])).toEqual(['HX-2', 'HX-2210']);
    expect(rows[1]).toMatchObject({ 'Parts in a container': 12, 'Parts a working day, on average': 1760 });
    expect(typeof rows[0]?.['Name']).toBe('string');
    expect(rows[0]?.['Name']).toContain('=1+1');
    const part = (await scene.engineer.get('/parts', { search: 'HX-2' })).body.rows[0];
    await scene.engineer.put(`/parts/${part.id}`, { ...partForm(scene, { number: 'HX-2' }), active: false });
  });

  it('hold each type of the pool with what it needs', async () => {
    const rows = await sheet('/pool.xlsx');
    const row = rows.find((each) => each['Code'] === scene.type.code);
    const { poolSize, loopDays } = sizePool(sizingInput);
    expect(row).toMatchObject({ Needed: poolSize, 'In the pool today': 0, 'Loop, days': loopDays });
    expect(rows.map((each) => each['Code'])).toContain(scene.lid.code);
  });

  it('are no partner’s to fetch, the types apart', async () => {
    expect((await scene.clerk.get('/pool.xlsx')).status).toBe(403);
    expect((await scene.clerk.get('/parts.xlsx')).status).toBe(403);
    expect((await scene.clerk.get('/container-types.xlsx')).status).toBe(200);
  });
});
