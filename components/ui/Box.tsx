import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import { space, type Space } from '../theme/measures';

type Props = {
  children?: ReactNode;
  gap?: Space;
  /** Things beside each other rather than below. */
  row?: boolean;
  wrap?: boolean;
  align?: 'start' | 'center' | 'end' | 'stretch' | 'baseline';
  spread?: 'start' | 'between' | 'center' | 'end';
  grow?: boolean;
  pad?: Space;
  /** Least width in px before things wrap. */
  least?: number;
  /** Never wider than so many px. */
  most?: number;
  /** Exactly so many px wide. */
  width?: number;
};

const aligned = {
  start: 'flex-start',
  center: 'center',
  end: 'flex-end',
  stretch: 'stretch',
  baseline: 'baseline',
} as const;
const spreadOut = {
  start: 'flex-start',
  center: 'center',
  between: 'space-between',
  end: 'flex-end',
} as const;

/** Lays things out below or beside each other, with gaps from the scale. */
export function Box({ children, gap = 'm', row, wrap, align, spread, grow, pad, least, most, width }: Props) {
  const style: ViewStyle = {
    gap: space[gap],
    flexDirection: row ? 'row' : 'column',
    ...(wrap ? { flexWrap: 'wrap' } : {}),
    ...(align ? { alignItems: aligned[align] } : row ? { alignItems: 'center' } : {}),
    ...(spread ? { justifyContent: spreadOut[spread] } : {}),
    ...(grow ? { flexGrow: 1, flexShrink: 1, flexBasis: least ?? 0 } : {}),
    ...(pad ? { padding: space[pad] } : {}),
    ...(least && !grow ? { minWidth: least } : {}),
    ...(most ? { maxWidth: most } : {}),
    ...(width ? { width, flexShrink: 0 } : {}),
  };
  return <View style={[styles.box, style]}>{children}</View>;
}

const styles = StyleSheet.create({
  // Static, so that a link that stretches over its card is not held in by what stands around it.
  box: { minWidth: 0, maxWidth: '100%', flexShrink: 1, position: 'static' },
});
