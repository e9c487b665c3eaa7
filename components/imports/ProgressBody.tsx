import { readImport, type ImportDetail } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { useRead } from '../data/use-operation';
import { Card } from '../ui/Card';
import { ProgressBar } from '../ui/ProgressBar';
import { Text } from '../ui/Text';

const words = text.imports.progress;
const askEveryMs = 1000;

/** How far the posting is; asks again while it stands here. */
export function ProgressBody({ id }: { id: string }) {
  const detail = useRead(readImport, { params: { import: id }, refetchEvery: askEveryMs });
  const progress = (detail.data as ImportDetail | undefined)?.progress;
  return (
    <Card title={words.head}>
      {progress && progress.of > 0 ? (
        <ProgressBar label={words.label} done={progress.done} of={progress.of} />
      ) : (
        <Text>{words.waits}</Text>
      )}
      <Text variant="soft">{words.canLeave}</Text>
    </Card>
  );
}
