import type { SeenTimes } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Disclosure } from '../ui/Disclosure';
import { Text } from '../ui/Text';

const words = text.parts.seen;
type SeenStretch = SeenTimes['stretches'][number];

/** How each seen time was reckoned, with its own figures. */
export function SeenReckoning({ seen }: { seen: SeenTimes }) {
  return (
    <Disclosure label={words.how}>
      <Box gap="s">
        {seen.stretches.map((each) => (
          <Text key={each.stretch}>
            {`${text.pool.where[each.stretch]}: ${basisOf(each, seen.workingDays)}`}
          </Text>
        ))}
        <Text variant="soft">{words.working}</Text>
        <Text variant="soft">{words.idle}</Text>
        <Text variant="soft">{words.spread}</Text>
      </Box>
    </Disclosure>
  );
}

const basisOf = (each: SeenStretch, workingDays: number) =>
  each.shipments === null
    ? words.stock(each.units, each.unitsOut ?? 0, workingDays)
    : words.way(each.shipments, each.units);
