import { readDifference } from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Box } from '../ui/Box';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { DifferenceTag } from './difference-columns';
import { DifferenceBody } from './DifferenceBody';

const words = text.differences;

/** One difference beside the list it was chosen from. */
export function DifferencePanel({ id }: { id: string }) {
  const { data, error, refetch } = useRead(readDifference, { params: { difference: id } });
  if (!data)
    return error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />;
  return (
    <Box gap="l">
      <Box gap="s">
        <Text variant="soft">{words.lane(data.from.site, data.to.site)}</Text>
        <Box row wrap spread="between">
          <Text variant="title">{data.lines[0]?.typeName ?? ''}</Text>
          <DifferenceTag row={data} />
        </Box>
      </Box>
      <DifferenceBody difference={data} />
    </Box>
  );
}
