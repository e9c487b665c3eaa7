import { StyleSheet, Text as NativeText } from 'react-native';
import { fontFamily, typeSize } from '../theme/measures';
import { meaning } from '../theme/meaning';
import { web } from './web-props';

/** Leads to a field on the same page and puts the focus there. */
export function JumpLink({ to, label }: { to: string; label: string }) {
  return (
    <NativeText
      role="link"
      {...web({
        href: `#${to}`,
        onClick: (event) => {
          event.preventDefault();
          const field = document.getElementById(to);
          field?.scrollIntoView?.({ block: 'center' });
          field?.focus({ preventScroll: true });
        },
      })}
      style={styles.words}
    >
      {label}
    </NativeText>
  );
}

const styles = StyleSheet.create({
  words: {
    fontFamily,
    fontSize: typeSize.body,
    lineHeight: 28,
    color: meaning.text,
    textDecorationLine: 'underline',
    alignSelf: 'flex-start',
  },
});
