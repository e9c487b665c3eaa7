import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { CellText } from './CellText';
import { follow } from './Link';
import { web } from './web-props';

/** Makes what stands in a row or card its link; the pressed area stretches over all of the row. */
export function StretchLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <View
      role="link"
      {...web({ href, onClick: (event) => follow(event, href), dataSet: { stretch: 'row' } })}
      style={styles.stretch}
    >
      <CellText strong>{children}</CellText>
    </View>
  );
}

const styles = StyleSheet.create({ stretch: { alignSelf: 'flex-start', position: 'static' } });
