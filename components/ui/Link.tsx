import { router } from 'expo-router';
import type { MouseEvent, ReactNode } from 'react';
import { StyleSheet, Text as NativeText, View } from 'react-native';
import { fontFamily, space, target, typeSize, weight } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';
import { ButtonFace, buttonStyles, type ButtonKind } from './Button';
import { web } from './web-props';

/** A left click without modifiers stays in the app; anything else is the browser's own. */
export function follow(event: MouseEvent, href: string) {
  if (event.defaultPrevented || event.button !== 0) return;
  if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
  event.preventDefault();
  router.push(href);
}

type Props = {
  href: string;
  label: string;
  name?: string;
  tone?: Tone | 'text' | 'soft';
  strong?: boolean;
  /** Stretches over the table row or card it stands in. */
  stretch?: boolean;
  size?: 'small' | 'body' | 'large';
};

/** A link as words. */
export function Link({ href, label, name, tone, strong = true, stretch, size = 'body' }: Props) {
  const colour =
    tone === undefined
      ? meaning.action
      : tone === 'text'
        ? meaning.text
        : tone === 'soft'
          ? meaning.textSoft
          : tones[tone].line;
  return (
    <NativeText
      role="link"
      {...(name === undefined ? {} : { 'aria-label': name })}
      {...web({
        href,
        onClick: (event) => follow(event, href),
        dataSet: stretch ? { stretch: 'row', textLink: 'yes' } : { textLink: 'yes' },
      })}
      style={[styles.words, { color: colour, fontSize: typeSize[size] }, strong && styles.strong]}
    >
      {label}
    </NativeText>
  );
}

type ButtonLinkProps = { href: string; label: string; kind?: ButtonKind; name?: string; full?: boolean };

/** A link that looks like a button: it goes somewhere. */
export function ButtonLink({ href, label, kind = 'primary', name, full }: ButtonLinkProps) {
  return (
    <View
      role="link"
      aria-label={name ?? label}
      {...web({ href, onClick: (event) => follow(event, href), dataSet: { press: kind } })}
      style={[buttonStyles.every, buttonStyles[kind], full && buttonStyles.full]}
    >
      <ButtonFace label={label} kind={kind} />
    </View>
  );
}

/** A whole row or card that opens something. */
export function RowLink({
  href,
  name,
  children,
  current,
}: {
  href: string;
  name?: string;
  children: ReactNode;
  current?: boolean;
}) {
  return (
    <View
      role="link"
      {...(name === undefined ? {} : { 'aria-label': name })}
      {...web({
        href,
        onClick: (event) => follow(event, href),
        'aria-current': current ? 'page' : undefined,
      })}
      style={styles.row}
    >
      {children}
    </View>
  );
}

/** A file to fetch: the browser's own download. */
export function DownloadLink({ href, label, kind = 'secondary', full }: ButtonLinkProps) {
  return (
    <View
      role="link"
      {...web({ href, hrefAttrs: { download: true }, dataSet: { press: kind } })}
      style={[buttonStyles.every, buttonStyles[kind], full && buttonStyles.full]}
    >
      <ButtonFace label={label} kind={kind} />
    </View>
  );
}

const styles = StyleSheet.create({
  // The pressed area is larger than the words, without moving what stands around them.
  words: {
    fontFamily,
    lineHeight: 24,
    paddingVertical: 10,
    marginVertical: -10,
    paddingHorizontal: 8,
    marginHorizontal: -8,
  },
  strong: { fontWeight: weight.strong },
  row: { minHeight: target, paddingVertical: space.s, justifyContent: 'center' },
});
