import type { ReactNode } from 'react';
import { StyleSheet, Text as NativeText, type TextStyle } from 'react-native';
import { fontFamily, lineHeight, typeSize, weight } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';
import { web } from './web-props';

export type TextVariant = 'body' | 'soft' | 'small' | 'label' | 'large' | 'head' | 'title' | 'subhead';

type Props = {
  children: ReactNode;
  /** head 26, title 20 and subhead 17 are headings of level 1, 2 and 3 unless `level` says otherwise. */
  variant?: TextVariant;
  level?: 1 | 2 | 3 | 4;
  tone?: Tone | 'text' | 'soft' | 'action';
  strong?: boolean;
  align?: 'start' | 'end' | 'center';
  id?: string;
  role?: 'status' | 'alert';
  oneLine?: boolean;
};

const headingLevel: Partial<Record<TextVariant, 1 | 2 | 3>> = { head: 1, title: 2, subhead: 3 };

function colourOf(tone: Props['tone']): string | undefined {
  if (tone === undefined) return undefined;
  if (tone === 'text') return meaning.text;
  if (tone === 'soft') return meaning.textSoft;
  return tone === 'action' ? meaning.action : tones[tone].line;
}

export function Text({ children, variant = 'body', level, tone, strong, align, id, role, oneLine }: Props) {
  const heading = level ?? headingLevel[variant];
  const colour = colourOf(tone);
  const extra: TextStyle = {
    ...(strong ? { fontWeight: weight.strong } : {}),
    ...(colour === undefined ? {} : { color: colour }),
    ...(align === undefined
      ? {}
      : { textAlign: align === 'start' ? 'left' : align === 'end' ? 'right' : 'center' }),
  };
  return (
    <NativeText
      {...(id === undefined ? {} : { id })}
      {...(heading === undefined ? {} : { role: 'heading' as const, ...web({ 'aria-level': heading }) })}
      {...(role === undefined ? {} : { role })}
      {...(oneLine ? { numberOfLines: 1 } : {})}
      style={[styles.every, styles[variant], extra]}
    >
      {children}
    </NativeText>
  );
}

const sized = (size: number, tall: number) => ({ fontSize: size, lineHeight: Math.round(size * tall) });

const styles = StyleSheet.create({
  every: { fontFamily, color: meaning.text },
  body: sized(typeSize.body, lineHeight.text),
  soft: { ...sized(typeSize.body, lineHeight.text), color: meaning.textSoft },
  small: { ...sized(typeSize.small, lineHeight.text), color: meaning.textSoft },
  label: { ...sized(typeSize.body, lineHeight.text), fontWeight: weight.strong },
  large: sized(typeSize.large, lineHeight.text),
  head: { ...sized(typeSize.head, lineHeight.head), fontWeight: weight.heavy },
  title: { ...sized(typeSize.title, lineHeight.head), fontWeight: weight.strong },
  subhead: { ...sized(typeSize.large, lineHeight.head), fontWeight: weight.strong },
});
