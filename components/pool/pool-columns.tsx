import type { PoolRow } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import type { Column } from '../tables/column';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';

const words = text.pool;

export const poolColumns: readonly Column<PoolRow>[] = [
  { key: 'type', head: words.columns.type, cell: (row) => row.type.name, cardRole: 'title', sortable: true },
  {
    key: 'inPool',
    head: words.columns.inPool,
    cell: (row) => <Figure units={row.inPool} />,
    align: 'end',
  },
  {
    key: 'needed',
    head: words.columns.needed,
    cell: (row) => <Figure units={row.poolSize} plain />,
    align: 'end',
  },
  {
    key: 'approved',
    head: words.columns.approved,
    cell: (row) => <Figure units={row.approved?.size ?? null} plain />,
    align: 'end',
  },
  { key: 'standing', head: words.columns.standing, cell: (row) => <Standing row={row} />, cardRole: 'tag' },
  {
    key: 'sites',
    head: words.columns.sites,
    cell: (row) =>
      row.sitesUnder + row.sitesOver === 0 ? (
        <Text variant="soft">–</Text>
      ) : (
        <Tag
          tone={row.sitesUnder > 0 ? 'differs' : 'moving'}
          label={words.sites(row.sitesUnder, row.sitesOver)}
        />
      ),
  },
];

function Standing({ row }: { row: PoolRow }) {
  const size = row.approved?.size ?? row.poolSize;
  if (size === null || row.standing === 'not planned') return <Tag tone="open" label={words.notPlanned} />;
  if (row.standing === 'short') return <Tag tone="differs" label={words.short(size - row.inPool)} />;
  if (row.standing === 'above') return <Tag tone="moving" label={words.above(row.inPool - size)} />;
  return <Tag tone="done" label={row.approved ? words.asApproved : words.asNeeded} />;
}
