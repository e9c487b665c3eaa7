import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMoney } from '@/shared/text/format';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet, type SheetColumn } from '../ui/Sheet';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { WorkCard } from './WorkCard';

const words = text.today;
type Row = NonNullable<Today['differences']>['rows'][number];

const saidOf = ({ openUnits }: Pick<Row, 'openUnits'>) => ({
  tone: 'differs' as const,
  label: openUnits < 0 ? words.fewer(-openUnits) : words.more(openUnits),
});

const columns: readonly SheetColumn<Row>[] = [
  { key: 'shipment', head: words.column.shipment, cell: (row) => row.reference, width: 116 },
  { key: 'between', head: words.column.between, cell: (row) => words.between(row.from, row.to) },
  { key: 'what', head: words.column.what, cell: (row) => <What row={row} /> },
  {
    key: 'openFor',
    head: words.column.openFor,
    align: 'end',
    cell: (row) => words.openFor(row.openDays),
    width: 84,
  },
  {
    key: 'atStake',
    head: words.column.atStake,
    align: 'end',
    cell: (row) => <Figure money={row.atStake.amount} currency={row.atStake.currency} plain />,
  },
  {
    key: 'action',
    head: words.column.next,
    align: 'end',
    cell: (row) => (
      <Link href={`/differences/${row.id}`} label={words.settle} name={words.settleOf(row.reference)} />
    ),
  },
];

function What({ row }: { row: Row }) {
  return (
    <Box gap="xs">
      <Tag {...saidOf(row)} />
      <Text variant="small">{row.typeName}</Text>
    </Box>
  );
}

/** The coordinator's: the oldest first, with what is at stake. */
export function DifferencesCard({ today }: { today: Today }) {
  const { differences } = today;
  const wide = useIsWide();
  if (!differences || differences.rows.length === 0) return null;
  if (!wide) return <DifferencesOnPhone differences={differences} />;
  return (
    <Card
      title={words.differences}
      beside={<Link href="/differences" label={words.all(differences.total)} />}
      grow
      least={560}
    >
      <Sheet
        caption={words.differences}
        hideCaption
        columns={columns}
        rows={differences.rows}
        rowKey={(row) => row.id}
        stack
      />
    </Card>
  );
}

function DifferencesOnPhone({ differences }: { differences: NonNullable<Today['differences']> }) {
  return (
    <WorkCard
      title={words.differences}
      all={{ total: differences.total, href: '/differences' }}
      rows={differences.rows.map((row) => ({
        key: row.id,
        tag: saidOf(row),
        title: row.reference,
        beside: row.typeName,
        lines: [
          words.between(row.from, row.to),
          [words.openFor(row.openDays), formatMoney(row.atStake.amount, row.atStake.currency)].join(' · '),
        ],
        action: {
          href: `/differences/${row.id}`,
          label: words.settle,
          name: words.settleOf(row.reference),
        },
      }))}
    />
  );
}

/** A partner's: what differed on its own shipments, the latest first. */
export function OwnDifferencesCard({ today }: { today: Today }) {
  const rows = today.ownDifferences ?? [];
  if (rows.length === 0) return null;
  return (
    <WorkCard
      rows={rows.map((row) => ({
        key: row.id,
        tag: saidOf(row),
        lines: [words.countedOn(row.reference, row.typeName, formatDay(row.openedOn, 'date'))],
        action: {
          href: `/shipments/${row.shipmentId}`,
          label: words.open,
          name: words.openOf(row.reference),
        },
      }))}
    />
  );
}
