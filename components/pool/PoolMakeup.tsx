import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { formatUnits } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { Disclosure } from '../ui/Disclosure';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { reckoningSteps, type Step } from './reckoning-steps';

const words = text.pool;

/** The parts of the size, and the way to each with this type's own figures. */
export function PoolMakeup({ reckoned }: { reckoned: ReckonedPool }) {
  return (
    <Card title={words.moreFigures}>
      <Sheet
        caption={words.moreFigures}
        hideCaption
        rows={partsOf(reckoned)}
        rowKey={(row) => row.figure}
        columns={[
          { key: 'figure', head: words.figure.head, cell: (row) => row.figure },
          { key: 'value', head: words.figure.value, cell: (row) => row.value, align: 'end' },
        ]}
      />
      <Disclosure label={words.how}>
        <Sheet<Step>
          caption={words.how}
          hideCaption
          stack
          rows={reckoningSteps(reckoned)}
          rowKey={(row) => row.key}
          columns={[
            { key: 'step', head: words.reckoned.head, cell: (row) => row.step },
            { key: 'with', head: words.reckoned.with, cell: (row) => row.with, soft: true },
            { key: 'value', head: words.reckoned.value, cell: (row) => row.value, align: 'end' },
          ]}
        />
        <Text variant="soft">{words.sources}</Text>
      </Disclosure>
    </Card>
  );
}

function partsOf({ result, atNeeded, atToday }: ReckonedPool): { figure: string; value: string }[] {
  return [
    { figure: words.figure.cover, value: formatUnits(result.neededForCover) },
    { figure: words.figure.buffer, value: formatUnits(result.neededForBuffer) },
    { figure: words.figure.needed, value: formatUnits(result.needed) },
    { figure: words.figure.poolSize, value: formatUnits(result.poolSize) },
    { figure: words.figure.poisson, value: formatUnits(result.poissonNeeded) },
    { figure: words.figure.fallbackNeeded, value: words.share(atNeeded.fallbackShare) },
    ...(atToday === null
      ? []
      : [{ figure: words.figure.fallbackToday, value: words.share(atToday.fallbackShare) }]),
  ];
}
