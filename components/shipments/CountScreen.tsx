import { useState } from 'react';
import { readShipment, type ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { ButtonLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { CountedAlready } from './CountedAlready';
import { CountForm, type SentCount } from './CountForm';
import { differenceOf } from './difference-words';

const words = text.shipments;

/** The receiver says what arrived. */
export function CountScreen({ shipment: id }: { shipment: string }) {
  const read = useRead(readShipment, { params: { shipment: id } });
  const [sent, setSent] = useState<SentCount>();
  const shipment = read.data;
  return (
    <Page
      title={shipment ? words.countHead(shipment.reference) : words.count}
      back={{ href: '/', label: text.shell.place.today }}
      {...(shipment
        ? {
            lead: words.leftFrom(shipment.contents, shipment.from.site, formatDay(shipment.leftOn, 'date')),
          }
        : {})}
      narrow
    >
      {sent ? <CountSent count={sent} /> : null}
      {read.error && !shipment ? <Problem error={read.error} onRetry={() => void read.refetch()} /> : null}
      {read.isPending ? <Skeleton lines={5} tall /> : null}
      {shipment && !sent ? <CountOrNot shipment={shipment} onSent={setSent} /> : null}
    </Page>
  );
}

function CountOrNot({ shipment, onSent }: { shipment: ShipmentDetail; onSent: (count: SentCount) => void }) {
  // Kept while the form is open: a count by a colleague in the meantime is told by the server, not by taking the form away.
  const [mayCount] = useState(shipment.mayCount);
  const first = shipment.counts[0];
  if (mayCount) return <CountForm shipment={shipment} onSent={onSent} />;
  if (first) return <CountedAlready by={first.by} at={first.countedAt} shipment={shipment} />;
  return <Notice kind="caution">{words.notYours}</Notice>;
}

function CountSent({ count }: { count: SentCount }) {
  const { company } = useSignedIn();
  const differs = company.kind === 'operator' ? words.countSentDiffersOperator : words.countSentDiffers;
  return (
    <Notice kind="success" title={words.countSent(count.reference)}>
      {count.differences.length === 0 ? <Text>{words.countSentAgreed}</Text> : null}
      {count.differences.map(({ typeCode, typeName, by }) => (
        <Box key={typeCode} row wrap gap="s">
          <Text>{typeName}</Text>
          <Tag {...differenceOf(by)} />
        </Box>
      ))}
      {count.differences.length > 0 ? <Text>{differs}</Text> : null}
      <Box row wrap gap="m">
        <ButtonLink href="/" label={text.shell.toToday} />
        <ButtonLink
          kind="secondary"
          href={`/shipments/${count.shipmentId}`}
          label={words.openSent(count.reference)}
        />
      </Box>
    </Notice>
  );
}
