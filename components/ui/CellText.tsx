import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from './Text';

/** A value of a column outside a table: bare words become text, everything else stays as it is. */
export function CellText({
  children,
  strong,
  end,
}: {
  children: ReactNode;
  strong?: boolean;
  end?: boolean;
}) {
  const bare = typeof children === 'string' || typeof children === 'number';
  return (
    <View style={[styles.cell, end && styles.end]}>
      {bare ? (
        <Text {...(strong ? { strong } : {})} {...(end ? { align: 'end' as const } : {})}>
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
});
