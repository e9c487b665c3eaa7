import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from './Text';

/** A value of a column outside a table: bare words become text, everything else stays as it is. */
export function CellText({
  children,
  strong,
  end,
  firm,
  soft,
}: {
  children: ReactNode;
  strong?: boolean;
  end?: boolean;
  /** Gives no room to what stands beside it: an amount is not broken by a long name. */
  firm?: boolean;
  soft?: boolean;
}) {
  const bare = typeof children === 'string' || typeof children === 'number';
  return (
    <View style={[styles.cell, end && styles.end, firm && styles.firm]}>
      {bare ? (
        <Text
          {...(strong ? { strong } : {})}
          {...(end ? { align: 'end' as const } : {})}
          {...(soft ? { variant: 'soft' as const } : {})}
        >
          {children}
        </Text>
      ) : (
        children
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  cell: { flexShrink: 1, minWidth: 0, position: 'static' },
  end: { alignItems: 'flex-end' },
  firm: { flexShrink: 0, maxWidth: '60%' },
});
