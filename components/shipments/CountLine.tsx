import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { stacks } from '@/shared/domain/unit-load';
import { text } from '@/shared/text/catalogue';
import { NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import type { TypedLine } from './count-draft';
import { differenceOf } from './difference-words';

const words = text.shipments;

export type LineToCount = { typeName: string; unitsPerStack: number; declared: number };
type Props = { at: number; line: LineToCount; onTakeOff?: () => void };

/** One container type: as declared in one tap, else its number, and of these the damaged and the dirty ones. */
export function CountLine({ at, line, onTakeOff }: Props) {
  const { setValue } = useFormContext();
  const typed = useWatch({ name: `lines.${at}` }) as TypedLine | undefined;
  const [isOpened, setOpened] = useState(line.declared === 0);
  const counted = typed?.counted;
  const isPlain = counted === line.declared && !typed?.damaged && !typed?.dirty;
  const take = () => {
    setValue(`lines.${at}.counted`, line.declared, { shouldDirty: true, shouldValidate: false });
    setOpened(false);
  };
  const open = () => {
    if (counted === undefined || counted === null)
      setValue(`lines.${at}.counted`, line.declared, { shouldDirty: true });
    setOpened(true);
  };
  const isUntouched = (counted === undefined || counted === null) && !isOpened;
  if (isUntouched) return <Untouched line={line} onTake={take} onOpen={open} />;
  if (isPlain && !isOpened) return <AsDeclared line={line} onOpen={open} />;
  return (
    <Card>
      <Head line={line} />
      <NumberField name={`lines.${at}.counted`} label={words.number(line.typeName)} hideLabel steps large />
      <Box row wrap spread="between" gap="s">
        {typeof counted === 'number' && counted >= 0 ? (
          <Tag {...differenceOf(counted - line.declared)} />
        ) : (
          <Box />
        )}
        {line.declared > 0 ? (
          <Button
            kind="quiet"
            label={words.asDeclared}
            name={words.asDeclaredOf(line.typeName)}
            onPress={take}
          />
        ) : onTakeOff ? (
          <Button kind="quiet" label={words.takeOff(line.typeName)} onPress={onTakeOff} />
        ) : null}
      </Box>
      <OfThese at={at} line={line} />
    </Card>
  );
}

function Head({ line }: { line: LineToCount }) {
  return (
    <Box gap="xs">
      <Text variant="subhead" level={2}>
        {line.typeName}
      </Text>
      <Text variant="soft">{declaredWords(line)}</Text>
    </Box>
  );
}

function declaredWords({ declared, unitsPerStack }: LineToCount): string {
  if (declared === 0) return words.notDeclared;
  if (unitsPerStack < 2) return words.declaredUnits(declared);
  const whole = stacks(declared, unitsPerStack);
  if (whole.stacks === 0) return words.declaredUnits(declared);
  return `${words.declaredUnits(declared)} · ${words.stacks(whole.stacks, unitsPerStack, whole.rest)}`;
}

type ClosedProps = { line: LineToCount; onOpen: () => void };

function Untouched({ line, onTake, onOpen }: ClosedProps & { onTake: () => void }) {
  return (
    <Card gap="s">
      <Box row wrap spread="between">
        <Head line={line} />
        <Button
          kind="secondary"
          tall
          label={words.takeAsDeclared}
          name={words.asDeclaredOf(line.typeName)}
          onPress={onTake}
        />
      </Box>
      <Button kind="quiet" label={words.change} name={words.changeOf(line.typeName)} onPress={onOpen} />
    </Card>
  );
}

function AsDeclared({ line, onOpen }: ClosedProps) {
  return (
    <Card gap="s">
      <Box row wrap spread="between">
        <Head line={line} />
        <Figure units={line.declared} size="figure" />
      </Box>
      <Box row wrap spread="between" gap="s">
        <Tag tone="done" label={words.asDeclared} />
        <Button kind="quiet" label={words.change} name={words.changeOf(line.typeName)} onPress={onOpen} />
      </Box>
    </Card>
  );
}

function OfThese({ at, line }: { at: number; line: LineToCount }) {
  return (
    <>
      <OfTheseRow words={words.ofTheseDamaged}>
        <NumberField name={`lines.${at}.damaged`} label={words.damagedOf(line.typeName)} hideLabel />
      </OfTheseRow>
      <OfTheseRow words={words.ofTheseDirty}>
        <NumberField name={`lines.${at}.dirty`} label={words.dirtyOf(line.typeName)} hideLabel />
      </OfTheseRow>
    </>
  );
}

function OfTheseRow({ words: said, children }: { words: string; children: React.ReactNode }) {
  return (
    <Box row spread="between" gap="m">
      <Text>{said}</Text>
      <Box width={112}>{children}</Box>
    </Box>
  );
}
