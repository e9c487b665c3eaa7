import type { ContainerTypeRow } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { formatDecimal } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';

const words = text.containerTypes;

export const typeColumns: readonly Column<ContainerTypeRow>[] = [
  { key: 'name', head: words.columns.name, cell: (row) => row.name, cardRole: 'title', sortable: true },
  { key: 'code', head: words.columns.code, cell: (row) => row.code, sortable: true },
  { key: 'kind', head: words.columns.kind, cell: (row) => words.kinds[row.kind] },
  { key: 'size', head: words.columns.size, cell: words.size, align: 'end' },
  { key: 'tare', head: words.columns.tare, cell: (row) => formatDecimal(row.tareKg), align: 'end' },
  { key: 'payload', head: words.columns.payload, cell: (row) => formatDecimal(row.payloadKg), align: 'end' },
  {
    key: 'stack',
    head: words.columns.stack,
    cell: (row) => <Figure units={row.stackLimit} plain />,
    align: 'end',
  },
  {
    key: 'state',
    head: words.columns.state,
    cell: (row) =>
      row.active ? (
        <Tag tone="done" label={words.use['in use']} />
      ) : (
        <Tag tone="open" label={words.use['out of use']} />
      ),
    cardRole: 'tag',
  },
];
