import { readDifference } from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { DifferenceTag } from './difference-columns';
import { DifferenceBody } from './DifferenceBody';

const words = text.differences;

/** One difference on a page of its own. */
export function DifferencePage({ id }: { id: string }) {
  const { data, error, refetch } = useRead(readDifference, { params: { difference: id } });
  const back = { href: '/differences', label: words.head };
  if (!data)
    return (
      <Page title={words.head} back={back}>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />}
      </Page>
    );
  return (
    <Page
      title={data.lines[0]?.typeName ?? ''}
      kicker={words.lane(data.from.site, data.to.site)}
      back={back}
      beside={<DifferenceTag row={data} />}
    >
      <DifferenceBody difference={data} />
    </Page>
  );
}
