import { StyleSheet, View } from 'react-native';
import { formatUnits } from '@/shared/text/format';
import { meaning, tones, type Tone } from '../theme/meaning';

export type AgePart = { key: string; units: number; label: string; tone: Tone };

/** A thin bar: how long the units have been held, or how far a stock reaches (with an empty rest). */
export function AgeBar({ label, parts, of }: { label: string; parts: readonly AgePart[]; of?: number }) {
  const total = parts.reduce((sum, part) => sum + part.units, 0);
  const rest = Math.max(0, (of ?? total) - total);
  const spoken = parts.map((part) => `${formatUnits(part.units)} ${part.label}`).join(', ');
  return (
    <View role="img" aria-label={`${label}: ${spoken}`} style={styles.bar}>
      {parts
        .filter((part) => part.units > 0)
        .map((part) => (
          <View
            key={part.key}
            style={{
              flexGrow: part.units,
              flexBasis: 0,
              minWidth: 3,
              backgroundColor: tones[part.tone].line,
            }}
          />
        ))}
      {rest > 0 ? <View style={{ flexGrow: rest, flexBasis: 0 }} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    gap: 2,
    height: 12,
    minWidth: 80,
    borderRadius: 3,
    overflow: 'hidden',
    borderWidth: 1,
    borderColor: meaning.line,
    backgroundColor: meaning.page,
  },
});
