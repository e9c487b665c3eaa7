import { readToday, type Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { useListState } from '../tables/use-list-state';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Select } from '../ui/Select';
import { Skeleton } from '../ui/Skeleton';
import { AdministrationCard } from './AdministrationCard';
import { DeliveriesCard, OverdueCard } from './DeliveriesCard';
import { DifferencesCard, OwnDifferencesCard } from './DifferencesCard';
import { DisputesCard } from './DisputesCard';
import { HoldingCard } from './HoldingCard';
import { LevelsCard } from './LevelsCard';
import { AwaitedCard, MonthEndCard } from './MonthEndCard';
import { PoolCard } from './PoolCard';
import { RunningCard } from './RunningCard';

const words = text.today;

/** A worklist, most urgent first, and one picture of where the units are. */
export function TodayScreen() {
  const read = useRead(readToday, { refetchEvery: 60_000 });
  const { may, company } = useSignedIn();
  const state = useListState({ filters: ['type'] });
  const type = state.filters['type'] ?? '';
  const today = read.data;
  const leadsWithPool = may('settle differences');
  const sends = company.kind === 'operator' ? 'empties' : 'fulls';
  return (
    <Page
      title={leadsWithPool ? words.poolHead : words.head}
      kicker={today ? words.kicker(today.company, formatDay(today.day, 'weekday')) : company.name}
      beside={
        leadsWithPool && today?.pool ? (
          <TypeSelect pool={today.pool} value={type} onChange={(next) => state.set('type', next)} />
        ) : undefined
      }
      action={
        may('send shipments') ? (
          <ButtonLink href="/shipments/send" label={text.shipments.send[sends]} />
        ) : undefined
      }
    >
      {read.error && !today ? <Problem error={read.error} onRetry={() => void read.refetch()} /> : null}
      {read.isPending ? <Loading /> : null}
      {today ? <Worklist today={today} type={type} leadsWithPool={leadsWithPool} /> : null}
    </Page>
  );
}

type SelectProps = { pool: NonNullable<Today['pool']>; value: string; onChange: (type: string) => void };

function TypeSelect({ pool, value, onChange }: SelectProps) {
  return (
    <Box least={220}>
      <Select
        label={words.type}
        hideLabel
        placeholder={words.allTypes}
        value={value}
        onChange={onChange}
        options={pool.types.map((each) => ({ value: each.typeCode, label: each.typeName }))}
      />
    </Box>
  );
}

function Loading() {
  return (
    <>
      <Card>
        <Skeleton lines={4} tall />
      </Card>
      <Card>
        <Skeleton lines={3} tall />
      </Card>
    </>
  );
}

type WorklistProps = { today: Today; type: string; leadsWithPool: boolean };

function Worklist({ today, type, leadsWithPool }: WorklistProps) {
  const wide = useIsWide();
  const hasUnits = today.pool !== null && today.pool.types.length > 0;
  const waits = isWaiting(today);
  return (
    <>
      {leadsWithPool && today.pool && hasUnits ? <PoolCard pool={today.pool} type={type} /> : null}
      <AdministrationCard today={today} />
      <MonthEndCard today={today} />
      <LevelsCard today={today} />
      {today.differences ? (
        <Box row={wide} wrap={wide} gap="l" align={wide ? 'start' : 'stretch'}>
          <DifferencesCard today={today} />
          <RunningCard today={today} />
        </Box>
      ) : null}
      <DeliveriesCard today={today} />
      <HoldingCard today={today} />
      <OwnDifferencesCard today={today} />
      <DisputesCard today={today} />
      <AwaitedCard today={today} />
      <OverdueCard today={today} />
      {waits ? null : (
        <Card>
          <EmptyState title={words.nothing} hint={words.nothingHint} />
        </Card>
      )}
      {!leadsWithPool && today.pool && hasUnits ? (
        <PoolCard pool={today.pool} type="" title={words.poolHead} />
      ) : null}
    </>
  );
}

function isWaiting(today: Today): boolean {
  const lists = [today.toCount, today.overdue, today.differences, today.disputes, today.awaited];
  const { months, administration } = today;
  return (
    lists.some((list) => (list?.total ?? 0) > 0) ||
    (today.ownDifferences ?? []).length > 0 ||
    (today.levels ?? []).length > 0 ||
    (months !== null && months.toClose.length + months.drafts.length + months.disputed.disputes > 0) ||
    (administration !== null &&
      (administration.invited.length > 0 || administration.failedLetters > 0 || administration.bookDiffers))
  );
}
