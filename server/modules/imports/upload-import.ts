import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { importRows, imports } from '@/db/schema/work';
import { Problem } from '@/shared/problems/problems';
import type { Person } from '../../http/person';
import type { UploadedFile } from '../../http/route';
import { readBookFacts } from './book-facts';
import { checkTable, type JudgedRow, totalsOf } from './check-table';
import { readTable } from './read-table';

type Upload = { files: readonly UploadedFile[]; person: Person; now: string };

const rowsPerInsert = 500;

/** Reads a file, judges its rows and keeps them for the preview. Nothing of it is posted; a refused file leaves nothing. */
export async function uploadImport(
  tx: Transaction,
  { files, person, now }: Upload,
): Promise<{ id: string; rowsGood: number; rowsBad: number }> {
  const [file] = files;
  if (!file || files.length > 1)
    throw new Problem('not valid', { fields: [{ path: 'file', message: 'Choose one file' }] });
  const facts = await readBookFacts(tx, now);
  const { rows, documents } = await checkTable(readTable(file), facts);
  const id = newId();
  const rowsBad = rows.filter(({ problems }) => problems.length > 0).length;
  const rowsGood = rows.length - rowsBad;
  await tx.insert(imports).values({
    id,
    fileName: file.name,
    state: 'preview',
    rowsGood,
    rowsBad,
    totals: totalsOf(documents),
    createdBy: person.id,
    createdAt: now,
  });
  await keepRows(tx, { importId: id, rows });
  return { id, rowsGood, rowsBad };
}

async function keepRows(
  tx: Transaction,
  { importId, rows }: { importId: string; rows: readonly JudgedRow[] },
): Promise<void> {
  for (let at = 0; at < rows.length; at += rowsPerInsert) {
    await tx.insert(importRows).values(
      rows.slice(at, at + rowsPerInsert).map(({ rowNo, cells, problems }) => ({
        importId,
        rowNo,
        cells,
        problems,
        bad: problems.length > 0 ? 1 : 0,
      })),
    );
  }
}
