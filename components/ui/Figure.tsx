import { StyleSheet, Text as NativeText } from 'react-native';
import { formatAmount, formatMoney, formatNumber, formatShare, formatUnits } from '@/shared/text/format';
import { fontFamily, lineHeight, typeSize, weight, type TypeSize } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';

type Value =
  | { units: number | null }
  | { money: string | null; currency: string; withoutCurrency?: boolean }
  | { number: number | null; decimals?: number }
  | { share: number | null };

type Props = Value & {
  size?: TypeSize;
  tone?: Tone | 'soft';
  /** In tables and sentences: the weight of the text around it. */
  plain?: boolean;
  /** What is counted, after the figure: "totes", "days". */
  unit?: string;
};

const nothing = '–';

function written(value: Value): string {
  if ('units' in value) return value.units === null ? nothing : formatUnits(value.units);
  if ('share' in value) return value.share === null ? nothing : formatShare(value.share);
  if ('number' in value) return value.number === null ? nothing : formatNumber(value.number, value.decimals);
  if (value.money === null) return nothing;
  return value.withoutCurrency
    ? formatAmount(value.money, value.currency)
    : formatMoney(value.money, value.currency);
}

/** Every figure on a screen comes through here: grouped, tabular, with the decimals of its currency. */
export function Figure({ size = 'body', tone, plain, unit, ...value }: Props) {
  const colour = tone === undefined ? meaning.text : tone === 'soft' ? meaning.textSoft : tones[tone].line;
  const tall = size === 'small' || size === 'body' || size === 'large' ? lineHeight.text : lineHeight.head;
  return (
    <NativeText
      style={[
        styles.figure,
        { fontSize: typeSize[size], lineHeight: Math.round(typeSize[size] * tall), color: colour },
        plain && styles.plain,
      ]}
    >
      {written(value)}
      {unit === undefined ? null : <NativeText style={styles.unit}> {unit}</NativeText>}
    </NativeText>
  );
}

const styles = StyleSheet.create({
  figure: { fontFamily, fontWeight: weight.heavy, fontVariant: ['tabular-nums'] },
  plain: { fontWeight: weight.normal },
  unit: { fontSize: typeSize.body, fontWeight: weight.normal },
});
