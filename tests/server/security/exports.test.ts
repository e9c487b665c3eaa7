import { parse } from 'csv-parse/sync';
import { fromBuffer } from 'yauzl';
import type { Caller } from '../../support/caller';
import { callRoute, type Guarded, guardedOf } from './route-calls';
import { type Tenants, twoTenants } from './two-tenants';

/** What a spreadsheet would run if it took it for a formula (OWASP, CSV injection). */
const starts = ['=', '+', '-', '@', '\t=', '\r=', '＝', '＋', '－', '＠'];
const formulaOf = (start: string) => `${start}HYPERLINK("http://evil.example","x")`;

let scene: Tenants;
let staff: Caller;
let statement: string;
beforeAll(async () => {
  scene = await twoTenants('exports');
  const { product, a, type, plant, staffPerson } = scene;
  // The forms refuse control characters; the exports must stand by themselves.
  const named = (sql: string, given: unknown[]) => product.deps.pool.query(sql, given);
  await named('UPDATE companies SET name = ? WHERE id = ?', [formulaOf('='), a.company.id]);
  await named('UPDATE sites SET name = ? WHERE id = ?', [formulaOf('+'), a.site.id]);
  await named('UPDATE sites SET name = ? WHERE id = ?', [formulaOf('\t='), plant.id]);
  await named('UPDATE container_types SET name = ? WHERE code = ?', [formulaOf('@'), type.code]);
  await named('UPDATE parts SET name = ?, number = ?', [formulaOf('-'), formulaOf('＝')]);
  product.setClock('2026-04-02T09:00:00.000Z');
  staff = await product.as(staffPerson);
  await staff.post('/months/2026-03/close', { reason: formulaOf('=') });
  await product.runJobs();
  const drafts = (await staff.get('/statements', { month: '2026-03', partner: a.company.id })).body.rows;
  statement = (drafts as { id: string }[])[0]?.id ?? '';
}, 120_000);
afterAll(() => scene?.product.close());

/** The parts of a ZIP by name, read by another program than the one that wrote it. */
function partsOf(zip: Buffer): Promise<Map<string, Buffer>> {
  const parts = new Map<string, Buffer>();
  return new Promise((resolve, reject) => {
    fromBuffer(zip, { lazyEntries: true }, (error, file) => {
      if (error) return reject(error);
      file.on('end', () => resolve(parts));
      file.on('entry', (entry: { fileName: string }) => {
        file.openReadStream(entry as never, (failed, stream) => {
          if (failed) return reject(failed);
          const pieces: Buffer[] = [];
          stream.on('data', (piece: Buffer) => pieces.push(piece));
          stream.on('end', () => {
            parts.set(entry.fileName, Buffer.concat(pieces));
            file.readEntry();
          });
        });
      });
      file.readEntry();
    });
  });
}

async function bytesOf(route: Guarded, query: Record<string, string> = {}): Promise<Buffer> {
  const params = (name: string): string =>
    name === 'statement' ? statement : name === 'month' ? '2026-03' : (scene.ids[name]?.[0] ?? '');
  const asked = callRoute(staff, route, { params, query });
  const answer = await asked;
  expect([route.operation.name, answer.status]).toEqual([route.operation.name, 200]);
  return Buffer.isBuffer(answer.body) ? answer.body : Buffer.from(answer.text ?? '', 'utf8');
}

describe('a spreadsheet that is handed out', () => {
  it('holds such names as text and never as a formula', async () => {
    const workbooks = guardedOf(scene.product).filter(
      ({ operation }) => operation.answers === 'file' && /xlsx$|spreadsheets?$/.test(operation.path),
    );
    expect(workbooks.length).toBeGreaterThanOrEqual(6);
    for (const route of workbooks) await expectHarmless(route.operation.name, await binaryOf(route));
  });

  async function binaryOf({ operation }: Guarded): Promise<Buffer> {
    const given: Record<string, string> = { statement, month: '2026-03' };
    const path = operation.path.replace(
      /:([A-Za-z]+)/g,
      (_all, name: string) => given[name] ?? scene.ids[name]?.[0] ?? '',
    );
    const { status, body } = await staff.get(path).responseType('blob');
    expect([operation.name, status]).toEqual([operation.name, 200]);
    return body as Buffer;
  }

  async function expectHarmless(name: string, bytes: Buffer): Promise<void> {
    let shown = '';
    for (const [part, content] of await partsOf(bytes)) {
      if (part.endsWith('.xlsx')) return expectHarmless(`${name} ${part}`, content);
      if (!part.endsWith('.xml')) continue;
      const xml = content.toString('utf8');
      shown += xml;
      expect([name, part, /<f[ >][^<]*evil/.exec(xml)?.[0]]).toEqual([name, part, undefined]);
    }
    expect([name, shown.includes('evil.example')]).toEqual([name, true]);
  }
});

describe('a CSV that is handed out', () => {
  it('puts a sign before what would be a formula, in every cell', async () => {
    const head = 'Side;Reference;From site;To site;Date;Container type;Units\n';
    const rows = starts.map(
      (start) => `nonsense;"${formulaOf(start).replaceAll('"', '""')}";"${start}1";X;2026-03-01;TOTE-64;-5`,
    );
    const { body } = await staff
      .form('/imports')
      .attach('file', Buffer.from(head + rows.join('\n')), 'evil.csv');
    const route = guardedOf(scene.product).find(({ operation }) => operation.name === 'downloadBadRows');
    if (!route) throw new Error('no such route');
    scene.ids.import = [String(body.id)];
    const cells = (parse(await bytesOf(route), { delimiter: ';', bom: true }) as string[][]).slice(1);
    expect(cells).toHaveLength(starts.length);
    expect(cells.flat().some((cell) => cell.includes('evil.example'))).toBe(true);
    expect(cells.flat().filter((cell) => /^[=+\-@\t\r＝＋－＠]/.test(cell))).toEqual([]);
  });
});
