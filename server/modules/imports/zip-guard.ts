import { Transform, Writable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { promisify } from 'node:util';
import { type Entry, fromBuffer, type ZipFile } from 'yauzl';
import { notAsNamed, unreadable } from './unreadable';

/** Far above a sheet of 20 000 rows, which unpacks to some 10 MB. */
const mostUnpacked = 200 * 1024 * 1024;
/** Sheets pack to about a tenth; a bomb to a thousandth. Small parts are let off: they may pack well by chance. */
const mostRatio = 200;
const smallPart = 1024 * 1024;
const mostParts = 2_000;
/** Declarations of outside entities stand at the head of a part. */
const headBytes = 4096;

const open = promisify(
  (bytes: Buffer, done: (error: Error | null, zip: ZipFile) => void) =>
    void fromBuffer(bytes, { lazyEntries: true, validateEntrySizes: true }, done),
);

/**
 * Looks through the parts of a workbook before any of them is read: the sum of the sizes, and that unpacking gives no
 * more than was stated; no macros; no document type declarations, which could name outside entities.
 */
export async function guardWorkbook(bytes: Buffer): Promise<void> {
  const zip = await open(bytes).catch(() => {
    throw notAsNamed();
  });
  const entries = await entriesOf(zip);
  const names = new Set(entries.map((entry) => entry.fileName));
  if (!names.has('[Content_Types].xml') || !names.has('xl/workbook.xml')) throw notAsNamed();
  if (entries.some(({ fileName }) => /vbaProject|macrosheets|activeX|embeddings/i.test(fileName)))
    throw unreadable('macros');
  refuseBombs(entries);
  for (const entry of entries) await unpackOnce(zip, entry);
}

function entriesOf(zip: ZipFile): Promise<Entry[]> {
  return new Promise((resolve, reject) => {
    const entries: Entry[] = [];
    zip.on('entry', (entry: Entry) => {
      entries.push(entry);
      if (entries.length > mostParts) reject(unreadable('unpacks too large'));
      else zip.readEntry();
    });
    zip.on('end', () => resolve(entries));
    zip.on('error', () => reject(unreadable('broken')));
    zip.readEntry();
  });
}

function refuseBombs(entries: readonly Entry[]): void {
  const unpacked = entries.reduce((sum, entry) => sum + entry.uncompressedSize, 0);
  const swollen = entries.some(
    ({ compressedSize, uncompressedSize }) =>
      uncompressedSize > smallPart && uncompressedSize > mostRatio * compressedSize,
  );
  if (unpacked > mostUnpacked || swollen) throw unreadable('unpacks too large');
}

/** yauzl breaks off where a part unpacks to more than it states. */
async function unpackOnce(zip: ZipFile, entry: Entry): Promise<void> {
  if (entry.isEncrypted()) throw unreadable('broken');
  const head: Buffer[] = [];
  let seen = 0;
  const look = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      if (seen < headBytes) head.push(chunk.subarray(0, headBytes - seen));
      seen += chunk.length;
      done();
    },
  });
  try {
    const stream = await promisify(zip.openReadStream.bind(zip) as OpenPart)(entry);
    await pipeline(stream, look, new Writable({ write: (_chunk, _encoding, done) => done() }));
  } catch {
    throw unreadable('broken');
  }
  if (/<!DOCTYPE|<!ENTITY/i.test(Buffer.concat(head).toString('latin1'))) throw unreadable('outside parts');
}

type OpenPart = (entry: Entry, done: (error: Error | null, stream: NodeJS.ReadableStream) => void) => void;
