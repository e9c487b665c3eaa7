import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Disclosure } from '../ui/Disclosure';
import { Text } from '../ui/Text';

const words = text.shipments;

/** The journal behind the shipment, for who wants to see how the book came to its numbers. */
export function EntriesCard({ shipment }: { shipment: ShipmentDetail }) {
  if (shipment.entries.length === 0) return null;
  return (
    <Card>
      <Disclosure label={words.entriesHead}>
        <Box gap="m">
          {shipment.entries.map((entry) => (
            <Box key={entry.id} gap="xs">
              <Text variant="label">{words.entry(entry.id, entry.kind)}</Text>
              <Text variant="soft">
                {[formatDay(entry.valueDate), entry.by, entry.reason].filter(Boolean).join(' · ')}
              </Text>
              {entry.lines.map((line, at) => (
                <Text key={at}>
                  {words.move(
                    words.moved(line.units, line.typeName),
                    text.balances.place(line.from),
                    text.balances.place(line.to),
                  )}
                </Text>
              ))}
            </Box>
          ))}
        </Box>
      </Disclosure>
    </Card>
  );
}
