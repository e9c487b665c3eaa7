import {
  documentOutcomes,
  listImportShipments,
  type ImportDocument,
} from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { formatUnits } from '@/shared/text/format';
import { useReadPages } from '../data/use-operation';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { CellText } from '../ui/CellText';
import { Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { Tag } from '../ui/Tag';

const words = text.imports.shipments;
const tones = { posted: 'done', known: 'open', refused: 'differs' } as const;

const whyOf = ({ problem }: ImportDocument): string => {
  if (problem === null) return '';
  return problem.code === 'already exists' ? words.conflict : text.problems[problem.code](problem.data);
};

const columns: readonly Column<ImportDocument>[] = [
  {
    key: 'reference',
    head: words.reference,
    cardRole: 'title',
    cell: (row) =>
      row.shipmentId ? (
        <Link href={`/shipments/${row.shipmentId}`} label={row.reference} />
      ) : (
        <CellText strong>{row.reference}</CellText>
      ),
  },
  { key: 'row', head: words.row, cell: (row) => <CellText>{formatUnits(row.rowNo)}</CellText> },
  {
    key: 'outcome',
    head: words.outcome,
    cardRole: 'tag',
    cell: (row) => <Tag tone={tones[row.outcome]} label={words.outcomes[row.outcome]} />,
  },
  { key: 'why', head: words.why, cell: (row) => <CellText>{whyOf(row)}</CellText> },
];

const filters = [
  {
    key: 'outcome',
    label: words.outcome,
    options: documentOutcomes.map((value) => ({ value, label: words.outcomes[value] })),
  },
];

/** What became of each shipment of a file. */
export function ImportShipmentsScreen({ id }: { id: string }) {
  const state = useListState({ filters: ['outcome'] });
  const list = useReadPages(listImportShipments, { params: { import: id }, query: state.query });
  const shown = state.query.outcome === 'posted' ? columns.filter(({ key }) => key !== 'why') : columns;
  return (
    <Page title={words.head} back={{ href: `/imports/${id}`, label: text.imports.oneHead }}>
      <RecordList<ImportDocument>
        label={words.head}
        list={list}
        columns={shown}
        rowKey={(row) => String(row.rowNo)}
        state={state}
        filters={filters}
        empty={words.empty}
      />
    </Page>
  );
}
