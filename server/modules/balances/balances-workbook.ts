import type { Reader } from '@/db/client';
import type { BalanceRow, downloadBalances } from '@/shared/contracts/balances';
import type { QueryOf } from '@/shared/contracts/operation';
import { balances as words } from '@/shared/text/en/balances';
import { everyPage } from '../../documents/every-page';
import { listWorkbook, type SheetColumn } from '../../documents/list-workbook';
import { workbookMediaType } from '../../documents/statement-workbook';
import type { Person } from '../../http/person';
import type { FileAnswer } from '../../http/route';
import { balanceRows } from './read-model';

type Asked = { query: QueryOf<typeof downloadBalances>; person: Person; today: string };

function columnsFor(day: string): readonly SheetColumn<BalanceRow>[] {
  const { column, part } = words;
  return [
    { head: column.company, width: 28, text: (row) => row.company },
    { head: words.typeCode, text: (row) => row.typeCode },
    { head: column.type, width: 26, text: (row) => row.typeName },
    { head: words.filter.asOf, day: () => day },
    { head: words.held, units: (row) => row.held },
    { head: part.atSites, width: 18, units: (row) => row.atSites },
    { head: part.sent, width: 22, units: (row) => row.sent },
    { head: part.sentDiffers, width: 36, units: (row) => row.sentDiffers },
    { head: part.toIt, width: 18, units: (row) => row.toIt },
    { head: part.toItDiffers, width: 40, units: (row) => row.toItDiffers },
  ];
}

/** The balances as a spreadsheet, as of the day asked for or of today. */
export function balancesWorkbook(db: Reader, { query, ...asked }: Asked): FileAnswer {
  const day = query.asOf ?? asked.today;
  const pages = everyPage((page) => balanceRows(db, { ...asked, query: { ...query, ...page } }));
  return {
    name: `${words.head.operator} ${day}.xlsx`,
    mediaType: workbookMediaType,
    content: listWorkbook({ name: words.head.operator, columns: columnsFor(day), pages }),
  };
}
