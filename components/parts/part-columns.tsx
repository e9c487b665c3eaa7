import type { PartRow } from '@/shared/contracts/parts';
import type { PoolRow } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import { formatDecimal } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';

const words = text.parts;

export const partColumns: readonly Column<PartRow>[] = [
  {
    key: 'number',
    head: words.columns.number,
    cell: (row) => words.partName(row.number, row.name),
    cardRole: 'title',
    sortable: true,
  },
  { key: 'type', head: words.columns.type, cell: (row) => row.type.name },
  {
    key: 'between',
    head: words.columns.between,
    cell: (row) => words.between(row.supplierSite.name, row.plantSite.name),
  },
  {
    key: 'perContainer',
    head: words.columns.perContainer,
    cell: (row) => <Figure units={row.unitsPerContainer} plain />,
    align: 'end',
  },
  {
    key: 'perDay',
    head: words.columns.perDay,
    cell: (row) => words.perDay(formatDecimal(row.unitsPerDayMean), formatDecimal(row.unitsPerDaySd)),
    align: 'end',
  },
  {
    key: 'containers',
    head: words.columns.containers,
    cell: (row) => <Figure number={row.containersPerDay} />,
    align: 'end',
    cardRole: 'aside',
  },
  {
    key: 'state',
    head: words.columns.state,
    cell: (row) => (row.active ? null : <Tag tone="open" label={words.use['out of use']} />),
    cardRole: 'tag',
  },
];

export const loopColumns: readonly Column<PoolRow>[] = [
  { key: 'type', head: words.loopColumns.type, cell: (row) => row.type.name, cardRole: 'title' },
  {
    key: 'parts',
    head: words.loopColumns.parts,
    cell: (row) => <Figure units={row.parts} plain />,
    align: 'end',
  },
  {
    key: 'perDay',
    head: words.loopColumns.perDay,
    cell: (row) => <Figure number={row.containersPerDay} plain />,
    align: 'end',
  },
  {
    key: 'loop',
    head: words.loopColumns.loop,
    cell: (row) => <Figure number={row.loopDays} plain />,
    align: 'end',
  },
  {
    key: 'state',
    head: words.loopColumns.state,
    cell: (row) => <LoopTag row={row} />,
    cardRole: 'tag',
  },
];

function LoopTag({ row }: { row: PoolRow }) {
  if (row.loopDays !== null) return <Tag tone="done" label={words.loopState.stated} />;
  const label = row.parts === 0 ? words.loopState.noParts : words.loopState.missing;
  return <Tag tone={row.parts === 0 ? 'open' : 'differs'} label={label} />;
}
