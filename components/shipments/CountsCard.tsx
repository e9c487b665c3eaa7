import { downloadFile } from '@/shared/contracts/files';
import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { urlOf } from '../data/url-of';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { StoredFileList } from '../ui/StoredFile';
import { Text } from '../ui/Text';

const words = text.shipments;
type Count = ShipmentDetail['counts'][number];

/** Who sent it, who counted and when, with notes and photos. */
export function CountsCard({ shipment }: { shipment: ShipmentDetail }) {
  const { sentBy, note, counts } = shipment;
  if (counts.length === 0 && sentBy === null && note === '') return null;
  return (
    <Card title={words.countsHead}>
      {sentBy === null ? null : <Text>{words.sentBy(sentBy)}</Text>}
      {note === '' ? null : <Text variant="soft">{note}</Text>}
      {counts.map((count) => (
        <OneCount key={count.id} count={count} timeZone={shipment.timeZone} />
      ))}
    </Card>
  );
}

function OneCount({ count, timeZone }: { count: Count; timeZone: string }) {
  return (
    <Box gap="s">
      <Text>{saidOf(count, formatInstant(count.countedAt, timeZone))}</Text>
      {count.sequence > 1 ? <Text variant="soft">{words.laterCount(count.sequence)}</Text> : null}
      {count.note === '' ? null : <Text>{count.note}</Text>}
      <StoredFileList files={count.photos} hrefOf={(file) => urlOf(downloadFile, { params: { file } })} />
    </Box>
  );
}

function saidOf(count: Count, when: string): string {
  if (count.source === 'automatic') return words.countedAutomatically(when);
  if (count.by !== null) return words.countedBy(count.by, when);
  return count.source === 'import' ? words.countedByImport(when) : words.countedOn(when);
}
