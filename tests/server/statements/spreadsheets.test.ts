import { createHash } from 'node:crypto';
import { aProduct, type Product } from '../../support/app';
import { aMonthEnd, type MonthEnd } from '../../support/month-end';
import { readWorkbook, unzipped } from '../../support/read-workbook';

let product: Product;
let scene: MonthEnd;
let kestrel: Awaited<ReturnType<MonthEnd['aPartner']>>;

beforeAll(async () => {
  product = await aProduct('spreadsheets');
  scene = await aMonthEnd(product);
  kestrel = await scene.aPartner({ name: 'Kestrel Coil Works', code: 'KESTREL' });
  const maren = await scene.aPartner({ name: 'Maren Electronics', code: 'MAREN' });
  for (const partner of [kestrel, maren]) {
    await product.someTerms(partner.company, scene.tote.code);
    await scene.issue(partner, '2026-02-03', [{ typeCode: scene.tote.code, units: 40 }]);
  }
  await scene.giveBack(kestrel, '2026-02-25', [{ typeCode: scene.tote.code, units: 15, damaged: 2 }]);
  product.setClock('2026-03-02T09:00:00.000Z');
  await scene.finance.post('/months/2026-02/close', { reason: '' });
  await product.runJobs();
});
afterAll(() => product.close());

const idOfKestrel = async (): Promise<string> => {
  const { body } = await scene.finance.get('/statements', { partner: kestrel.company.id });
  return body.rows[0].id as string;
};
const bytesOf = async (caller: MonthEnd['finance'], path: string): Promise<Buffer> => {
  const response = await caller
    .get(path)
    .buffer(true)
    .parse((stream, done) => {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => done(null, Buffer.concat(parts)));
    });
  expect(response.status).toBe(200);
  return response.body as Buffer;
};

describe('spreadsheets of a month', () => {
  it('of a draft says that it is one', async () => {
    const id = await idOfKestrel();
    const response = await scene.finance.get(`/statements/${id}/spreadsheet`);
    expect(response.headers['content-disposition']).toContain('draft-statement-2026-02-KESTREL.xlsx');
    const book = await readWorkbook(await bytesOf(scene.finance, `/statements/${id}/spreadsheet`));
    const texts = [...(book.get('Summary')?.cells.values() ?? [])].map((cell) => cell.value);
    expect(texts).toContain('Draft, not issued');
  });

  it('says in page, spreadsheet and assessment the same numbers', async () => {
    const id = await idOfKestrel();
    await scene.finance.post(`/statements/${id}/issue`);
    const { body } = await kestrel.caller.get(`/statements/${id}`);
    const book = await readWorkbook(await bytesOf(kestrel.caller, `/statements/${id}/spreadsheet`));
    const money = [...(book.get('Money')?.cells ?? [])].filter(([at]) => at.startsWith('F')).slice(1);
    const amounts = body.content.lines.map((line: { amount: string }) => Number(line.amount));
    expect(money.map(([, cell]) => cell.value)).toEqual([...amounts, Number(body.payable)]);
    expect(Number(body.content.assessment.totals.payable)).toBe(Number(body.payable));
    const units = body.content.assessment.lines[0].units;
    const row = ['C5', 'D5', 'E5', 'F5', 'G5', 'H5'].map(
      (at) => book.get('Containers')?.cells.get(at)?.value,
    );
    expect(row).toEqual([
      units.opening,
      units.issued,
      units.returned,
      units.lost,
      units.found,
      units.closing,
    ]);
    const summary = [...(book.get('Summary')?.cells.values() ?? [])].map((cell) => cell.value);
    expect(summary).toContain(body.sha256);
    expect(summary).toContain(Number(body.total));
  });

  it('of an issued statement is the kept file, the same bytes every time', async () => {
    const path = `/statements/${await idOfKestrel()}/spreadsheet`;
    const hash = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
    const [first, second] = [await bytesOf(kestrel.caller, path), await bytesOf(scene.finance, path)];
    const [rows] = await product.deps.pool.query(
      'SELECT f.sha256 FROM files f JOIN statements s ON s.workbook_file_id = f.id',
    );
    expect([hash(first), hash(second)]).toEqual(Array(2).fill((rows as { sha256: string }[])[0]?.sha256));
  });

  it('all together are one ZIP, for the operator alone', async () => {
    const entries = await unzipped(await bytesOf(scene.finance, '/months/2026-02/spreadsheets'));
    expect([...entries.keys()]).toEqual([
      'statement-2026-02-KESTREL.xlsx',
      'draft-statement-2026-02-MAREN.xlsx',
    ]);
    for (const bytes of entries.values()) expect((await readWorkbook(bytes)).size).toBe(7);
    expect((await kestrel.caller.get('/months/2026-02/spreadsheets')).status).toBe(403);
    expect((await scene.finance.get('/months/2025-01/spreadsheets')).status).toBe(404);
  });
});
