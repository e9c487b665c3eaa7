import { text } from '@/shared/text/catalogue';
import { dayInZone } from '@/shared/domain/calendar';
import { formatDay, formatInstant } from '@/shared/text/format';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Disclosure } from '../ui/Disclosure';
import { ButtonLink } from '../ui/Link';
import { NotPrinted } from '../ui/NotPrinted';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import type { StatementPage } from './StatementScreen';
import { StatementTag } from './StatementTag';

const words = text.statements.page;

/** What the partner has answered, what is disputed and by whom, and every step so far. */
export function AnswerPanel({ page }: { page: StatementPage }) {
  const { issuedAt, objectionUntil, timeZone, disputes } = page;
  return (
    <Card title={words.answer} beside={<AnswerTag page={page} />}>
      {issuedAt && objectionUntil ? (
        <Text variant="soft">
          {`${words.issuedOn(dayInZone(issuedAt, timeZone))} ${text.statements.silence(objectionUntil)}`}
        </Text>
      ) : (
        <Text variant="soft">{words.notIssued}</Text>
      )}
      {disputes.map((dispute) => (
        <Disputed key={dispute.id} dispute={dispute} timeZone={timeZone} />
      ))}
      <Disclosure label={words.history}>
        <Box gap="s" pad="s">
          {page.history.map(({ step, by, at }) => (
            <Box key={`${step} ${at}`} gap="xs">
              <Text>{[words.step[step] ?? step, ...(by ? [by] : [])].join(', ')}</Text>
              <Text variant="small">{formatInstant(at, timeZone)}</Text>
            </Box>
          ))}
        </Box>
      </Disclosure>
    </Card>
  );
}

/** Partly disputed while lines are in dispute and others are not. */
function AnswerTag({ page }: { page: StatementPage }) {
  const lines = new Set(page.disputes.filter((each) => each.undecided).map((each) => each.lineId));
  const partly = lines.size > 0 && lines.size < page.content.lines.length;
  return partly ? <Tag tone="disputed" label={words.tags.partly} /> : <StatementTag row={page} />;
}

type DisputedProps = { dispute: StatementPage['disputes'][number]; timeZone: string };

function Disputed({ dispute, timeZone }: DisputedProps) {
  const day = formatDay(dayInZone(dispute.at, timeZone), 'date');
  return (
    <Box gap="s">
      <Box gap="xs">
        <Text strong>{[...(dispute.by ? [dispute.by] : []), day].join(', ')}</Text>
        <Text>{dispute.words}</Text>
      </Box>
      {dispute.undecided ? null : <Tag tone="done" label={dispute.state} />}
      <NotPrinted>
        <ButtonLink href={`/disputes/${dispute.id}`} label={words.openDispute} kind="secondary" full />
      </NotPrinted>
    </Box>
  );
}
