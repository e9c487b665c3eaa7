import type { DisputeDetail } from '@/shared/contracts/disputes';
import { compare } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Text } from '../ui/Text';
import { AnswerForm } from './AnswerForm';
import { ReplyForm } from './ReplyForm';
import { Thread } from './Thread';

const words = text.disputes.detail;
type Props = { dispute: DisputeDetail };

/** What is claimed, what was said, and the next word for who has it. */
export function DisputeBody({ dispute }: Props) {
  const last = dispute.messages.at(-1)?.id ?? '';
  const turn = words.nextWord(dispute);
  return (
    <>
      <ClaimCard dispute={dispute} />
      <Thread dispute={dispute} />
      <Outcome dispute={dispute} />
      {turn === '' ? null : <Text strong>{turn}</Text>}
      {dispute.may.answer ? <AnswerForm key={`answer ${last}`} dispute={dispute} /> : null}
      {dispute.may.reply ? <ReplyForm key={`reply ${last}`} dispute={dispute} /> : null}
    </>
  );
}

function ClaimCard({ dispute }: Props) {
  const inMoney = dispute.stated === dispute.claimed;
  return (
    <Card>
      <Box row wrap gap="xl">
        <Box gap="xs">
          <Text variant="soft">{words.bookSays}</Text>
          {inMoney ? (
            <Figure money={dispute.lineAmount} currency={dispute.currency} size="title" />
          ) : (
            <Figure units={dispute.stated} size="title" />
          )}
        </Box>
        <Box gap="xs">
          <Text variant="soft">{words.partnerSays(dispute.company)}</Text>
          {inMoney ? (
            <Text variant="large">{text.disputes.claim(dispute)}</Text>
          ) : (
            <Figure units={dispute.claimed} size="title" tone="disputed" />
          )}
        </Box>
      </Box>
      {dispute.typeName ? <Text>{dispute.typeName}</Text> : null}
      <Box row wrap gap="s" align="baseline">
        <Text variant="label">{words.why}</Text>
        <Text>{text.disputes.reasons[dispute.reason]}</Text>
      </Box>
      <Held dispute={dispute} />
      <Links dispute={dispute} />
    </Card>
  );
}

function Held({ dispute: { subject, amountHeld, currency } }: Props) {
  if (subject === 'count') return null;
  if (compare(amountHeld, '0') === 0) return <Text variant="soft">{words.nothingHeld}</Text>;
  return (
    <Box row wrap gap="s" align="baseline">
      <Text variant="label">{words.heldBack}</Text>
      <Figure money={amountHeld} currency={currency} />
    </Box>
  );
}

function Links({ dispute }: Props) {
  const { shipmentId, reference, statementId, statementNumber, subject } = dispute;
  return (
    <>
      {shipmentId && reference ? (
        <Link
          href={`/shipments/${shipmentId}`}
          label={subject === 'count' ? words.toShipment(reference) : words.cameBackOn(reference)}
        />
      ) : null}
      {statementId && statementNumber ? (
        <Link href={`/statements/${statementId}`} label={words.toStatement(statementNumber)} />
      ) : null}
    </>
  );
}

/** What was decided, in words. */
function Outcome({ dispute }: Props) {
  const { state, acceptedUnits, acceptedAmount, claimed, stated, currency, subject } = dispute;
  if (state === 'declined') return <Notice live={false}>{words.outcome.declined}</Notice>;
  if (state === 'withdrawn') return <Notice live={false}>{words.outcome.withdrawn}</Notice>;
  if (state !== 'accepted' && state !== 'accepted in part') return null;
  const by = Math.sign(claimed - stated) * (acceptedUnits ?? 0);
  const sentences = [
    ...(acceptedUnits === null ? [] : [words.outcome.units(acceptedUnits, Math.abs(claimed - stated))]),
    ...(subject === 'count' ? [words.outcome.countRight(stated + by)] : []),
    ...(acceptedAmount === null ? [] : [words.outcome.money(acceptedAmount, currency)]),
  ];
  return (
    <Notice kind="success" live={false}>
      {sentences.join(' ')}
    </Notice>
  );
}
