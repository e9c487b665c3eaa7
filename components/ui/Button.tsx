import { Pressable, StyleSheet, Text as NativeText, View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { fontFamily, radius, space, target, typeSize, weight } from '../theme/measures';
import { meaning } from '../theme/meaning';
import { web } from './web-props';

export type ButtonKind = 'primary' | 'secondary' | 'quiet';

type Props = {
  label: string;
  onPress: () => void;
  kind?: ButtonKind;
  busy?: boolean;
  disabled?: boolean;
  /** As wide as its surroundings. */
  full?: boolean;
  /** Said to screen readers instead of the label, when many buttons carry the same word. */
  name?: string;
  expanded?: boolean;
  tall?: boolean;
};

export function Button({
  label,
  onPress,
  kind = 'primary',
  busy,
  disabled,
  full,
  name,
  expanded,
  tall,
}: Props) {
  const off = busy || disabled;
  return (
    <Pressable
      role="button"
      aria-label={name ?? label}
      aria-busy={busy}
      {...(expanded === undefined ? {} : { 'aria-expanded': expanded })}
      disabled={off}
      onPress={off ? undefined : onPress}
      {...web({ dataSet: { press: kind } })}
      style={[
        buttonStyles.every,
        buttonStyles[kind],
        full && buttonStyles.full,
        tall && buttonStyles.tall,
        off && buttonStyles.off,
      ]}
    >
      <ButtonFace label={busy ? text.ui.busy : label} kind={kind} />
    </Pressable>
  );
}

export function ButtonFace({ label, kind }: { label: string; kind: ButtonKind }) {
  return (
    <View>
      <NativeText
        style={[buttonStyles.words, kind === 'primary' ? buttonStyles.onFill : buttonStyles.onCard]}
      >
        {label}
      </NativeText>
    </View>
  );
}

export const buttonStyles = StyleSheet.create({
  every: {
    minHeight: target,
    minWidth: target,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    borderRadius: radius,
    alignItems: 'center',
    justifyContent: 'center',
    borderWidth: 1,
    borderColor: 'transparent',
    alignSelf: 'flex-start',
  },
  primary: { backgroundColor: meaning.action },
  secondary: { backgroundColor: meaning.surface, borderColor: meaning.action },
  quiet: { paddingHorizontal: space.s },
  full: { alignSelf: 'stretch' },
  tall: { minHeight: 52 },
  off: { opacity: 0.5 },
  words: { fontFamily, fontSize: typeSize.body, fontWeight: weight.strong, textAlign: 'center' },
  onFill: { color: meaning.onAction },
  onCard: { color: meaning.action },
});
