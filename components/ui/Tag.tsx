import { StyleSheet, Text as NativeText, View } from 'react-native';
import Svg, { Circle, Path } from 'react-native-svg';
import { fontFamily, typeSize, weight } from '../theme/measures';
import { tones, type Tone } from '../theme/meaning';

const height = 26;

/** The punched hole says the state again in its shape, so that colour never speaks alone. */
function Hole({ tone }: { tone: Tone }) {
  const colour = tones[tone].line;
  const ring = <Circle cx={6} cy={6} r={4} fill="none" stroke={colour} strokeWidth={1.8} />;
  return (
    <Svg width={12} height={12} viewBox="0 0 12 12" aria-hidden>
      {tone === 'done' ? <Circle cx={6} cy={6} r={4.6} fill={colour} /> : null}
      {tone === 'differs' ? (
        <Path d="M6 1.6 L10.4 6 L6 10.4 L1.6 6 Z" fill="none" stroke={colour} strokeWidth={1.8} />
      ) : null}
      {tone === 'open' || tone === 'moving' || tone === 'disputed' ? ring : null}
      {tone === 'moving' ? <Path d="M6 2 A4 4 0 0 0 6 10 Z" fill={colour} /> : null}
      {tone === 'disputed' ? <Path d="M3.4 8.6 L8.6 3.4" stroke={colour} strokeWidth={1.8} /> : null}
    </Svg>
  );
}

/** A tie-on tag: the word of a state, two clipped corners and a hole. */
export function Tag({ tone, label }: { tone: Tone; label: string }) {
  const { line, wash } = tones[tone];
  return (
    <View style={styles.tag}>
      <Svg
        width={9}
        height="100%"
        viewBox={`0 0 9 ${height}`}
        preserveAspectRatio="none"
        aria-hidden
        style={styles.clip}
      >
        <Path d={`M9.5 0 L8 0 L0 7 L0 ${height - 7} L8 ${height} L9.5 ${height} Z`} fill={wash} />
      </Svg>
      <View style={[styles.body, { backgroundColor: wash }]}>
        <Hole tone={tone} />
        <NativeText style={[styles.words, { color: line }]}>{label}</NativeText>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  tag: { flexDirection: 'row', alignSelf: 'flex-start', minHeight: height, maxWidth: '100%' },
  clip: { marginRight: -0.5 },
  body: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 6,
    paddingVertical: 3,
    paddingRight: 10,
    flexShrink: 1,
  },
  words: { fontFamily, fontSize: typeSize.small, lineHeight: 18, fontWeight: weight.strong, flexShrink: 1 },
});
