import { downloadDisputeFile, type DisputeDetail, type DisputeMessage } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { urlOf } from '../data/url-of';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { StoredFileList } from '../ui/StoredFile';
import { Text } from '../ui/Text';

const words = text.disputes.detail;

/** The thread, the same for both companies; whose word it is stands in words and in the line at the left. */
export function Thread({ dispute }: { dispute: DisputeDetail }) {
  const { timeZone } = useSignedIn().company;
  return (
    <Box gap="m">
      <Text variant="subhead">{words.thread}</Text>
      {dispute.messages.map((message) => (
        <Word key={message.id} dispute={dispute} message={message} timeZone={timeZone} />
      ))}
    </Box>
  );
}

type WordProps = { dispute: DisputeDetail; message: DisputeMessage; timeZone: string };

function Word({ dispute, message, timeZone }: WordProps) {
  const { by, company, step, at, side, files } = message;
  return (
    <Card gap="s" tone={side === 'operator' ? 'done' : 'open'}>
      <Box gap="xs">
        <Text strong>{`${by ?? words.someone}, ${company}, ${words.steps[step]}`}</Text>
        <Text variant="small">{formatInstant(at, timeZone)}</Text>
      </Box>
      {message.text === '' ? <Text variant="soft">{words.noWords}</Text> : <Text>{message.text}</Text>}
      <StoredFileList
        files={files}
        hrefOf={(file) => urlOf(downloadDisputeFile, { params: { dispute: dispute.id, file } })}
      />
    </Card>
  );
}
