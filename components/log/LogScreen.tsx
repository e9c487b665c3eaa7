import { listLog, type LogRow, verifyLedgerSeals } from '@/shared/contracts/log';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead, useReadPages } from '../data/use-operation';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { CellText } from '../ui/CellText';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';

const words = text.log;

const columns: readonly Column<LogRow>[] = [
  {
    key: 'action',
    head: words.columns.action,
    cell: (row) => <CellText strong>{words.action(row.action)}</CellText>,
    cardRole: 'title',
  },
  { key: 'at', head: words.columns.at, cell: (row) => <CellText>{formatInstant(row.at, 'UTC')}</CellText> },
  {
    key: 'person',
    head: words.columns.person,
    cell: (row) => <CellText>{row.person ?? words.nobody}</CellText>,
  },
  {
    key: 'company',
    head: words.columns.company,
    cell: (row) => <CellText>{row.company ?? ''}</CellText>,
    cardRole: 'hidden',
  },
  { key: 'outcome', head: words.columns.outcome, cell: (row) => <CellText>{row.outcome}</CellText> },
  {
    key: 'subject',
    head: words.columns.subject,
    cell: (row) => (
      <CellText>{row.subjectKind ? `${row.subjectKind} ${(row.subjectId ?? '').slice(-12)}` : ''}</CellText>
    ),
  },
  {
    key: 'request',
    head: words.columns.request,
    cell: (row) => <CellText>{row.requestId.slice(0, 8)}</CellText>,
  },
];

const filters = [
  {
    key: 'outcome',
    label: words.outcomeFilter,
    usual: words.outcomes.all,
    options: [
      { value: 'done', label: words.outcomes.done },
      { value: 'refused', label: words.outcomes.refused },
    ],
  },
  { key: 'subject', label: words.subjectFilter, options: [{ value: 'book', label: words.subjects.book }] },
];

export function LogScreen() {
  const state = useListState({ filters: ['outcome', 'subject'] });
  const list = useReadPages(listLog, { query: state.query });
  return (
    <Page title={words.title} lead={words.lead}>
      <SealsCard />
      <RecordList<LogRow>
        label={words.title}
        list={list}
        columns={columns}
        rowKey={(row) => String(row.id)}
        state={state}
        filters={filters}
        searchLabel={words.search}
        empty={words.empty}
      />
    </Page>
  );
}

/** Reckoned only when asked for: the whole chain is read. */
function SealsCard() {
  const { data, error, isFetching, refetch } = useRead(verifyLedgerSeals, { enabled: false });
  return (
    <Card title={words.seals.title}>
      {error ? <Problem error={error} /> : null}
      {data ? <Verdict sealedEntries={data.sealedEntries} firstBroken={data.firstBroken} /> : null}
      <Button kind="secondary" label={words.seals.check} busy={isFetching} onPress={() => void refetch()} />
    </Card>
  );
}

function Verdict({ sealedEntries, firstBroken }: { sealedEntries: number; firstBroken: number | null }) {
  if (firstBroken !== null) return <Notice kind="error">{words.seals.broken(firstBroken)}</Notice>;
  if (sealedEntries === 0) return <Notice>{words.seals.none}</Notice>;
  return <Notice kind="success">{words.seals.fit(sealedEntries)}</Notice>;
}
