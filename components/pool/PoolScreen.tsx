import { readPool } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { manyOf, type Pool } from './pool-answer';
import { PoolPlanner } from './PoolPlanner';
import { usePoolHead } from './use-pool-head';

const words = text.pool;
const back = { href: '/pool', label: words.title };

export function PoolScreen({ type }: { type: string }) {
  const { data, error, refetch } = useRead(readPool, { params: { type } });
  if (!data) {
    return (
      <Page title={words.title} back={back}>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={8} tall />}
      </Page>
    );
  }
  const { plan, reckoned } = data;
  if (plan === null || reckoned === null) return <NotYet pool={data} />;
  return <PoolPlanner key={data.type.code} pool={data} plan={plan} reckoned={reckoned} />;
}

const nextStep = (pool: Pool) =>
  pool.whyNot === 'no parts' ? `/parts/new?type=${pool.type.code}` : `/parts/loops/${pool.type.code}`;

function NotYet({ pool }: { pool: Pool }) {
  const { may } = useSignedIn();
  const why = words.whyNot[pool.whyNot ?? 'refused'];
  return (
    <Page {...usePoolHead(pool)}>
      <Card>
        <EmptyState
          title={why.title}
          hint={why.hint}
          action={may('plan pool') ? <ButtonLink href={nextStep(pool)} label={why.action} /> : undefined}
        />
        <Text variant="soft">{words.inPoolToday({ units: pool.inPool, many: manyOf(pool) })}</Text>
      </Card>
    </Page>
  );
}
