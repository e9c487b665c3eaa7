import type { ImportReceipt } from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { Box } from '../ui/Box';
import { CellText } from '../ui/CellText';
import { Checkbox } from '../ui/Checkbox';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';
import type { useChosen } from './use-chosen';

const words = text.imports.receipts;
type Chosen = ReturnType<typeof useChosen>;

const nameOf = (row: ImportReceipt): string => row.reference ?? text.imports.matches.noReference;

const facts: readonly Column<ImportReceipt>[] = [
  { key: 'lane', head: words.lane, cell: (row) => <CellText>{`${row.from} → ${row.to}`}</CellText> },
  { key: 'day', head: words.day, cell: (row) => <CellText>{formatDay(row.day)}</CellText> },
  {
    key: 'units',
    head: words.units,
    align: 'end',
    cell: (row) => (
      <Box gap="xs">
        {row.lines.map(({ typeCode, units }) => (
          <Box key={typeCode} row spread="end" gap="m">
            <Text>{typeCode}</Text>
            <Figure units={units} />
          </Box>
        ))}
      </Box>
    ),
  },
];

const name: Column<ImportReceipt> = {
  key: 'receipt',
  head: words.receipt,
  cardRole: 'title',
  cell: (row) => <CellText strong>{`${nameOf(row)}, ${words.rowIn(row.rowNo)}`}</CellText>,
};

const choice = (chosen: Chosen): Column<ImportReceipt> => ({
  key: 'receipt',
  head: words.receipt,
  cardRole: 'title',
  cell: (row) => (
    <Checkbox
      label={`${nameOf(row)}, ${words.rowIn(row.rowNo)}`}
      value={chosen.has(row.id)}
      onChange={(value) => chosen.set(row.id, value)}
    />
  ),
});

const first: Column<ImportReceipt> = {
  key: 'first',
  head: words.first,
  cell: ({ first: kept }) => (
    <CellText>
      {kept ? words.firstIn(kept.rowNo, kept.reference ?? text.imports.matches.noReference) : ''}
    </CellText>
  ),
};

const shipment: Column<ImportReceipt> = {
  key: 'shipment',
  head: words.shipment,
  cell: ({ shipment: held }) =>
    held ? <Link href={`/shipments/${held.id}`} label={held.reference} /> : null,
};

export function receiptColumns(
  state: ImportReceipt['state'],
  chosen: Chosen,
): readonly Column<ImportReceipt>[] {
  if (state === 'unannounced') return [choice(chosen), ...facts];
  return state === 'duplicate' ? [name, ...facts, first, shipment] : [name, ...facts, shipment];
}
