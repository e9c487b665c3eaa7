import { type Control, useFieldArray, useWatch } from 'react-hook-form';
import { mostLines } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { SelectField } from '../forms/choice-fields';
import { NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card, Rule } from '../ui/Card';
import type { Choices } from './SendForm';

const words = text.shipments.form;

type Line = { typeCode?: string; declared?: unknown };
type Props = { choices: Choices; control: unknown };

/** One line per container type, with what the book says stands at the site. */
export function LoadLines({ choices, control: given }: Props) {
  const control = given as Control<{ lines: Line[]; fromSiteId: string }>;
  const { fields, append, remove } = useFieldArray({ control, name: 'lines' });
  const lines = useWatch({ control, name: 'lines' }) ?? [];
  const siteId = useWatch({ control, name: 'fromSiteId' });
  return (
    <Card title={words.linesHead}>
      {fields.map((field, at) => (
        <Box key={field.id} gap="s">
          {at > 0 ? <Rule /> : null}
          <LoadLine at={at} line={lines[at] ?? {}} lines={lines} choices={choices} siteId={siteId} />
          {fields.length > 1 ? (
            <Button
              kind="quiet"
              label={words.removeLine(nameOf(choices, lines[at]?.typeCode))}
              onPress={() => remove(at)}
            />
          ) : null}
        </Box>
      ))}
      {fields.length < Math.min(mostLines, choices.types.length) ? (
        <Button kind="secondary" label={words.addLine} onPress={() => append({ typeCode: '' })} />
      ) : null}
    </Card>
  );
}

const nameOf = (choices: Choices, code: string | undefined) =>
  choices.types.find((type) => type.code === code)?.name ?? words.type;

type LineProps = { at: number; line: Line; lines: readonly Line[]; choices: Choices; siteId: string };

function LoadLine({ at, line, lines, choices, siteId }: LineProps) {
  const taken = lines.filter((_, other) => other !== at).map((other) => other.typeCode);
  const types = choices.types.filter((type) => !taken.includes(type.code));
  const there =
    choices.atSites.find((stock) => stock.siteId === siteId && stock.typeCode === line.typeCode)?.units ?? 0;
  return (
    <>
      <SelectField
        name={`lines.${at}.typeCode`}
        label={words.type}
        options={types.map((type) => ({ value: type.code, label: type.name }))}
      />
      <NumberField
        name={`lines.${at}.declared`}
        label={words.units}
        steps
        hint={line.typeCode ? hintOf(line.declared, there) : undefined}
      />
    </>
  );
}

/** Sending more than the book holds is allowed, since the book may be behind; it is said. */
function hintOf(declared: unknown, there: number): string {
  return typeof declared === 'number' && declared > there ? words.short(there) : words.atSite(there);
}
