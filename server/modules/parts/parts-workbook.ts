import type { Reader } from '@/db/client';
import type { downloadParts, PartRow } from '@/shared/contracts/parts';
import type { QueryOf } from '@/shared/contracts/operation';
import { parts as words } from '@/shared/text/en/parts';
import { everyPage } from '../../documents/every-page';
import { listWorkbook, type SheetColumn } from '../../documents/list-workbook';
import { workbookMediaType } from '../../documents/statement-workbook';
import type { FileAnswer } from '../../http/route';
import { partsPage } from './read-model';

type Asked = { query: QueryOf<typeof downloadParts>; today: string };

const head = words.columns;
const columns: readonly SheetColumn<PartRow>[] = [
  { head: words.form.number, text: (row) => row.number },
  { head: words.form.name, width: 28, text: (row) => row.name },
  { head: head.type, width: 26, text: (row) => row.type.name },
  { head: words.form.supplier, width: 28, text: (row) => row.supplierSite.name },
  { head: words.form.plant, width: 28, text: (row) => row.plantSite.name },
  { head: words.form.unitsPerContainer, units: (row) => row.unitsPerContainer },
  { head: words.form.mean, number: (row) => row.unitsPerDayMean },
  { head: words.form.sd, number: (row) => row.unitsPerDaySd },
  { head: head.containers, width: 18, number: (row) => row.containersPerDay },
  { head: head.state, text: (row) => words.use[row.active ? 'in use' : 'out of use'] },
];

export function partsWorkbook(db: Reader, { query, today }: Asked): FileAnswer {
  const pages = everyPage((page) => partsPage(db, { ...query, ...page }));
  return {
    name: `${words.title} ${today}.xlsx`,
    mediaType: workbookMediaType,
    content: listWorkbook({ name: words.title, columns, pages }),
  };
}
