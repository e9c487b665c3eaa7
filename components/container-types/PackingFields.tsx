import { type Control, useFieldArray, useWatch } from 'react-hook-form';
import { listContainerTypes } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { useRead } from '../data/use-operation';
import { SelectField } from '../forms/choice-fields';
import { NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Text } from '../ui/Text';

const words = text.containerTypes.form;

type Line = { typeCode: string; quantity: number | null };
type Props = { control: unknown; own: string | undefined };

/** The unit load: other types, and how many of each on one of this. */
export function PackingFields({ control: given, own }: Props) {
  const control = given as Control<{ packedWith: Line[] }>;
  const { fields, append, remove } = useFieldArray({ control, name: 'packedWith' });
  const lines = useWatch({ control, name: 'packedWith' }) ?? [];
  const { data } = useRead(listContainerTypes, { query: { use: 'in use', limit: 200 } });
  const types = (data?.rows ?? []).filter((type) => type.code !== own);
  const nameOf = (code: string | undefined) =>
    types.find((type) => type.code === code)?.name ?? words.thisLine;
  return (
    <Card title={words.packing}>
      <Text variant="soft">{words.packingHint}</Text>
      {fields.map((field, at) => (
        <Box key={field.id} row wrap gap="m" align="end">
          <Box grow least={200}>
            <SelectField
              name={`packedWith.${at}.typeCode`}
              label={words.packedType}
              options={types.map((type) => ({ value: type.code, label: type.name }))}
            />
          </Box>
          <Box least={120}>
            <NumberField name={`packedWith.${at}.quantity`} label={words.quantity} />
          </Box>
          <Button
            kind="quiet"
            label={words.removeLine(nameOf(lines[at]?.typeCode))}
            onPress={() => remove(at)}
          />
        </Box>
      ))}
      {fields.length < 12 ? (
        <Button
          kind="secondary"
          label={words.addLine}
          onPress={() => append({ typeCode: '', quantity: null })}
        />
      ) : null}
    </Card>
  );
}
