import { type Control, useFieldArray, useWatch } from 'react-hook-form';
import { type PoolLeg, stretches } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { SelectField } from '../forms/choice-fields';
import { MoneyField, TextField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card, Rule } from '../ui/Card';
import { Text } from '../ui/Text';

const words = text.parts;
const mostLegs = 20;
const stretchOptions = stretches.map((stretch) => ({ value: stretch, label: words.stretch[stretch] }));

/** The legs of the loop, in their order. */
export function LegFields({ control: given }: { control: unknown }) {
  const control = given as Control<{ legs: PoolLeg[] }>;
  const { fields, append, remove, move } = useFieldArray({ control, name: 'legs' });
  const legs = useWatch({ control, name: 'legs' }) ?? [];
  const nameOf = (at: number) => legs[at]?.name || words.leg.thisLeg;
  return (
    <Card title={words.legs}>
      <Text variant="soft">{words.legsLead}</Text>
      {fields.map((field, at) => (
        <Box key={field.id} gap="s">
          {at > 0 ? <Rule /> : null}
          <LegLine at={at} />
          <Box row wrap gap="s">
            {at > 0 ? (
              <Button kind="quiet" label={words.leg.up(nameOf(at))} onPress={() => move(at, at - 1)} />
            ) : null}
            {fields.length > 1 ? (
              <Button kind="quiet" label={words.leg.remove(nameOf(at))} onPress={() => remove(at)} />
            ) : null}
          </Box>
        </Box>
      ))}
      {fields.length < mostLegs ? (
        <Button
          kind="secondary"
          label={words.leg.add}
          onPress={() => append({ name: '', stretch: 'elsewhere', days: { mean: '', sd: '0' } })}
        />
      ) : null}
    </Card>
  );
}

function LegLine({ at }: { at: number }) {
  return (
    <Box row wrap gap="m" align="start">
      <Box grow least={200}>
        <TextField name={`legs.${at}.name`} label={words.leg.name} />
      </Box>
      <Box grow least={200}>
        <SelectField
          name={`legs.${at}.stretch`}
          label={words.leg.stretch}
          options={stretchOptions}
          placeholder={null}
        />
      </Box>
      <Box row gap="m" align="start">
        <Box least={96}>
          <MoneyField name={`legs.${at}.days.mean`} label={words.leg.mean} />
        </Box>
        <Box least={96}>
          <MoneyField name={`legs.${at}.days.sd`} label={words.leg.sd} />
        </Box>
      </Box>
    </Box>
  );
}
