import { type LetterRow, listLetters } from '@/shared/contracts/log';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { useReadPages } from '../data/use-operation';
import type { Column } from '../tables/column';
import { optionsOf } from '../tables/filter-options';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { CellText } from '../ui/CellText';
import { Page } from '../ui/Page';
import { Tag } from '../ui/Tag';

const words = text.letters;
export const letterTones = { waiting: 'moving', sent: 'done', captured: 'open', failed: 'differs' } as const;

const columns: readonly Column<LetterRow>[] = [
  {
    key: 'subject',
    head: words.columns.subject,
    cell: (row) => <CellText strong>{row.subject}</CellText>,
    cardRole: 'title',
  },
  { key: 'to', head: words.columns.to, cell: (row) => <CellText>{row.toAddress}</CellText> },
  {
    key: 'at',
    head: words.columns.at,
    cell: (row) => <CellText>{formatInstant(row.createdAt, 'UTC')}</CellText>,
  },
  {
    key: 'state',
    head: words.columns.state,
    cardRole: 'tag',
    cell: (row) => <Tag tone={letterTones[row.state]} label={words.states[row.state]} />,
  },
];

const filters = [
  {
    key: 'state',
    label: words.stateFilter,
    usual: words.anyState,
    options: optionsOf(words.states),
  },
];

export function MailScreen() {
  const state = useListState({ filters: ['state'] });
  const list = useReadPages(listLetters, { query: state.query });
  return (
    <Page title={words.title} lead={words.lead}>
      <RecordList<LetterRow>
        label={words.title}
        list={list}
        columns={columns}
        rowKey={(row) => row.id}
        rowHref={(row) => `/mail/${row.id}`}
        state={state}
        filters={filters}
        searchLabel={words.search}
        empty={words.empty}
      />
    </Page>
  );
}
