import type { ImportTotals } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Text } from '../ui/Text';

const words = text.imports.preview;

/** What the good rows add up to. */
export function PreviewTotals({ totals }: { totals: ImportTotals }) {
  const { firstDay, lastDay } = totals;
  return (
    <Card title={words.totals}>
      <Line head={words.shipments} units={totals.shipments} />
      <Line head={words.declared} units={totals.declared} />
      <Line head={words.receipts} units={totals.receipts} />
      <Line head={words.counted} units={totals.counted} />
      {firstDay !== null && lastDay !== null ? (
        <Box row spread="between" gap="l">
          <Text variant="soft">{words.days}</Text>
          <Text>{words.from(firstDay, lastDay)}</Text>
        </Box>
      ) : null}
    </Card>
  );
}

function Line({ head, units }: { head: string; units: number }) {
  return (
    <Box row spread="between" gap="l">
      <Text variant="soft">{head}</Text>
      <Figure units={units} />
    </Box>
  );
}
