import type { ContainerType } from '@/shared/contracts/container-types';
import { handledKg, isAboveHandlingReference } from '@/shared/domain/stack-load';
import { text } from '@/shared/text/catalogue';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';

const words = text.containerTypes;

/** The weights that follow from the figures entered, each with its sum, and the cautions that belong to them. */
export function LoadsCard({ type }: { type: ContainerType }) {
  const { grossKg, stackKg, onLowestKg } = type.loads;
  const high = type.stackLimit;
  const rows = [
    {
      key: 'gross',
      what: words.load.gross,
      weight: grossKg,
      from: words.load.grossFrom(type.tareKg, type.payloadKg),
    },
    {
      key: 'stack',
      what: words.load.stack(high),
      weight: stackKg,
      from: words.load.stackFrom(high, grossKg),
    },
    {
      key: 'lowest',
      what: words.load.lowest,
      weight: onLowestKg,
      from: words.load.lowestFrom(high - 1, grossKg),
    },
  ];
  return (
    <Card title={words.loads}>
      <Sheet
        caption={words.loads}
        hideCaption
        stack
        rows={rows}
        rowKey={(row) => row.key}
        columns={[
          { key: 'what', head: words.load.head.what, cell: (row) => row.what },
          { key: 'from', head: words.load.head.from, cell: (row) => row.from, soft: true },
          {
            key: 'weight',
            head: words.load.head.weight,
            cell: (row) => words.kilograms(row.weight),
            align: 'end',
          },
        ]}
      />
      <Notice kind="caution" title={words.caution} live={false}>
        {words.cautionBody}
      </Notice>
      <HandlingNotice type={type} />
    </Card>
  );
}

function HandlingNotice({ type }: { type: ContainerType }) {
  const handled = handledKg(type);
  if (!isAboveHandlingReference(handled)) return null;
  return (
    <Notice kind="caution" title={words.handling.title(handled)} live={false}>
      <Text>{handled === type.tareKg ? words.handling.empty : words.handling.full}</Text>
      <Text variant="soft">{words.handling.source}</Text>
    </Notice>
  );
}
