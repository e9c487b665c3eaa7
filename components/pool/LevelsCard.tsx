import { text } from '@/shared/text/catalogue';
import { formatUnits } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Sheet } from '../ui/Sheet';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import type { Pool } from './pool-answer';

const words = text.pool;
type SiteRow = Pool['sites'][number];

/** Each site's stock against the levels approved for it. */
export function LevelsCard({ pool }: { pool: Pool }) {
  return (
    <Card title={words.levels}>
      {pool.sites.length === 0 ? (
        <Text variant="soft">{words.levelsNone}</Text>
      ) : (
        <Sheet<SiteRow>
          caption={words.levels}
          hideCaption
          stack
          rows={pool.sites}
          rowKey={(row) => row.id}
          columns={[
            {
              key: 'site',
              head: words.levelColumns.site,
              cell: (row) => row.name,
            },
            {
              key: 'units',
              head: words.levelColumns.units,
              align: 'end',
              cell: (row) => (
                <Link
                  href={`/balances/${row.companyId}/${pool.type.code}?site=${row.id}`}
                  label={formatUnits(row.units)}
                  name={words.movementsAt(row.units, row.name)}
                />
              ),
            },
            {
              key: 'level',
              head: words.levelColumns.level,
              align: 'end',
              cell: (row) =>
                row.minimum === null || row.maximum === null ? '–' : words.level(row.minimum, row.maximum),
            },
            {
              key: 'standing',
              head: words.levelColumns.standing,
              width: 116,
              cell: (row) => <Standing site={row} />,
            },
          ]}
        />
      )}
    </Card>
  );
}

function Standing({ site }: { site: SiteRow }) {
  if (site.minimum === null || site.maximum === null) return <Text variant="soft">{words.noLevel}</Text>;
  if (site.units < site.minimum) return <Tag tone="differs" label={words.under(site.minimum - site.units)} />;
  if (site.units > site.maximum) return <Tag tone="moving" label={words.over(site.units - site.maximum)} />;
  return <Tag tone="done" label={words.within} />;
}
