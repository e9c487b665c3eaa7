import type { ReactNode } from 'react';
import { typeKinds } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { useSignedIn } from '../data/use-session';
import { DateField, SelectField } from '../forms/choice-fields';
import { MoneyField, NumberField, TextField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Text } from '../ui/Text';
import { PackingFields } from './PackingFields';

const words = text.containerTypes.form;

type Props = { control: unknown; first?: ReactNode; own?: string; inServiceFixed?: boolean };

/** The fields of a type, the same for a new one and a changed one. */
export function TypeFields({ control, first, own, inServiceFixed }: Props) {
  return (
    <>
      <Card title={words.facts}>
        {first}
        <TextField name="name" label={words.name} />
        <SelectField
          name="kind"
          label={words.kind}
          options={typeKinds.map((kind) => ({ value: kind, label: text.containerTypes.kinds[kind] }))}
        />
        <TextField name="note" label={words.note} optional />
      </Card>
      <MeasureFields />
      <WorthFields inServiceFixed={inServiceFixed ?? false} />
      <PackingFields control={control} own={own} />
    </>
  );
}

function MeasureFields() {
  return (
    <Card title={words.measures}>
      <Text variant="soft">{words.measuresHint}</Text>
      <Box row wrap gap="m" align="start">
        {(['lengthMm', 'widthMm', 'heightMm'] as const).map((name) => (
          <Box key={name} grow least={140}>
            <NumberField name={name} label={words[name]} />
          </Box>
        ))}
      </Box>
      <Box row wrap gap="m" align="start">
        {(['tareKg', 'payloadKg'] as const).map((name) => (
          <Box key={name} grow least={140}>
            <MoneyField name={name} label={words[name]} />
          </Box>
        ))}
      </Box>
      <NumberField name="stackLimit" label={words.stackLimit} steps least={1} />
      <NumberField
        name="unitsPerStack"
        label={words.unitsPerStack}
        hint={words.unitsPerStackHint}
        steps
        least={1}
      />
      <Notice kind="caution" title={text.containerTypes.caution} live={false}>
        {text.containerTypes.cautionBody}
      </Notice>
    </Card>
  );
}

function WorthFields({ inServiceFixed }: { inServiceFixed: boolean }) {
  const { company } = useSignedIn();
  return (
    <Card title={words.worth}>
      <DateField
        name="inServiceFrom"
        label={words.inServiceFrom}
        hint={inServiceFixed ? text.containerTypes.inServiceFixed : words.inServiceHint}
      />
      <MoneyField
        name="replacement"
        label={words.replacement}
        currency={company.currency}
        hint={words.replacementHint}
      />
      <NumberField name="usefulLifeMonths" label={words.usefulLifeMonths} />
      <TextField name="graiAssetType" label={words.graiAssetType} hint={words.graiHint} optional />
    </Card>
  );
}
