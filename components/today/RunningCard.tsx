import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatNumber } from '@/shared/text/format';
import { AgeBar } from '../ui/AgeBar';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';
import type { Tone } from '../theme/meaning';

const words = text.today;
/** A bar is full at so many days. */
const fullDays = 10;

const toneOf = (days: number): Tone => (days < 2 ? 'differs' : days < 5 ? 'moving' : 'done');

/** Partners whose containers at hand last the fewest days of packing. */
export function RunningCard({ today }: { today: Today }) {
  const rows = today.runningShort ?? [];
  if (today.holding || rows.length === 0) return null;
  return (
    <Card title={words.running} beside={<Link href="/shipments/send" label={words.sendEmpties} />} grow>
      {rows.map((row) => (
        <Box key={`${row.siteId} ${row.typeCode}`} gap="xs">
          <Box row wrap spread="between">
            <Link
              href={`/balances/${row.companyId}/${row.typeCode}`}
              label={words.runningAt(row.company, row.typeName)}
              tone="text"
            />
            <Text strong>{words.runningDays(formatNumber(row.days))}</Text>
          </Box>
          <AgeBar
            label={words.runningAt(row.company, row.typeName)}
            of={fullDays}
            parts={[
              {
                key: 'days',
                units: Math.min(fullDays, Math.round(row.days * 10) / 10),
                label: words.runningDays(formatNumber(row.days)),
                tone: toneOf(row.days),
              },
            ]}
          />
        </Box>
      ))}
      <Text variant="small">{words.runningNote}</Text>
    </Card>
  );
}
