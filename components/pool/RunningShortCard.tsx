import { useState } from 'react';
import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { yearlyFallbackCost } from '@/shared/domain/fallback-cost';
import { text } from '@/shared/text/catalogue';
import { formatMoney } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { MoneyInput } from '../ui/MoneyInput';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';

const words = text.pool;

type Props = { reckoned: ReckonedPool; currency: string };

/** What the loads that find no empty cost in a year, once somebody says what one of them costs. */
export function RunningShortCard({ reckoned, currency }: Props) {
  const [cost, setCost] = useState('');
  const { result, atNeeded, atToday } = reckoned;
  const rows = [
    ...(atToday === null ? [] : [{ key: 'today', label: words.runningToday, share: atToday.fallbackShare }]),
    { key: 'needed', label: words.runningNeeded, share: atNeeded.fallbackShare },
  ];
  const costOf = (share: number) =>
    yearlyFallbackCost({ share, tripsPerYear: result.tripsPerYear, costPerLoad: cost, currency });
  return (
    <Card title={words.running}>
      <Text variant="soft">{words.runningLead}</Text>
      <MoneyInput label={words.oneWayCost} currency={currency} value={cost} onChange={setCost} />
      <Sheet
        caption={words.running}
        hideCaption
        rows={rows}
        rowKey={(row) => row.key}
        columns={[
          { key: 'label', head: words.runningHead, cell: (row) => row.label },
          {
            key: 'from',
            head: words.reckoned.with,
            cell: (row) => words.runningFrom(row.share, result.tripsPerYear),
            soft: true,
          },
          {
            key: 'cost',
            head: words.reckoned.value,
            align: 'end',
            cell: (row) => {
              const year = costOf(row.share);
              return year === null ? '–' : words.runningYear(formatMoney(year, currency));
            },
          },
        ]}
      />
    </Card>
  );
}
