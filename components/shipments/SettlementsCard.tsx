import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Text } from '../ui/Text';

const words = text.shipments;

/** How each difference of this shipment was settled, by whom and why. */
export function SettlementsCard({ shipment }: { shipment: ShipmentDetail }) {
  const settled = shipment.differences.flatMap((difference) =>
    difference.settlements.map((settlement) => ({ ...settlement, typeName: difference.typeName })),
  );
  if (settled.length === 0) return null;
  return (
    <Card title={words.settlementsHead}>
      {settled.map((settlement, at) => (
        <Box key={at} gap="xs">
          <Text>{`${settlement.typeName}: ${words.settled(settlement.way, settlement.units)}`}</Text>
          <Text variant="soft">
            {[settlement.by, formatInstant(settlement.at, shipment.timeZone), settlement.reason]
              .filter((part) => part !== null && part !== '')
              .join(' · ')}
          </Text>
        </Box>
      ))}
    </Card>
  );
}
