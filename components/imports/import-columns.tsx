import type { ImportRow } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';

const words = text.imports;

export const stateTones = {
  preview: 'open',
  running: 'moving',
  done: 'done',
  failed: 'differs',
  dropped: 'disputed',
} as const;

export const importColumns = (timeZone: string): readonly Column<ImportRow>[] => [
  {
    key: 'file',
    head: words.list.file,
    cardRole: 'title',
    cell: (row) => <CellText strong>{row.fileName}</CellText>,
  },
  {
    key: 'state',
    head: words.list.state,
    cardRole: 'tag',
    cell: (row) => <Tag tone={stateTones[row.state]} label={words.states[row.state]} />,
  },
  {
    key: 'good',
    head: words.list.good,
    align: 'end',
    cell: (row) => <Figure units={row.rowsGood} />,
  },
  { key: 'bad', head: words.list.bad, align: 'end', cell: (row) => <Figure units={row.rowsBad} plain /> },
  { key: 'by', head: words.list.by, cell: (row) => <CellText>{row.by ?? ''}</CellText> },
  {
    key: 'at',
    head: words.list.at,
    cell: (row) => <CellText>{formatInstant(row.createdAt, timeZone)}</CellText>,
  },
];
