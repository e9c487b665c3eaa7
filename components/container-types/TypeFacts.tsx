import type { ContainerType } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { formatMoney } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { Sheet } from '../ui/Sheet';

const words = text.containerTypes;

const factsOf = (type: ContainerType): { fact: string; value: string }[] => [
  { fact: words.fact.size, value: words.millimetres(words.size(type)) },
  { fact: words.fact.tare, value: words.kilograms(type.tareKg) },
  { fact: words.fact.payload, value: words.kilograms(type.payloadKg) },
  { fact: words.fact.stackLimit, value: words.units(type.stackLimit) },
  { fact: words.fact.unitsPerStack, value: words.units(type.unitsPerStack) },
  { fact: words.fact.grai, value: type.graiAssetType ?? words.none },
  { fact: words.fact.inService, value: words.since(type.inServiceFrom) },
  { fact: words.fact.replacement, value: formatMoney(type.replacement, type.currency) },
  { fact: words.fact.life, value: words.months(type.usefulLifeMonths) },
  ...(type.note === '' ? [] : [{ fact: words.fact.note, value: type.note }]),
];

export function TypeFacts({ type }: { type: ContainerType }) {
  return (
    <Card title={words.facts}>
      <Sheet
        caption={words.facts}
        hideCaption
        rows={factsOf(type)}
        rowKey={(row) => row.fact}
        columns={[
          { key: 'fact', head: words.factHead, cell: (row) => row.fact },
          { key: 'value', head: words.asStated, cell: (row) => row.value, align: 'end' },
        ]}
      />
    </Card>
  );
}
