import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { radius, space } from '../theme/measures';
import { tones } from '../theme/meaning';
import { Text } from './Text';

export type NoticeKind = 'info' | 'success' | 'error' | 'caution';
const toneOf = { info: 'open', success: 'done', error: 'differs', caution: 'moving' } as const;

type Props = { kind?: NoticeKind; title?: string; children?: ReactNode; live?: boolean; id?: string };

/** Something the person should know now. Errors are read out at once, the rest politely; `live={false}` for what always stands there. */
export function Notice({ kind = 'info', title, children, live = true, id }: Props) {
  const { line, wash } = tones[toneOf[kind]];
  const role = live ? { role: kind === 'error' ? ('alert' as const) : ('status' as const) } : {};
  return (
    <View
      {...role}
      {...(id === undefined ? {} : { id })}
      style={[styles.notice, { backgroundColor: wash, borderLeftColor: line }]}
    >
      {title === undefined ? null : (
        <Text variant="label" tone={toneOf[kind]}>
          {title}
        </Text>
      )}
      {typeof children === 'string' ? <Text>{children}</Text> : children}
    </View>
  );
}

const styles = StyleSheet.create({
  notice: { borderLeftWidth: 4, borderRadius: radius, padding: space.m, gap: space.xs },
});
