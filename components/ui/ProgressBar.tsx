import { StyleSheet, View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { meaning } from '../theme/meaning';
import { Box } from './Box';
import { Text } from './Text';

/** How far long work has come, in words and as a bar. */
export function ProgressBar({ label, done, of }: { label: string; done: number; of: number }) {
  const share = of === 0 ? 0 : Math.min(1, done / of);
  const words = text.ui.progress(done, of);
  return (
    <Box gap="xs">
      <Box row spread="between">
        <Text>{label}</Text>
        <Text variant="soft">{words}</Text>
      </Box>
      <View
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={of}
        aria-valuenow={done}
        aria-valuetext={words}
        style={styles.track}
      >
        <View style={[styles.done, { width: `${share * 100}%` }]} />
      </View>
    </Box>
  );
}

const styles = StyleSheet.create({
  track: {
    height: 12,
    borderRadius: 3,
    borderWidth: 1,
    borderColor: meaning.line,
    backgroundColor: meaning.page,
    overflow: 'hidden',
  },
  done: { height: '100%', backgroundColor: meaning.action },
});
