import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { radius, space, type Space } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';
import { Box } from './Box';
import { Text } from './Text';

type Props = {
  children: ReactNode;
  title?: string;
  level?: 2 | 3;
  /** At the right of the title: a tag, a link, a figure. */
  beside?: ReactNode;
  gap?: Space;
  grow?: boolean;
  least?: number;
  /** A line at the left that marks what needs attention. */
  tone?: Tone;
};

/** A surface on the paper: things that belong together. */
export function Card({ children, title, level = 2, beside, gap = 'm', grow, least, tone }: Props) {
  return (
    <View
      style={[
        styles.card,
        { gap: space[gap] },
        grow && { flexGrow: 1, flexShrink: 1, flexBasis: least ?? 280, minHeight: 'auto' as const },
        tone && { borderLeftWidth: 4, borderLeftColor: tones[tone].line },
      ]}
    >
      {title === undefined && beside === undefined ? null : (
        <Box row wrap spread="between" gap="m">
          {title === undefined ? null : (
            <Text variant="subhead" level={level}>
              {title}
            </Text>
          )}
          {beside}
        </Box>
      )}
      {children}
    </View>
  );
}

/** A thin line between the parts of a card. */
export function Rule({ heavy }: { heavy?: boolean }) {
  return <View role="presentation" style={heavy ? styles.heavy : styles.rule} />;
}

const styles = StyleSheet.create({
  card: {
    backgroundColor: meaning.surface,
    borderWidth: 1,
    borderColor: meaning.line,
    borderRadius: radius,
    padding: space.l,
    minWidth: 0,
  },
  rule: { height: 1, backgroundColor: meaning.line },
  heavy: { height: 2, backgroundColor: meaning.text },
});
