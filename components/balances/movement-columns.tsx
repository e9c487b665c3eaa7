import type { MovementRow } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';

const words = text.balances;
const head = words.movement;

/** A movement: when, what, from where to where; units above 0 came in, below 0 went out. */
export function movementColumns(onTakeBack: (row: MovementRow) => void): Column<MovementRow>[] {
  return [
    { key: 'kind', head: head.kind, cell: (row) => <What row={row} />, cardRole: 'title' },
    {
      key: 'units',
      head: head.units,
      align: 'end',
      cell: (row) => <Figure units={row.units} />,
      cardRole: 'aside',
    },
    { key: 'day', head: head.day, cell: (row) => formatDay(row.valueDate), whole: true },
    { key: 'from', head: head.from, cell: (row) => words.place(row.from) },
    { key: 'to', head: head.to, cell: (row) => words.place(row.to) },
    { key: 'by', head: head.by, cell: (row) => row.by ?? '', cardRole: 'hidden' },
    {
      key: 'shipment',
      head: head.shipment,
      cell: (row) => <Behind row={row} onTakeBack={onTakeBack} />,
      whole: true,
    },
  ];
}

function What({ row }: { row: MovementRow }) {
  return (
    <Box gap="xs">
      <Text strong>{row.kind}</Text>
      <Text variant="small">
        {[
          words.entry(row.entryId),
          ...(row.correctsEntryId === null ? [] : [words.corrects(row.correctsEntryId)]),
          ...(row.reason === '' ? [] : [row.reason]),
        ].join(' · ')}
      </Text>
    </Box>
  );
}

function Behind({ row, onTakeBack }: { row: MovementRow; onTakeBack: (row: MovementRow) => void }) {
  if (row.shipment) return <Link href={`/shipments/${row.shipment.id}`} label={row.shipment.reference} />;
  if (!row.mayReverse) return null;
  return (
    <Button
      kind="quiet"
      label={words.takeBack}
      name={words.takeBackOf(row.entryId)}
      onPress={() => onTakeBack(row)}
    />
  );
}
