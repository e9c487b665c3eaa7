import { StyleSheet, Text as NativeText, View } from 'react-native';
import { formatUnits } from '@/shared/text/format';
import { fontFamily, radius, typeSize, weight } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';
import { Box } from './Box';
import { Link } from './Link';
import { Text } from './Text';

export type StripPart = { key: string; units: number; label: string; tone: Tone; href?: string };

const groundOf = (tone: Tone) => (tone === 'done' ? tones.done.line : tones[tone].wash);
const inkOf = (tone: Tone) => (tone === 'done' ? meaning.onAction : tones[tone].line);

/** One bar divided by where the units are, the numbers inside it, a key of words below. */
export function Strip({ label, parts }: { label: string; parts: readonly StripPart[] }) {
  const shown = parts.filter((part) => part.units > 0);
  const spoken = parts.map((part) => `${formatUnits(part.units)} ${part.label}`).join(', ');
  return (
    <Box gap="m">
      <View role="img" aria-label={`${label}: ${spoken}`} style={styles.bar}>
        {shown.map((part) => (
          <View
            key={part.key}
            style={[
              styles.part,
              {
                flexGrow: part.units,
                backgroundColor: groundOf(part.tone),
                borderColor: tones[part.tone].line,
              },
            ]}
          >
            <NativeText style={[styles.number, { color: inkOf(part.tone) }]}>
              {formatUnits(part.units)}
            </NativeText>
          </View>
        ))}
      </View>
      <Key parts={parts} />
    </Box>
  );
}

type KeyPart = { key: string; label: string; tone: Tone; href?: string };

/** Squares of colour with their words. */
export function Key({ parts }: { parts: readonly KeyPart[] }) {
  return (
    <Box row wrap gap="l">
      {parts.map((part) => (
        <Box key={part.key} row gap="s">
          <View style={[styles.square, { backgroundColor: tones[part.tone].line }]} />
          {part.href === undefined ? (
            <Text variant="soft">{part.label}</Text>
          ) : (
            <Link href={part.href} label={part.label} strong={false} />
          )}
        </Box>
      ))}
    </Box>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    minHeight: 36,
    gap: 2,
    borderRadius: radius,
    overflow: 'hidden',
    borderWidth: 1,
    borderColor: meaning.line,
  },
  part: {
    flexBasis: 0,
    minWidth: 'min-content' as unknown as number,
    justifyContent: 'center',
    paddingHorizontal: 8,
  },
  number: { fontFamily, fontSize: typeSize.body, fontWeight: weight.heavy, fontVariant: ['tabular-nums'] },
  square: { width: 10, height: 10, borderRadius: 2 },
});
