import type { Reader } from '@/db/client';
import type { downloadPool, PoolRow } from '@/shared/contracts/pool';
import type { QueryOf } from '@/shared/contracts/operation';
import { pool as words } from '@/shared/text/en/pool';
import { everyPage } from '../../documents/every-page';
import { listWorkbook, type SheetColumn } from '../../documents/list-workbook';
import { workbookMediaType } from '../../documents/statement-workbook';
import type { FileAnswer } from '../../http/route';
import { poolPage } from './list-pool';

type Asked = { query: QueryOf<typeof downloadPool>; today: string };

const head = words.columns;
const columns: readonly SheetColumn<PoolRow>[] = [
  { head: words.typeCode, text: (row) => row.type.code },
  { head: head.type, width: 28, text: (row) => row.type.name },
  { head: head.inPool, width: 18, units: (row) => row.inPool },
  { head: head.needed, units: (row) => row.poolSize },
  { head: head.approved, units: (row) => row.approved?.size ?? null },
  { head: words.sitesUnder, width: 24, units: (row) => row.sitesUnder },
  { head: words.sitesOver, width: 24, units: (row) => row.sitesOver },
  { head: words.loopDays, number: (row) => row.loopDays },
  { head: words.perDay, width: 18, number: (row) => row.containersPerDay },
];

export function poolWorkbook(db: Reader, { query, today }: Asked): FileAnswer {
  const pages = everyPage((page) => poolPage(db, { ...query, ...page }));
  return {
    name: `${words.title} ${today}.xlsx`,
    mediaType: workbookMediaType,
    content: listWorkbook({ name: words.title, columns, pages }),
  };
}
