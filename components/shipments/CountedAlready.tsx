import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Text } from '../ui/Text';

const words = text.shipments;

type Props = {
  by: string | null;
  at: string;
  shipment: { id: string; reference: string; timeZone: string };
};

/** Someone came first: who and when, and the way to what they counted. */
export function CountedAlready({ by, at, shipment }: Props) {
  const when = formatInstant(at, shipment.timeZone);
  return (
    <Notice kind="caution" title={words.countedAlready}>
      <Text>{by === null ? words.countedOn(when) : words.countedBy(by, when)}</Text>
      <Link href={`/shipments/${shipment.id}`} label={words.openSent(shipment.reference)} />
    </Notice>
  );
}
