import { useState } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import Svg, { Path, Rect } from 'react-native-svg';
import { formatUnits } from '@/shared/text/format';
import { meaning, tones, type Tone } from '../theme/meaning';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from './Box';
import { loop, loopPaths, thickness } from './circuit-shape';
import { Figure } from './Figure';
import { RowLink } from './Link';
import { Key, Strip } from './Strip';
import { Text } from './Text';

export type Stretch = {
  units: number;
  /** Beside the figure, e.g. "full, on the way to the plants". */
  words: string;
  /** In the key and on the strip, e.g. "on the way in". */
  key: string;
  href: string;
};

export type CircuitProps = {
  label: string;
  partners: Stretch;
  full: Stretch;
  plants: Stretch;
  empty: Stretch;
  inQuestion: Stretch;
  /** One sentence on the whole pool, at the lower right. */
  note?: string;
};

const order = ['partners', 'full', 'plants', 'empty', 'inQuestion'] as const;
type StretchName = (typeof order)[number];
const toneOf: Record<StretchName, Tone> = {
  partners: 'open',
  full: 'moving',
  plants: 'done',
  empty: 'moving',
  inQuestion: 'differs',
};

/** The pool as one closed loop; on a phone the strip. Each stretch can be opened. */
export function Circuit(props: CircuitProps) {
  const wide = useIsWide();
  const parts = order.map((name) => ({
    key: name,
    units: props[name].units,
    label: props[name].key,
    tone: toneOf[name],
    href: props[name].href,
  }));
  if (!wide) {
    return (
      <Box gap="m">
        <Strip label={props.label} parts={parts} />
        {props.note === undefined ? null : <Text variant="soft">{props.note}</Text>}
      </Box>
    );
  }
  return (
    <Box gap="s">
      <Loop {...props} />
      <Box row wrap spread="between">
        <Key parts={parts.map(({ key, label, tone }) => ({ key, label, tone }))} />
        {props.note === undefined ? null : <Text variant="small">{props.note}</Text>}
      </Box>
    </Box>
  );
}

function Loop(props: CircuitProps) {
  const [width, setWidth] = useState(960);
  const paths = loopPaths(width);
  const most = Math.max(...order.map((name) => props[name].units));
  const wide = (name: StretchName) => thickness(props[name].units, most);
  const spoken = order.map((name) => `${formatUnits(props[name].units)} ${props[name].words}`).join('; ');
  return (
    <View onLayout={(event) => setWidth(event.nativeEvent.layout.width)} style={styles.box}>
      <View role="img" aria-label={`${props.label}: ${spoken}`}>
        <Svg width={width} height={loop.height} aria-hidden>
          <Path d={paths.full} stroke={tones.moving.line} strokeWidth={wide('full')} fill="none" />
          <Path
            d={paths.empty}
            stroke={tones.moving.line}
            strokeOpacity={0.7}
            strokeWidth={wide('empty')}
            fill="none"
          />
          <Path d={paths.partners} stroke={tones.open.line} strokeWidth={wide('partners')} fill="none" />
          <Path d={paths.plants} stroke={tones.done.line} strokeWidth={wide('plants')} fill="none" />
          {props.inQuestion.units > 0 ? <Block at={paths.question} size={wide('inQuestion')} /> : null}
        </Svg>
      </View>
      <Labels {...props} />
    </View>
  );
}

function Block({ at, size }: { at: { x: number; y: number }; size: number }) {
  const tall = Math.max(24, size);
  return (
    <Rect
      x={at.x - 32}
      y={at.y - tall / 2}
      width={64}
      height={tall}
      fill={meaning.inQuestionWash}
      stroke={meaning.inQuestion}
      strokeWidth={2}
    />
  );
}

function Labels(props: CircuitProps) {
  return (
    <>
      <Label stretch={props.full} at={styles.full} arrow="after" />
      <Label stretch={props.partners} at={styles.partners} below />
      <Label stretch={props.plants} at={styles.plants} below end />
      <Label stretch={props.empty} at={styles.empty} arrow="before" end />
      {props.inQuestion.units > 0 ? (
        <Label stretch={props.inQuestion} at={styles.inQuestion} tone="differs" />
      ) : null}
    </>
  );
}

type LabelProps = {
  stretch: Stretch;
  at: ViewStyle;
  arrow?: 'before' | 'after';
  below?: boolean;
  end?: boolean;
  tone?: Tone;
};

function Label({ stretch, at, arrow, below, end, tone }: LabelProps) {
  const figure = (
    <Figure units={stretch.units} size={below ? 'figure' : 'head'} {...(tone ? { tone } : {})} />
  );
  const words = (
    <Text variant="soft">
      {arrow === 'before' ? '‹ ' : ''}
      {stretch.words}
      {arrow === 'after' ? ' ›' : ''}
    </Text>
  );
  return (
    <View style={[styles.label, at]}>
      <RowLink href={stretch.href} name={`${formatUnits(stretch.units)} ${stretch.words}`}>
        <Box row={!below} gap={below ? 'xs' : 's'} align={below ? (end ? 'end' : 'start') : 'baseline'}>
          {arrow === 'before' ? words : figure}
          {arrow === 'before' ? figure : words}
        </Box>
      </RowLink>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { height: loop.height, minWidth: 640 },
  label: { position: 'absolute' },
  full: { top: 4, left: 0, right: 0, alignItems: 'center' },
  partners: { top: 105, left: loop.side + 40 },
  plants: { top: 105, right: loop.side + 40 },
  empty: { top: 226, right: '48%' },
  inQuestion: { top: 226, left: '56%' },
});
