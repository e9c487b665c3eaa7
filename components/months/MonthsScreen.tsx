import { listMonths, type MonthRow } from '@/shared/contracts/months';
import { dayInZone } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMonth } from '@/shared/text/format';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { CellText } from '../ui/CellText';
import { Page } from '../ui/Page';
import { MonthTag } from './MonthTag';

const words = text.months;

/** Every month since the first movement, newest first. */
export function MonthsScreen() {
  const list = useReadPages(listMonths, {});
  const { company } = useSignedIn();
  return (
    <Page title={words.head} lead={words.lead}>
      <RecordList<MonthRow>
        label={words.head}
        list={list}
        columns={columnsIn(company.timeZone)}
        rowKey={(row) => row.month}
        rowHref={(row) => `/months/${row.month}`}
        empty={{ title: words.empty, hint: words.emptyHint }}
      />
    </Page>
  );
}

function columnsIn(timeZone: string): Column<MonthRow>[] {
  return [
    {
      key: 'month',
      head: words.month,
      cardRole: 'title',
      cell: (row) => <CellText strong>{formatMonth(row.month)}</CellText>,
    },
    { key: 'state', head: words.state, cardRole: 'tag', cell: (row) => <MonthTag row={row} /> },
    {
      key: 'statements',
      head: words.statements,
      cell: (row) => words.counts(row.statements) || words.none,
    },
    {
      key: 'closed',
      head: words.closed,
      cell: ({ closedAt, closedBy }) =>
        closedAt ? words.closedBy(closedBy, formatDay(dayInZone(closedAt, timeZone))) : '–',
    },
  ];
}
