import { StyleSheet, View } from 'react-native';
import Svg, { Path, Rect } from 'react-native-svg';
import { text } from '@/shared/text/catalogue';
import { meaning } from '../theme/meaning';
import { Box } from '../ui/Box';
import { Text } from '../ui/Text';

/** The mark: a loop that is not quite closed, and the one container that is in question. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <Svg width={size} height={(size * 20) / 26} viewBox="0 0 26 20" aria-hidden>
      <Path
        d="M10.5 3 H8 A7 7 0 0 0 8 17 H18 A7 7 0 0 0 18 3 H17.5"
        fill="none"
        stroke={meaning.action}
        strokeWidth={3}
        strokeLinecap="butt"
      />
      <Rect x={11.5} y={0.5} width={5} height={5} rx={0.8} fill={meaning.inQuestion} />
    </Svg>
  );
}

export function Brand() {
  return (
    <View style={styles.brand}>
      <Box row gap="s">
        <Mark />
        <Text variant="large" strong>
          {text.shell.product}
        </Text>
      </Box>
    </View>
  );
}

const styles = StyleSheet.create({ brand: { paddingHorizontal: 12, paddingVertical: 8 } });
