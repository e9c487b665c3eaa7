import type { DifferenceRow } from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import type { Column } from '../tables/column';
import type { Tone } from '../theme/meaning';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';

const words = text.differences;

function toneOf(row: DifferenceRow): Tone {
  if (row.state === 'settled') return 'done';
  if (row.disputeId !== null) return 'disputed';
  if (row.kind === 'overdue') return 'moving';
  return row.kind === 'unannounced' ? 'open' : 'differs';
}

export function DifferenceTag({ row }: { row: DifferenceRow }) {
  return <Tag tone={toneOf(row)} label={words.tag(row)} />;
}

type Show = { settles: boolean; answers: boolean; chosen: string | undefined };

function nextOf(row: DifferenceRow, { settles, answers }: Show): string {
  if (row.state === 'settled') return words.settledTag(row);
  if (row.kind === 'unannounced') return words.next.match;
  if (row.kind === 'overdue') return words.next.open;
  if (row.disputeId !== null && answers) return words.next.answer;
  return settles ? words.next.settle : words.next.look;
}

/** Where a row leads: to its settling, its dispute, its shipment, or the file it came from. */
export function hrefOf(row: DifferenceRow, show: Show & { query: Record<string, string> }): string {
  if (row.kind === 'overdue') return `/shipments/${row.shipmentId}`;
  if (row.kind === 'unannounced') return `/imports/${row.importId}`;
  if (row.disputeId !== null && show.answers && row.state === 'open') return `/disputes/${row.disputeId}`;
  const asked = new URLSearchParams(show.query).toString();
  return `/differences/${row.id}${asked === '' ? '' : `?${asked}`}`;
}

const shipmentOf = (chosen: string | undefined): Column<DifferenceRow> => ({
  key: 'shipment',
  head: words.columns.shipment,
  cardRole: 'title',
  cell: (row) => (
    <CellText strong>{row.id === chosen ? words.chosen(referenceOf(row)) : referenceOf(row)}</CellText>
  ),
});
const referenceOf = (row: DifferenceRow) => row.reference ?? words.noReference;
const what: Column<DifferenceRow> = {
  key: 'what',
  head: words.columns.what,
  cardRole: 'tag',
  cell: (row) => <DifferenceTag row={row} />,
};
const atStake: Column<DifferenceRow> = {
  key: 'atStake',
  head: words.columns.atStake,
  align: 'end',
  cardRole: 'aside',
  cell: (row) => <Figure money={row.atStake} currency={row.currency} plain />,
};

/** All columns; beside an open detail only those that find a row again. */
export function differenceColumns(show: Show): Column<DifferenceRow>[] {
  const shipment = shipmentOf(show.chosen);
  if (show.chosen !== undefined) return [shipment, what, atStake];
  return [
    shipment,
    {
      key: 'between',
      head: words.columns.between,
      cell: (row) => words.lane(row.from.site, row.to.site),
    },
    what,
    {
      key: 'openFor',
      head: words.columns.openFor,
      align: 'end',
      cell: (row) => words.daysOpen(row.days),
    },
    atStake,
    {
      key: 'next',
      head: words.columns.next,
      align: 'end',
      cardRole: 'hidden',
      cell: (row) => (
        <Text strong tone={row.state === 'settled' ? 'soft' : 'action'}>
          {nextOf(row, show)}
        </Text>
      ),
    },
  ];
}
