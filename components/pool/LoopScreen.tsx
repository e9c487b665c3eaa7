import { router } from 'expo-router';
import { readPool, savePlan } from '@/shared/contracts/pool';
import { poolPlan, type PoolPlan } from '@/shared/contracts/pool-sizing';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { FormFrame } from '../forms/FormFrame';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { AssumptionFields } from './AssumptionFields';
import { LegFields } from './LegFields';
import { SeenCard } from './SeenCard';

const words = text.parts;
const back = { href: '/parts', label: words.title };
type Pool = AnswerOf<typeof readPool>;

/** Where a loop begins before anything is stated: six legs of one day, to be set to what is so. */
const firstPlan: PoolPlan = {
  legs: [
    { name: 'filled at the supplier', stretch: 'at the partner', days: { mean: '1', sd: '0' } },
    { name: 'on the way to the plant', stretch: 'to the plant', days: { mean: '1', sd: '0' } },
    { name: 'full stock at the plant', stretch: 'at the plant', days: { mean: '1', sd: '0' } },
    { name: 'empties at the plant', stretch: 'at the plant', days: { mean: '1', sd: '0' } },
    { name: 'on the way back', stretch: 'back', days: { mean: '1', sd: '0' } },
  ],
  travel: 'together',
  bufferDays: '1',
  coverPct: '98',
  heldPct: '0',
  repairPct: '0',
  lossPerTripPct: '0',
  workingDaysPerYear: 240,
};

export function LoopScreen({ type }: { type: string }) {
  const { data, error, refetch } = useRead(readPool, { params: { type } });
  if (data) return <LoopForm key={data.type.code} pool={data} />;
  return (
    <Page title={words.loopTitle} back={back}>
      {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={8} tall />}
    </Page>
  );
}

function LoopForm({ pool }: { pool: Pool }) {
  const { code, name } = pool.type;
  const { may } = useSignedIn();
  const draft = useDraftForm({
    name: `loop ${code}`,
    schema: poolPlan,
    defaultValues: pool.plan ?? firstPlan,
  });
  const post = usePost(savePlan, { refreshes: ['parts'] });
  return (
    <Page title={words.loopOf(name)} back={back}>
      <FormFrame
        draft={draft}
        label={words.loopOf(name)}
        submitLabel={words.saveLoop}
        inBar
        disabled={!may('plan pool')}
        more={<ButtonLink href={`/pool/${code}`} label={text.containerTypes.pool} kind="secondary" />}
        onSubmit={async (body) => {
          await post.mutateAsync({ params: { type: code }, body });
          announce(words.loopSaved);
          router.replace(`/pool/${code}`);
        }}
      >
        <LegFields control={draft.form.control} />
        <SeenCard form={draft.form} seen={pool.seen} />
        <AssumptionFields />
      </FormFrame>
    </Page>
  );
}
