import { travelModes } from '@/shared/domain/pool-size';
import { text } from '@/shared/text/catalogue';
import { ChoiceField } from '../forms/choice-fields';
import { MoneyField, NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';

const words = text.parts.assume;

const figures = [
  { name: 'bufferDays', label: words.bufferDays, hint: words.bufferHint },
  { name: 'coverPct', label: words.coverPct, hint: words.coverHint },
  { name: 'heldPct', label: words.heldPct },
  { name: 'repairPct', label: words.repairPct },
  { name: 'lossPerTripPct', label: words.lossPerTripPct },
] as const;

/** What is assumed of a loop beside its legs. */
export function AssumptionFields() {
  return (
    <Card title={text.parts.assumptions}>
      <ChoiceField
        name="travel"
        label={words.travel}
        hint={words.travelHint}
        options={travelModes.map((mode) => ({ value: mode, label: words[mode] }))}
      />
      <Box row wrap gap="m" align="start">
        {figures.map((figure) => (
          <Box key={figure.name} grow least={200}>
            <MoneyField {...figure} />
          </Box>
        ))}
        <Box grow least={200}>
          <NumberField name="workingDaysPerYear" label={words.workingDaysPerYear} least={1} />
        </Box>
      </Box>
    </Card>
  );
}
