import { travelModes } from '@/shared/domain/pool-size';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { MoneyField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import type { PlanEditing } from './use-plan-editing';

const words = text.pool;
const travelOptions = travelModes.map((mode) => ({ value: mode, label: text.parts.assume[mode] }));

/** Buffer, cover and travel: turned here, reckoned at once, stored by a press. */
export function PlanFields({ editing }: { editing: PlanEditing }) {
  return (
    <FormFrame
      draft={editing.draft}
      label={words.save}
      submitLabel={words.save}
      disabled={!editing.changed}
      note={editing.changed ? <Text variant="soft">{words.unsaved}</Text> : undefined}
      more={editing.changed ? <Button kind="quiet" label={words.undo} onPress={editing.undo} /> : undefined}
      onSubmit={editing.save}
    >
      <Box row wrap gap="m" align="start">
        <Box grow least={96}>
          <MoneyField name="bufferDays" label={words.buffer} />
        </Box>
        <Box grow least={96}>
          <MoneyField name="coverPct" label={words.cover} />
        </Box>
        <Box grow least={140}>
          <SelectField name="travel" label={words.comeBack} options={travelOptions} placeholder={null} />
        </Box>
      </Box>
      {editing.problem === null ? null : <Problem error={editing.problem} />}
    </FormFrame>
  );
}
