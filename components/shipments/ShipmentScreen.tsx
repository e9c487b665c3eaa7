import { readShipment, type ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { CountsCard } from './CountsCard';
import { EntriesCard } from './EntriesCard';
import { LinesCard } from './LinesCard';
import { SettlementsCard } from './SettlementsCard';
import { stateOf } from './shipment-state';

const words = text.shipments;

/** One shipment: what was declared, what was counted, what became of the difference, and the entries behind it. */
export function ShipmentScreen({ shipment: id }: { shipment: string }) {
  const read = useRead(readShipment, { params: { shipment: id } });
  const shipment = read.data;
  const back = { href: '/shipments', label: words.head };
  if (!shipment) {
    return (
      <Page title={words.head} back={back}>
        {read.error ? (
          <Problem error={read.error} onRetry={() => void read.refetch()} />
        ) : (
          <Skeleton lines={6} tall />
        )}
      </Page>
    );
  }
  return (
    <Page
      title={words.detailHead(shipment.contents, shipment.reference)}
      kicker={words.fromTo(endWords(shipment.from), endWords(shipment.to))}
      lead={words.leftExpected(
        formatDay(shipment.leftOn, 'weekday'),
        formatDay(shipment.expectedOn, 'weekday'),
      )}
      back={back}
      beside={<Tag {...stateOf(shipment)} />}
      action={<MainAction shipment={shipment} />}
    >
      <LinesCard shipment={shipment} />
      <CountsCard shipment={shipment} />
      <SettlementsCard shipment={shipment} />
      <EntriesCard shipment={shipment} />
    </Page>
  );
}

const endWords = ({ site, company }: ShipmentDetail['from']) => `${site}, ${company}`;

/** The one thing to do next: count it, settle what differs, or dispute the count. */
function MainAction({ shipment }: { shipment: ShipmentDetail }) {
  const { may } = useSignedIn();
  const open = shipment.differences.find((difference) => difference.state === 'open');
  if (shipment.mayCount)
    return <ButtonLink href={`/shipments/${shipment.id}/count`} label={words.countThis} />;
  if (open && may('settle differences'))
    return <ButtonLink href={`/differences/${open.id}`} label={words.settle} />;
  if (shipment.state === 'counted' && may('open disputes'))
    return <ButtonLink kind="secondary" href={`/shipments/${shipment.id}/dispute`} label={words.dispute} />;
  return null;
}
