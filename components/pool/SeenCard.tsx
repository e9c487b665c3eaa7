import { useState } from 'react';
import { type UseFormReturn, useWatch } from 'react-hook-form';
import type { PoolLeg, SeenTimes } from '@/shared/contracts/pool-sizing';
import { plannedDays, withSeenDays } from '@/shared/domain/seen-loop';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { SeenReckoning } from './SeenReckoning';

const words = text.parts.seen;

/** The loop as the book saw it, beside what is planned, and a way to take it over. */
export function SeenCard({ form: given, seen }: { form: unknown; seen: SeenTimes }) {
  const form = given as UseFormReturn<{ legs: PoolLeg[] }>;
  const legs = useWatch({ control: form.control, name: 'legs' }) ?? [];
  const [taken, setTaken] = useState(false);
  const sawNothing = seen.stretches.every((each) => each.days === null);
  const take = () => {
    form.setValue('legs', withSeenDays(form.getValues('legs'), seen.stretches), { shouldDirty: true });
    setTaken(true);
  };
  return (
    <Card title={words.head}>
      <Text variant="soft">{words.lead(formatDay(seen.from, 'date'), formatDay(seen.to))}</Text>
      {sawNothing ? (
        <Text>{words.nothing}</Text>
      ) : (
        <>
          <SeenSheet seen={seen} legs={legs} />
          <Button kind="secondary" label={words.take} onPress={take} />
          {taken ? <Text role="status">{words.taken}</Text> : null}
          <SeenReckoning seen={seen} />
        </>
      )}
    </Card>
  );
}

function SeenSheet({ seen, legs }: { seen: SeenTimes; legs: readonly PoolLeg[] }) {
  return (
    <Sheet
      caption={words.head}
      hideCaption
      rows={seen.stretches}
      rowKey={(row) => row.stretch}
      columns={[
        { key: 'stretch', head: words.columns.stretch, cell: (row) => text.parts.stretch[row.stretch] },
        {
          key: 'planned',
          head: words.columns.planned,
          align: 'end',
          cell: (row) => <Figure number={plannedDays(legs, row.stretch)} plain />,
        },
        {
          key: 'days',
          head: words.columns.days,
          align: 'end',
          cell: (row) => <Figure number={row.days} />,
        },
      ]}
    />
  );
}
