import { readDispute } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { DisputeTag } from './dispute-columns';
import { DisputeBody } from './DisputeBody';

const words = text.disputes;

/** One dispute on a page of its own. */
export function DisputePage({ id }: { id: string }) {
  const { data, error, refetch } = useRead(readDispute, { params: { dispute: id } });
  const back = { href: '/disputes', label: words.list.head };
  if (!data)
    return (
      <Page title={words.list.head} back={back}>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />}
      </Page>
    );
  return (
    <Page
      title={words.about(data)}
      kicker={data.company}
      back={back}
      beside={<DisputeTag row={data} />}
      narrow
    >
      <DisputeBody dispute={data} />
    </Page>
  );
}
