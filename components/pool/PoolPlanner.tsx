import type { PoolPlan, ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { useSignedIn } from '../data/use-session';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { ApprovalsCard } from './ApprovalsCard';
import { LevelsCard } from './LevelsCard';
import { LoopCard } from './LoopCard';
import type { Pool } from './pool-answer';
import { PoolCurve } from './PoolCurve';
import { PoolFigures } from './PoolFigures';
import { PoolMakeup } from './PoolMakeup';
import { RunningShortCard } from './RunningShortCard';
import { usePlanEditing } from './use-plan-editing';
import { usePoolHead } from './use-pool-head';

type Props = { pool: Pool; plan: PoolPlan; reckoned: ReckonedPool };

/** How many, why, what each size would do, and what has been approved. */
export function PoolPlanner({ pool, plan, reckoned: stored }: Props) {
  const { code, currency } = pool.type;
  const { may } = useSignedIn();
  const wide = useIsWide();
  const editing = usePlanEditing({ code, plan, reckoned: stored });
  const { reckoned } = editing;
  const figures = <PoolFigures pool={pool} reckoned={reckoned} />;
  const loop = <LoopCard pool={pool} reckoned={reckoned} editing={editing} />;
  const effects = (
    <>
      <PoolCurve reckoned={reckoned} />
      <PoolMakeup reckoned={reckoned} />
      <RunningShortCard reckoned={reckoned} currency={currency} />
    </>
  );
  const approved = (
    <>
      <LevelsCard pool={pool} />
      <ApprovalsCard type={code} />
    </>
  );
  // What is approved is what is stored: while something is being turned, saving it comes first.
  const approve =
    may('approve pool') && !editing.changed ? (
      <ButtonLink href={`/pool/${code}/approve`} label={text.pool.approve(reckoned.result.poolSize)} />
    ) : undefined;
  return (
    <Page {...usePoolHead(pool)} action={approve}>
      {wide ? (
        <Box row gap="l" align="start">
          <Box grow least={360} gap="l">
            {loop}
            {approved}
          </Box>
          <Box grow least={580} gap="l">
            {figures}
            {effects}
          </Box>
        </Box>
      ) : (
        <>
          {figures}
          {loop}
          {effects}
          {approved}
        </>
      )}
    </Page>
  );
}
