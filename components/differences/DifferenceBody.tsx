import { downloadFile } from '@/shared/contracts/files';
import type { DifferenceDetail } from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { urlOf } from '../data/url-of';
import { Box } from '../ui/Box';
import { Card, Rule } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { StoredFileList } from '../ui/StoredFile';
import { Text } from '../ui/Text';
import { SettleForm } from './SettleForm';

const words = text.differences.detail;
type Props = { difference: DifferenceDetail };

/** Both sides, the count, what the matching found, the ways to settle, and how it was settled so far. */
export function DifferenceBody({ difference }: Props) {
  return (
    <>
      <SidesCard difference={difference} />
      <CountCard difference={difference} />
      <MatchingCard difference={difference} />
      <HistoryCard difference={difference} />
      {difference.choices.length > 0 ? (
        <SettleForm key={`${difference.id} ${difference.openUnits}`} difference={difference} />
      ) : (
        <Text variant="soft">{difference.state === 'settled' ? words.isSettled : words.nobodyMay}</Text>
      )}
    </>
  );
}

function SidesCard({ difference }: Props) {
  const { declared, counted, openUnits, reference, shipmentId, disputeId } = difference;
  return (
    <Card>
      <Box row wrap gap="xl">
        <Side label={words.declared} units={declared} />
        <Side label={words.counted} units={counted} />
        {openUnits === 0 ? null : <Side label={words.open} units={Math.abs(openUnits)} tone="differs" />}
      </Box>
      <Text>{words.gap(counted - declared)}</Text>
      {openUnits === 0 ? null : (
        <Box gap="xs">
          <Box row gap="s" align="baseline">
            <Text variant="label">{words.atStake}</Text>
            <Figure money={difference.atStake} currency={difference.currency} />
          </Box>
          <Text variant="small">{words.atStakeFrom}</Text>
        </Box>
      )}
      {shipmentId ? (
        <Link href={`/shipments/${shipmentId}`} label={words.toShipment(reference ?? '')} />
      ) : null}
      {disputeId ? <Link href={`/disputes/${disputeId}`} label={words.toDispute} tone="disputed" /> : null}
    </Card>
  );
}

function Side({ label, units, tone }: { label: string; units: number; tone?: 'differs' }) {
  return (
    <Box gap="xs">
      <Text variant="soft">{label}</Text>
      <Figure units={units} size="title" {...(tone ? { tone } : {})} />
    </Box>
  );
}

function CountCard({ difference: { count, timeZone } }: Props) {
  const when = formatInstant(count.countedAt, timeZone);
  const said =
    count.source === 'automatic'
      ? words.countedAlone(when)
      : count.source === 'import'
        ? words.countedImport(when)
        : words.countedBy(count.by, when);
  return (
    <Card title={words.countHead} level={3}>
      <Text>{said}</Text>
      {count.note === '' ? null : <Text>{count.note}</Text>}
      <StoredFileList files={count.photos} hrefOf={(file) => urlOf(downloadFile, { params: { file } })} />
    </Card>
  );
}

function MatchingCard({ difference: { matching } }: Props) {
  if (matching.length === 0) return null;
  return (
    <Card title={words.matchingHead} level={3}>
      {matching.map((match) => (
        <Box key={`${match.rule} ${match.receipt}`} gap="xs">
          <Text strong>{words.matching(match.rule, match.receipt)}</Text>
          <Text variant="soft">{match.why}</Text>
        </Box>
      ))}
    </Card>
  );
}

function HistoryCard({ difference: { settlements, timeZone } }: Props) {
  if (settlements.length === 0) return null;
  return (
    <Card title={words.historyHead} level={3}>
      {settlements.map((settlement, at) => (
        <Box key={settlement.id} gap="xs">
          {at > 0 ? <Rule /> : null}
          <Text strong>{words.settledLine(settlement)}</Text>
          {settlement.reason === '' ? null : <Text>{settlement.reason}</Text>}
          <Text variant="small">{words.byWhom(settlement.by, formatInstant(settlement.at, timeZone))}</Text>
        </Box>
      ))}
    </Card>
  );
}
