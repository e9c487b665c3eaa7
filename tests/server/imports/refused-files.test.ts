import exceljs from 'exceljs';
import { ZipFile } from 'yazl';
import { csvOf, xlsxOf } from '../../support/month-file';
import { anImportScene, aShipment, type ImportScene, rowsIn } from './import-scene';

let scene: ImportScene;
beforeAll(async () => {
  scene = await anImportScene('import-refused');
});
afterAll(() => scene.product.close());

const good = csvOf([aShipment()]);
const pdf = Buffer.from('%PDF-1.7\n1 0 obj\n<<>>\nendobj\n');
const png = Buffer.from('89504e470d0a1a0a0000000d49484452', 'hex');
const exe = Buffer.concat([Buffer.from('MZ'), Buffer.from([0x90, 0, 3, 0, 0, 0]), Buffer.alloc(64)]);

function zipOf(parts: Record<string, Buffer | string>): Promise<Buffer> {
  const zip = new ZipFile();
  for (const [name, content] of Object.entries(parts)) zip.addBuffer(Buffer.from(content), name);
  zip.end();
  const pieces: Buffer[] = [];
  return new Promise((resolve, reject) => {
    zip.outputStream
      .on('data', (piece: Buffer) => pieces.push(piece))
      .on('end', () => resolve(Buffer.concat(pieces)))
      .on('error', reject);
  });
}

const workbookHead = '<?xml version="1.0"?><workbook/>';

/** Raises the sizes that a ZIP states, or lowers them, where its parts say so. */
function withStatedSize(zip: Buffer, { from, to }: { from: number; to: number }): Buffer {
  const changed = Buffer.from(zip);
  for (let at = 0; at + 4 <= changed.length; at += 1)
    if (changed.readUInt32LE(at) === from) changed.writeUInt32LE(to, at);
  return changed;
}

async function expectNothingKept() {
  expect(await rowsIn(scene.product, 'imports')).toBe(0);
  expect(await rowsIn(scene.product, 'import_rows')).toBe(0);
}

describe('a file that is refused', () => {
  it.each([
    ['a PDF named .csv', pdf, 'march.csv'],
    ['a PNG named .xlsx', png, 'march.xlsx'],
    ['a program named .csv', exe, 'march.csv'],
    ['a web page named .csv', Buffer.from('<!doctype html><p>Side;Reference'), 'march.csv'],
    ['a CSV named .xlsx', good, 'march.xlsx'],
    ['a CSV named .exe', good, 'march.exe'],
    ['a file without an ending', good, 'march'],
  ])('is not as named: %s', async (_case, file, name) => {
    const { status, body } = await scene.upload(file, name);
    expect([status, body.code]).toEqual([415, 'file not as named']);
    await expectNothingKept();
  });

  it('is not as named: a ZIP of something else, and a workbook named .csv', async () => {
    const other = await scene.upload(await zipOf({ 'notes.txt': 'hello' }), 'march.xlsx');
    const renamed = await scene.upload(await xlsxOf([aShipment()]), 'march.csv');
    expect([other.body.code, renamed.body.code]).toEqual(['file not as named', 'file not as named']);
    await expectNothingKept();
  });

  it('lacks columns, which are named', async () => {
    const { status, body } = await scene.upload(
      Buffer.from('Side;Reference;Date\nshipment;EM-1;2026-03-02\n'),
    );
    expect([status, body.code]).toEqual([400, 'file not readable']);
    expect(body.data).toEqual({
      why: 'columns missing',
      columns: 'From site, To site, Container type, Units',
    });
    await expectNothingKept();
  });

  it.each([
    ['no rows', 'Side;Reference;From site;To site;Date;Container type;Units\n'],
    ['column twice', 'Side;Side;Reference;From site;To site;Date;Container type;Units\nx;x;x;x;x;x;x;x\n'],
    ['columns missing', ''],
    ['broken', 'Side;Reference;From site;To site;Date;Container type;Units\n"shipment;EM-1;open quote'],
  ])('cannot be read: %s', async (why, content) => {
    const { body } = await scene.upload(Buffer.from(content || ' '));
    expect(body).toMatchObject({ code: 'file not readable', data: { why } });
    await expectNothingKept();
  });

  it('has more than 20 000 rows', async () => {
    const rows = [...Array(20_001)].map((_, at) => aShipment({ reference: `R-${at}` }));
    const { body } = await scene.upload(csvOf(rows));
    expect(body).toMatchObject({ code: 'file not readable', data: { why: 'too many rows', most: 20_000 } });
    await expectNothingKept();
  });

  it('has one byte more than 10 MB', async () => {
    const file = Buffer.alloc(10 * 1024 * 1024 + 1, 'a');
    const { status, body } = await scene.upload(file);
    expect([status, body.code]).toEqual([413, 'too large']);
    await expectNothingKept();
  });

  it('is missing, or comes with a second one', async () => {
    const none = await scene.coordinator.form('/imports').field('body', '{}');
    const two = await scene.coordinator
      .form('/imports')
      .attach('file', good, 'a.csv')
      .attach('file', good, 'b.csv');
    expect([none.status, two.status]).toEqual([400, 400]);
    await expectNothingKept();
  });
});

