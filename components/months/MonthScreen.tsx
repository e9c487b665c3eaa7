import { readMonth } from '@/shared/contracts/months';
import type { AnswerOf } from '@/shared/contracts/operation';
import { dayInZone } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMonth } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { ButtonLink } from '../ui/Link';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { CloseForm } from './CloseForm';
import { MonthStatements } from './MonthStatements';
import { MonthTag } from './MonthTag';
import { OpenItems } from './OpenItems';

const words = text.months;
export type MonthPage = AnswerOf<typeof readMonth>;
const whileWorkingMs = 1500;

const isWorking = (page: MonthPage | undefined) =>
  page?.jobs.some((job) => job.state === 'waiting' || job.state === 'running') ?? false;

/** A month: what still stands open, its close, and how its statements are coming along. */
export function MonthScreen({ month }: { month: string }) {
  const first = useRead(readMonth, { params: { month } });
  const working = isWorking(first.data);
  // While a job works the page keeps looking; the second question shares the answer of the first.
  useRead(readMonth, { params: { month }, enabled: working, refetchEvery: whileWorkingMs });
  const { data, error, refetch } = first;
  return (
    <Page
      title={formatMonth(month)}
      back={{ href: '/months', label: words.back }}
      {...(data ? { beside: <MonthTag row={data} /> } : {})}
    >
      {data ? (
        <Body page={data} />
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Card>
          <Skeleton lines={6} tall />
        </Card>
      )}
    </Page>
  );
}

function Body({ page }: { page: MonthPage }) {
  return (
    <>
      <Standing page={page} />
      {page.state === 'closed' ? <MonthStatements page={page} /> : null}
      <OpenItems page={page} />
      {page.mayClose ? <CloseForm page={page} /> : null}
    </>
  );
}

function Standing({ page }: { page: MonthPage }) {
  const { company } = useSignedIn();
  if (page.state === 'closed') {
    const when = page.closedAt ? formatDay(dayInZone(page.closedAt, company.timeZone)) : '';
    return (
      <Card gap="xs">
        <Text>{`${words.closed}: ${words.closedBy(page.closedBy, when)}`}</Text>
        {page.reason === '' ? null : <Text variant="soft">{words.closedReason(page.reason)}</Text>}
      </Card>
    );
  }
  if (!page.over) return <Notice live={false}>{words.notOver}</Notice>;
  if (page.earlierOpen === null) return null;
  return (
    <Notice kind="caution" live={false}>
      <Text>{words.earlierOpen(page.earlierOpen)}</Text>
      <ButtonLink
        href={`/months/${page.earlierOpen}`}
        label={words.toEarlier(page.earlierOpen)}
        kind="secondary"
      />
    </Notice>
  );
}
