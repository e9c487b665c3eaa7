import type { Reader } from '@/db/client';
import type { downloadContainerTypes, ContainerTypeRow } from '@/shared/contracts/container-types';
import type { QueryOf } from '@/shared/contracts/operation';
import { containerTypes as words } from '@/shared/text/en/container-types';
import { everyPage } from '../../documents/every-page';
import { listWorkbook, type SheetColumn } from '../../documents/list-workbook';
import { workbookMediaType } from '../../documents/statement-workbook';
import type { FileAnswer } from '../../http/route';
import { typesPage } from './read-model';

type Asked = { query: QueryOf<typeof downloadContainerTypes>; today: string };

const head = words.columns;
const columns: readonly SheetColumn<ContainerTypeRow>[] = [
  { head: head.code, text: (row) => row.code },
  { head: head.name, width: 28, text: (row) => row.name },
  { head: head.kind, text: (row) => words.kinds[row.kind] },
  { head: words.form.lengthMm, width: 18, units: (row) => row.lengthMm },
  { head: words.form.widthMm, width: 18, units: (row) => row.widthMm },
  { head: words.form.heightMm, width: 18, units: (row) => row.heightMm },
  { head: head.tare, number: (row) => row.tareKg },
  { head: head.payload, number: (row) => row.payloadKg },
  { head: head.stack, units: (row) => row.stackLimit },
  { head: head.state, text: (row) => words.use[row.active ? 'in use' : 'out of use'] },
];

export function typesWorkbook(db: Reader, { query, today }: Asked): FileAnswer {
  const pages = everyPage((page) => typesPage(db, { ...query, ...page }));
  return {
    name: `${words.title} ${today}.xlsx`,
    mediaType: workbookMediaType,
    content: listWorkbook({ name: words.title, columns, pages }),
  };
}
