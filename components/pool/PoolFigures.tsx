import type { ReactNode } from 'react';
import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { multiply } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';
import type { Pool } from './pool-answer';

const words = text.pool;

/** The size, large, and what follows from it beside what the book holds. */
export function PoolFigures({ pool, reckoned }: { pool: Pool; reckoned: ReckonedPool }) {
  const { result } = reckoned;
  const missing = result.poolSize - pool.inPool;
  const { replacement, currency } = pool.type;
  return (
    <Card>
      <Box row wrap gap="xl" align="end">
        <Named label={words.poolSize}>
          <Figure units={result.poolSize} size="hero" />
        </Named>
        <Named label={<Link href={`/balances?type=${pool.type.code}`} label={words.inPool} strong={false} />}>
          <Figure units={pool.inPool} size="head" />
        </Named>
        {missing > 0 ? (
          <Box gap="xs">
            <Named label={words.toBuy}>
              <Figure units={missing} size="head" tone="differs" />
            </Named>
            <Figure money={multiply(replacement, missing)} currency={currency} plain />
          </Box>
        ) : (
          <Named label={words.spare}>
            <Figure units={-missing} size="head" />
          </Named>
        )}
        <Named label={words.replaced}>
          <Figure number={result.replacementsPerYear} decimals={0} size="head" />
        </Named>
        <Named label={words.trips}>
          <Figure number={result.tripsPerContainerPerYear} size="head" />
        </Named>
      </Box>
    </Card>
  );
}

function Named({ label, children }: { label: ReactNode; children: ReactNode }) {
  return (
    <Box gap="xs">
      {typeof label === 'string' ? <Text variant="soft">{label}</Text> : label}
      {children}
    </Box>
  );
}
