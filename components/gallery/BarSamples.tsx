import { text } from '@/shared/text/catalogue';
import { AgeBar } from '../ui/AgeBar';
import { Card } from '../ui/Card';
import { Circuit } from '../ui/Circuit';
import { Disclosure } from '../ui/Disclosure';
import { Figure } from '../ui/Figure';
import { ProgressBar } from '../ui/ProgressBar';
import { Sheet } from '../ui/Sheet';
import { Strip } from '../ui/Strip';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';

const money = [
  { key: 'asked', line: 'Deposits asked', from: '3 392 totes at 4.50, 168 lids at 12.00', amount: '20640' },
  {
    key: 'released',
    line: 'Deposits released',
    from: 'oldest issues first, each at its rate',
    amount: '-20432',
  },
  { key: 'fee', line: 'Daily fee', from: '3 440 unit-days beyond 14 days at 0.03', amount: '103.20' },
];

const href = '/gallery';

export function BarSamples() {
  return (
    <>
      <Card>
        <Circuit
          label="Where the pool is"
          partners={{ units: 4815, words: 'at 8 partners · 3.9 days of packing', key: 'partners', href }}
          full={{ units: 1960, words: 'full, on the way to the plants', key: 'on the way in', href }}
          plants={{ units: 6420, words: 'at the plants · 2 130 empty, 4 290 full', key: 'plants', href }}
          empty={{ units: 880, words: 'empty, on the way back', key: 'on the way back', href }}
          inQuestion={{ units: 141, words: 'in question, EUR 1 206.00', key: 'in question', href }}
          note="14 216 units in the pool"
        />
      </Card>
      <Card title="You hold" beside={<Figure units={1284} size="head" />}>
        <Strip
          label="You hold"
          parts={[
            { key: 'site', units: 812, label: 'at your site', tone: 'done' },
            { key: 'sent', units: 360, label: 'sent, not yet counted', tone: 'moving' },
            { key: 'hold', units: 112, label: 'on hold', tone: 'open' },
          ]}
        />
        <AgeBar
          label="Held for"
          parts={[
            { key: 'a', units: 700, label: 'to 14 days', tone: 'done' },
            { key: 'b', units: 240, label: '15 to 30 days', tone: 'moving' },
            { key: 'c', units: 200, label: 'longer', tone: 'differs' },
          ]}
        />
        <ProgressBar label="Reading rows" done={6200} of={10000} />
      </Card>
      <Card title={text.gallery.sheets}>
        <Sheet
          caption="Money"
          stack
          rows={money}
          rowKey={(row) => row.key}
          columns={[
            { key: 'line', head: 'Line', cell: (row) => row.line },
            { key: 'from', head: 'Reckoned from', cell: (row) => row.from, soft: true },
            {
              key: 'amount',
              head: 'EUR',
              align: 'end',
              cell: (row) => <Figure money={row.amount} currency="EUR" withoutCurrency plain />,
            },
          ]}
          sum={{ line: 'Payable', amount: <Figure money="311.20" currency="EUR" withoutCurrency /> }}
        />
        <Tag tone="disputed" label="5 of 12 disputed" />
        <Disclosure label="How this is reckoned">
          <Text>Each issue is taken up by the oldest open one.</Text>
        </Disclosure>
      </Card>
    </>
  );
}
