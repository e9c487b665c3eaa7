import { StyleSheet, View } from 'react-native';
import { tones, type Tone } from '../theme/meaning';

/** A square of a colour, beside the words of a key. */
export function Swatch({ tone }: { tone: Tone }) {
  return <View aria-hidden style={[styles.swatch, { backgroundColor: tones[tone].line }]} />;
}

const styles = StyleSheet.create({ swatch: { width: 12, height: 12, borderRadius: 3 } });
