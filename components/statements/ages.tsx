import type { AgeBand } from '@/shared/domain/assessment/output';
import { text } from '@/shared/text/catalogue';
import type { Tone } from '../theme/meaning';
import type { AgePart } from '../ui/AgeBar';
import { Box } from '../ui/Box';
import { Swatch } from '../ui/Swatch';
import { Text } from '../ui/Text';

const words = text.statements.page.ages;

/** Three tones for the five bands: what is fresh, what is slow, what is late. */
const bars: { key: keyof typeof words; tone: Tone; bands: readonly AgeBand[] }[] = [
  { key: 'short', tone: 'done', bands: ['0-14'] },
  { key: 'middle', tone: 'moving', bands: ['15-30'] },
  { key: 'long', tone: 'differs', bands: ['31-60', '61-90', 'over 90'] },
];

export function agePartsOf(ages: Partial<Record<AgeBand, number>>): AgePart[] {
  return bars.map(({ key, tone, bands }) => ({
    key,
    tone,
    label: words[key],
    units: bands.reduce((total, band) => total + (ages[band] ?? 0), 0),
  }));
}

export function AgeKey() {
  return (
    <Box row wrap gap="l">
      {bars.map(({ key, tone }) => (
        <Box key={key} row gap="s">
          <Swatch tone={tone} />
          <Text variant="small">{words[key]}</Text>
        </Box>
      ))}
    </Box>
  );
}
