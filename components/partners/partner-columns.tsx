import type { PartnerRow } from '@/shared/contracts/partners';
import { text } from '@/shared/text/catalogue';
import type { Column } from '../tables/column';
import { Tag } from '../ui/Tag';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';

const words = text.partners;

export const partnerColumns: readonly Column<PartnerRow>[] = [
  {
    key: 'name',
    head: words.columns.name,
    cell: (row) => <CellText strong>{row.name}</CellText>,
    cardRole: 'title',
  },
  { key: 'code', head: words.columns.code, cell: (row) => <CellText>{row.code}</CellText> },
  { key: 'sites', head: words.columns.sites, align: 'end', cell: (row) => <Figure units={row.sites} /> },
  { key: 'people', head: words.columns.people, align: 'end', cell: (row) => <Figure units={row.people} /> },
  {
    key: 'currency',
    head: words.columns.currency,
    cell: (row) => <CellText>{row.currency}</CellText>,
    cardRole: 'hidden',
  },
  {
    key: 'state',
    head: words.columns.state,
    cardRole: 'tag',
    cell: (row) => (
      <Tag
        tone={row.active ? 'done' : 'open'}
        label={row.active ? words.states.active : words.states.inactive}
      />
    ),
  },
];
