import { listStatementMovements, readStatement } from '@/shared/contracts/statements';
import type { ContentMovement } from '@/shared/domain/statement/content';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMonth } from '@/shared/text/format';
import { useRead, useReadPages } from '../data/use-operation';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';
import { behindWords } from './behind-words';

const words = text.statements.movements;

/** The movements behind a figure of a statement, as the statement knew them. */
export function StatementMovementsScreen({ statement }: { statement: string }) {
  const { query } = useListState({ filters: ['line', 'component', 'corrects', 'before', 'type', 'kind'] });
  const page = useRead(readStatement, { params: { statement } }).data;
  const list = useReadPages(listStatementMovements, { params: { statement }, query });
  const types = page?.content.types ?? [];
  const nameOf = (code: string) => types.find((type) => type.code === code)?.name ?? code;
  return (
    <Page
      title={words.head}
      back={{ href: `/statements/${statement}`, label: page ? formatMonth(page.month) : words.back }}
      {...(page ? { kicker: page.partner.name, lead: words.of(behindWords(page, query)) } : {})}
    >
      <RecordList<ContentMovement>
        label={words.head}
        list={list}
        columns={columnsOf(nameOf)}
        rowKey={(row) => row.id}
        empty={{ title: words.empty, hint: words.emptyHint }}
      />
    </Page>
  );
}

function columnsOf(nameOf: (code: string) => string): Column<ContentMovement>[] {
  return [
    { key: 'day', head: words.day, whole: true, cell: (row) => formatDay(row.date) },
    {
      key: 'shipment',
      head: words.shipment,
      cardRole: 'title',
      whole: true,
      cell: (row) =>
        row.reference && row.shipmentId ? (
          <Link href={`/shipments/${row.shipmentId}`} label={row.reference} />
        ) : (
          '–'
        ),
    },
    { key: 'kind', head: words.kind, cell: (row) => text.statements.kind[row.kind] },
    { key: 'type', head: words.type, cell: (row) => nameOf(row.typeCode) },
    {
      key: 'units',
      head: words.units,
      align: 'end',
      cardRole: 'aside',
      cell: (row) => <Figure units={row.quantity} />,
    },
    { key: 'cause', head: words.cause, cell: (row) => <Cause row={row} /> },
  ];
}

function Cause({ row }: { row: ContentMovement }) {
  return (
    <Box gap="xs">
      <Text>{row.cause === '' ? '–' : row.cause}</Text>
      {row.lateFor ? <Text variant="small">{words.bearsOn(row.lateFor)}</Text> : null}
    </Box>
  );
}
