import { asc, eq } from 'drizzle-orm';
import { Readable } from 'node:stream';
import { ZipFile } from 'yazl';
import type { Database } from '@/db/client';
import { files } from '@/db/schema/files';
import { statements } from '@/db/schema/statements';
import { statementContent } from '@/shared/domain/statement/content';
import { Problem } from '@/shared/problems/problems';
import { statements as words } from '@/shared/text/en/statements';
import type { Deps } from '../../deps';
import { statementWorkbook, workbookMediaType } from '../../documents/statement-workbook';
import type { Person } from '../../http/person';
import type { FileAnswer } from '../../http/route';
import type { StatementRecord } from './locked-statement';
import { visibleStatement } from './read-statement';

type Sheet = { name: string; content: () => Promise<Readable> };

/** The spreadsheet of a statement: the kept file once issued, made on the spot while a draft. */
export async function statementFile(
  deps: Deps,
  { id, person }: { id: string; person: Person },
): Promise<FileAnswer> {
  const { row } = await visibleStatement(deps.db, { id, person });
  const sheet = await sheetOf(deps, row);
  return { name: sheet.name, mediaType: workbookMediaType, content: await sheet.content() };
}

async function sheetOf(deps: Deps, row: StatementRecord): Promise<Sheet> {
  if (row.workbookFileId === null) {
    const name = words.document.draftFileName(row.number);
    const content = statementContent.parse(row.content);
    const made = () => statementWorkbook({ content, sha256: row.sha256, issued: null });
    return { name, content: async () => Readable.from([await made()]) };
  }
  const [kept] = await deps.db.select().from(files).where(eq(files.id, row.workbookFileId));
  if (!kept || !(await deps.files.has(kept.sha256))) throw new Problem('not found');
  return { name: kept.name, content: () => Promise.resolve(deps.files.open(kept.sha256)) };
}

/** All spreadsheets of a month in one ZIP, streamed: one statement at a time is in memory. */
export async function monthFile(deps: Deps, month: string): Promise<FileAnswer> {
  const ids = await statementIdsOf(deps.db, month);
  if (ids.length === 0) throw new Problem('not found');
  const zip = new ZipFile();
  void fill(deps, zip, ids).catch((error: unknown) => {
    deps.logger.error({ err: error, month }, 'month not packed');
    // The reader must see a broken file, not a short one.
    (zip.outputStream as Readable).destroy(error instanceof Error ? error : new Error(String(error)));
  });
  return {
    name: words.document.monthFileName(month),
    mediaType: 'application/zip',
    content: zip.outputStream as Readable,
  };
}

async function fill(deps: Deps, zip: ZipFile, ids: readonly string[]): Promise<void> {
  for (const id of ids) {
    const [row] = await deps.db.select().from(statements).where(eq(statements.id, id));
    if (!row) continue;
    const sheet = await sheetOf(deps, row);
    const stream = await sheet.content();
    const done = new Promise((resolve, reject) => stream.once('end', resolve).once('error', reject));
    // Spreadsheets are ZIP files themselves and gain nothing by a second compression.
    zip.addReadStream(stream, sheet.name, { compress: false });
    await done;
  }
  zip.end();
}

async function statementIdsOf(db: Database, month: string): Promise<string[]> {
  const rows = await db
    .select({ id: statements.id })
    .from(statements)
    .where(eq(statements.month, month))
    .orderBy(asc(statements.number));
  return rows.map((row) => row.id);
}
