import { readDispute } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Box } from '../ui/Box';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { DisputeTag } from './dispute-columns';
import { DisputeBody } from './DisputeBody';

/** One dispute beside the list it was chosen from. */
export function DisputePanel({ id }: { id: string }) {
  const { data, error, refetch } = useRead(readDispute, { params: { dispute: id } });
  if (!data)
    return error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />;
  return (
    <Box gap="l">
      <Box gap="s">
        <Text variant="soft">{data.company}</Text>
        <Box row wrap spread="between">
          <Text variant="title">{text.disputes.about(data)}</Text>
          <DisputeTag row={data} />
        </Box>
      </Box>
      <DisputeBody dispute={data} />
    </Box>
  );
}
