import { fromBuffer, type ZipFile } from 'yauzl';

/**
 * A second reader of .xlsx, independent of the library that writes them: the parts of ECMA-376 part 1 that our files
 * use. A cell knows whether it is text, a number or a formula, which its value alone would not tell.
 */
export type ReadCell = {
  kind: 'text' | 'number' | 'formula';
  value: string | number;
  formula?: string;
  format: string;
};
export type ReadSheet = { cells: Map<string, ReadCell>; xml: string };

export async function unzipped(bytes: Buffer): Promise<Map<string, Buffer>> {
  const zip = await new Promise<ZipFile>((resolve, reject) => {
    fromBuffer(bytes, { lazyEntries: true }, (error, file) => (error ? reject(error) : resolve(file)));
  });
  const entries = new Map<string, Buffer>();
  await new Promise<void>((resolve, reject) => {
    zip.on('error', reject).on('end', resolve);
    zip.on('entry', (entry: { fileName: string }) => {
      zip.openReadStream(entry as never, (error, stream) => {
        if (error) return reject(error);
        const parts: Buffer[] = [];
        stream.on('data', (part: Buffer) => parts.push(part));
        stream.on('end', () => {
          entries.set(entry.fileName, Buffer.concat(parts));
          zip.readEntry();
        });
        return undefined;
      });
    });
    zip.readEntry();
  });
  return entries;
}

export async function readWorkbook(bytes: Buffer): Promise<Map<string, ReadSheet>> {
  const parts = await unzipped(bytes);
  const xml = (path: string) => parts.get(path)?.toString('utf8') ?? '';
  const shared = all(xml('xl/sharedStrings.xml'), /<si>([\s\S]*?)<\/si>/g).map((item) =>
    all(item, /<t[^>]*>([\s\S]*?)<\/t>/g)
      .map(decoded)
      .join(''),
  );
  const formats = formatsOf(xml('xl/styles.xml'));
  const targets = new Map(
    [...xml('xl/_rels/workbook.xml.rels').matchAll(/<Relationship [^>]*>/g)].map(([tag]) => [
      attribute(tag, 'Id'),
      attribute(tag, 'Target'),
    ]),
  );
  const sheets = [...xml('xl/workbook.xml').matchAll(/<sheet [^>]*>/g)].map(([tag]): [string, ReadSheet] => {
    const sheet = xml(`xl/${targets.get(attribute(tag, 'r:id'))}`);
    return [decoded(attribute(tag, 'name')), { cells: cellsOf(sheet, { shared, formats }), xml: sheet }];
  });
  return new Map(sheets);
}

type Tables = { shared: readonly string[]; formats: readonly string[] };

function cellsOf(xml: string, { shared, formats }: Tables): Map<string, ReadCell> {
  const cells = new Map<string, ReadCell>();
  for (const [, attributes = '', inner = ''] of xml.matchAll(/<c ([^>]*?)(?:\/>|>([\s\S]*?)<\/c>)/g)) {
    const raw = /<v>([\s\S]*?)<\/v>/.exec(inner)?.[1];
    const formula = /<f[^>]*>([\s\S]*?)<\/f>/.exec(inner)?.[1];
    if (raw === undefined && formula === undefined) continue;
    const type = attribute(attributes, 't');
    const format = formats[Number(attribute(attributes, 's') || '0')] ?? 'General';
    const value =
      type === 's' ? (shared[Number(raw)] ?? '') : type === 'str' ? decoded(raw ?? '') : Number(raw);
    const kind = formula !== undefined ? 'formula' : type === 's' || type === 'str' ? 'text' : 'number';
    const read = { kind, value, format } as const;
    cells.set(
      attribute(attributes, 'r'),
      formula === undefined ? read : { ...read, formula: decoded(formula) },
    );
  }
  return cells;
}

/** The number format of each cell style; built-in ones by their id as ECMA-376 part 1, 18.8.30 lists them. */
function formatsOf(styles: string): string[] {
  const builtIn: Record<string, string> = {
    0: 'General',
    1: '0',
    2: '0.00',
    3: '#,##0',
    4: '#,##0.00',
    49: '@',
  };
  for (const [tag] of styles.matchAll(/<numFmt [^>]*>/g)) {
    builtIn[attribute(tag, 'numFmtId')] = decoded(attribute(tag, 'formatCode'));
  }
  const cellStyles = /<cellXfs[^>]*>([\s\S]*?)<\/cellXfs>/.exec(styles)?.[1] ?? '';
  return [...cellStyles.matchAll(/<xf [^>]*>/g)].map(([tag]) => builtIn[attribute(tag, 'numFmtId')] ?? '?');
}

const attribute = (tag: string, name: string) =>
  new RegExp(`(?:^|\\s)${name}="([^"]*)"`).exec(tag)?.[1] ?? '';
const all = (text: string, pattern: RegExp) => [...text.matchAll(pattern)].map((match) => match[1] ?? '');
const named: Record<string, string> = { lt: '<', gt: '>', amp: '&', quot: '"', apos: "'" };
const decoded = (text: string) =>
  text.replace(/&([^;]+);/g, (whole, name: string) => {
    if (name.startsWith('#x')) return String.fromCodePoint(parseInt(name.slice(2), 16));
    if (name.startsWith('#')) return String.fromCodePoint(Number(name.slice(1)));
    return named[name] ?? whole;
  });

/** Day of a spreadsheet's serial number, 1900 system (ECMA-376 part 1, 18.17.4.1). */
export const dayOfSerial = (serial: number): string =>
  new Date(Date.UTC(1899, 11, 30) + serial * 86_400_000).toISOString().slice(0, 10);
