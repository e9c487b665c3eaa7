import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/measures';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Brand } from '../shell/Brand';
import { Main } from '../ui/Landmarks';

/** Around the pages before sign-in: the mark, and one column. */
export function BareFrame({ children }: { children: ReactNode }) {
  const at = useBreakpoint();
  return (
    <Main>
      <View style={styles.frame} {...{ dataSet: { shell: 'bare' } }}>
        <View style={styles.column}>
          <View style={{ paddingHorizontal: at === 'phone' ? 4 : space.l + 4 }}>
            <Brand />
          </View>
          {children}
        </View>
      </View>
    </Main>
  );
}

const styles = StyleSheet.create({
  frame: { flexGrow: 1, alignItems: 'center', paddingTop: space.xxl, paddingBottom: space.xxxl },
  column: { width: '100%', maxWidth: 480 },
});