describe('a workbook that is dangerous to open', () => {
  const parts = { '[Content_Types].xml': '<Types/>', 'xl/workbook.xml': workbookHead };

  it('unpacks to 300 MB', async () => {
    const bomb = await zipOf({ ...parts, 'xl/worksheets/sheet1.xml': Buffer.alloc(300 * 1024 * 1024, ' ') });
    expect(bomb.length).toBeLessThan(1024 * 1024);
    const { body } = await scene.upload(bomb, 'bomb.xlsx');
    expect(body).toMatchObject({ code: 'file not readable', data: { why: 'unpacks too large' } });
    await expectNothingKept();
  });

  it('unpacks to more than it states', async () => {
    const size = 3 * 1024 * 1024 + 17;
    const honest = await zipOf({ ...parts, 'xl/worksheets/sheet1.xml': Buffer.alloc(size, ' ') });
    const lying = withStatedSize(honest, { from: size, to: 1000 });
    expect(lying.equals(honest)).toBe(false);
    const { body } = await scene.upload(lying, 'bomb.xlsx');
    expect(body).toMatchObject({ code: 'file not readable', data: { why: 'broken' } });
    await expectNothingKept();
  });

  it('holds macros', async () => {
    const { body } = await scene.upload(await zipOf({ ...parts, 'xl/vbaProject.bin': 'x' }), 'march.xlsx');
    expect(body.data).toEqual({ why: 'macros' });
  });

  it('names an outside entity, which is not read', async () => {
    const sheet =
      '<?xml version="1.0"?><!DOCTYPE x [<!ENTITY e SYSTEM "file:///etc/hostname">]><worksheet>&e;</worksheet>';
    const { body } = await scene.upload(
      await zipOf({ ...parts, 'xl/worksheets/sheet1.xml': sheet }),
      'march.xlsx',
    );
    expect(body.data).toEqual({ why: 'outside parts' });
  });

  it('is broken off in the middle', async () => {
    const whole = await xlsxOf([aShipment()]);
    const { body } = await scene.upload(whole.subarray(0, whole.length >> 1), 'march.xlsx');
    expect(['file not as named', 'file not readable']).toContain(body.code);
    await expectNothingKept();
  });
});

describe('a workbook as office programs write it', () => {
  it('shows results of formulas, rich text and days without a format as people see them', async () => {
    const book = new exceljs.Workbook();
    const sheet = book.addWorksheet('Any name');
    sheet.addRow(['Side', 'Reference', 'From site', 'To site', 'Date', 'Container type', 'Units']);
    sheet.addRow(['shipment', 4711, 'TARNBY', 'PALLWICK', 46_083, 'TOTE-64', null]);
    sheet.getCell('G2').value = { formula: '2*200', result: 400 };
    sheet.getCell('C2').value = { richText: [{ text: 'TARN' }, { text: 'BY' }] };
    const { body } = await scene.upload(Buffer.from(await book.xlsx.writeBuffer()), 'march.xlsx');
    expect(body).toMatchObject({ rowsGood: 1, rowsBad: 0 });
    const page = await scene.coordinator.get(`/imports/${body.id}/rows`);
    expect(page.body.rows[0].cells).toMatchObject({
      reference: '4711',
      from: 'TARNBY',
      units: '400',
      date: '46083',
    });
    const head = await scene.coordinator.get(`/imports/${body.id}`);
    expect(head.body.totals.firstDay).toBe('2026-03-02');
  });
});
