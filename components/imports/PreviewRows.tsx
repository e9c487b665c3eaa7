import { listImportRows, type ImportFileRow } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Box } from '../ui/Box';
import { CellText } from '../ui/CellText';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';

const words = text.imports;

function Problems({ row }: { row: ImportFileRow }) {
  if (row.problems.length === 0) return <Tag tone="done" label={words.preview.fine} />;
  return (
    <Box gap="xs">
      <Tag tone="differs" label={words.preview.wrong} />
      {row.problems.map(({ column, reason, data }) => (
        <Text key={`${column} ${reason}`}>{words.problem(column, words.reasons[reason](data))}</Text>
      ))}
    </Box>
  );
}

const columns: readonly Column<ImportFileRow>[] = [
  {
    key: 'row',
    head: words.preview.row,
    cardRole: 'title',
    whole: true,
    cell: (row) => <CellText strong>{words.rowName(row.rowNo)}</CellText>,
  },
  {
    key: 'problems',
    head: words.list.state,
    cardRole: 'tag',
    width: '34%',
    cell: (row) => <Problems row={row} />,
  },
  { key: 'side', head: words.columns.side, cell: ({ cells }) => <CellText>{cells.side}</CellText> },
  { key: 'ref', head: words.columns.reference, cell: ({ cells }) => <CellText>{cells.reference}</CellText> },
  {
    key: 'lane',
    head: words.preview.lane,
    cell: ({ cells }) => <CellText>{`${cells.from} → ${cells.to}`}</CellText>,
  },
  { key: 'date', head: words.columns.date, cell: ({ cells }) => <CellText>{cells.date}</CellText> },
  { key: 'type', head: words.columns.type, cell: ({ cells }) => <CellText>{cells.type}</CellText> },
  {
    key: 'units',
    head: words.columns.units,
    align: 'end',
    cell: ({ cells }) => <CellText end>{cells.units}</CellText>,
  },
];

const filters = [
  {
    key: 'only',
    label: words.preview.only,
    options: [
      { value: 'bad', label: words.preview.onlyBad },
      { value: 'good', label: words.preview.onlyGood },
    ],
  },
];

/** A card for each on a phone: a page stays short. */
const rowsAtOnce = 20;

/** The rows as they were read, the bad ones first. */
export function PreviewRows({ id }: { id: string }) {
  const state = useListState({ filters: ['only'] });
  const list = useReadPages(listImportRows, {
    params: { import: id },
    query: { ...state.query, limit: rowsAtOnce },
  });
  return (
    <Box gap="m">
      <Text variant="title">{words.preview.rowsHead}</Text>
      <RecordList<ImportFileRow>
        label={words.preview.rowsHead}
        list={list}
        columns={columns}
        rowKey={(row) => String(row.rowNo)}
        state={state}
        filters={filters}
        empty={words.preview.noRows}
      />
    </Box>
  );
}
