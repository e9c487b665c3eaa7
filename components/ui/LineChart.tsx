import { useState } from 'react';
import { View } from 'react-native';
import Svg, { Line, Path, Text as SvgText } from 'react-native-svg';
import { text } from '@/shared/text/catalogue';
import { formatNumber } from '@/shared/text/format';
import { fontFamily, typeSize } from '../theme/measures';
import { meaning, tones, type Tone } from '../theme/meaning';
import { Box } from './Box';
import { chartScale, type Point } from './chart-scale';
import { Disclosure } from './Disclosure';
import { Sheet } from './Sheet';
import { Key } from './Strip';
import { Text } from './Text';

export type Series = { key: string; label: string; tone: Tone; dashed?: boolean; points: readonly Point[] };
export type Marker = { key: string; x: number; label: string; tone: Tone };

export type LineChartProps = {
  label: string;
  /** The curve in one or two sentences, for those who do not see it. */
  summary: string;
  xHead: string;
  series: readonly Series[];
  markers?: readonly Marker[];
  yMost?: number;
  formatX?: (x: number) => string;
  formatY?: (y: number) => string;
};

const height = 300;

/** Curves over one axis, with marker lines; the same numbers stand in a table that can be opened. */
export function LineChart(props: LineChartProps) {
  const { label, summary, series } = props;
  return (
    <Box gap="s">
      <Plot {...props} />
      <Key parts={series} />
      <Text variant="soft">{summary}</Text>
      <Disclosure label={text.ui.numbersInATable}>
        <Numbers {...props} label={label} />
      </Disclosure>
    </Box>
  );
}

function Plot({ label, summary, series, markers = [], yMost = 1, ...formats }: LineChartProps) {
  const [width, setWidth] = useState(640);
  const all = series.flatMap((each) => each.points);
  if (all.length === 0) return null;
  const scale = chartScale(all, { width, height }, yMost);
  const isNearEdge = (marker: Marker) => scale.x(marker.x) > width * 0.75;
  return (
    <View
      role="img"
      aria-label={`${label}. ${summary}`}
      onLayout={(event) => setWidth(event.nativeEvent.layout.width)}
    >
      <Svg width="100%" height={height} aria-hidden>
        <Axes scale={scale} width={width} yMost={yMost} {...formats} />
        {markers.map((marker, at) => (
          <MarkerLine
            key={marker.key}
            marker={marker}
            x={scale.x(marker.x)}
            top={scale.margin.top}
            // The left one of two speaks to its left; near the right edge there is only that side.
            end={(at === 0 && markers.length > 1) || isNearEdge(marker)}
            raised={at === 0 && markers.slice(1).some(isNearEdge)}
          />
        ))}
        {series.map((each) => (
          <Path
            key={each.key}
            d={scale.pathOf(each.points)}
            fill="none"
            stroke={tones[each.tone].line}
            strokeWidth={each.dashed ? 2.5 : 3.5}
            {...(each.dashed ? { strokeDasharray: '7 5' } : {})}
          />
        ))}
      </Svg>
    </View>
  );
}

type AxesProps = Pick<LineChartProps, 'formatX' | 'formatY'> & {
  scale: ReturnType<typeof chartScale>;
  width: number;
  yMost: number;
};

function Axes({ scale, width, yMost, formatX = String, formatY = formatNumber }: AxesProps) {
  const { x, y, xTicks, yTicks, margin } = scale;
  const small = { fontFamily, fontSize: typeSize.small, fill: meaning.textSoft };
  return (
    <>
      {yTicks.map((tick) => (
        <Line
          key={`y${tick}`}
          x1={margin.left}
          x2={width - margin.right}
          y1={y(tick)}
          y2={y(tick)}
          stroke={tick === 0 ? meaning.text : meaning.line}
          strokeWidth={tick === 0 ? 2 : 1}
        />
      ))}
      {[0, yMost].map((tick) => (
        <SvgText key={`n${tick}`} x={margin.left - 8} y={y(tick) + 4} textAnchor="end" {...small}>
          {formatY(tick)}
        </SvgText>
      ))}
      {xTicks.map((tick) => (
        <SvgText key={`x${tick}`} x={x(tick)} y={height - 6} textAnchor="middle" {...small}>
          {formatX(tick)}
        </SvgText>
      ))}
    </>
  );
}

type MarkerProps = { marker: Marker; x: number; top: number; end: boolean; raised: boolean };

function MarkerLine({ marker, x, top, end, raised }: MarkerProps) {
  const colour = tones[marker.tone].line;
  return (
    <>
      <Line x1={x} x2={x} y1={top} y2={height - 28} stroke={colour} strokeWidth={2} />
      <SvgText
        x={end ? x - 4 : x + 4}
        y={raised ? top - 24 : top - 8}
        textAnchor={end ? 'end' : 'start'}
        fontFamily={fontFamily}
        fontSize={typeSize.small}
        fontWeight="700"
        fill={colour}
      >
        {marker.label}
      </SvgText>
    </>
  );
}

function Numbers({ label, xHead, series, formatX = String, formatY = formatNumber }: LineChartProps) {
  const rows = [...new Set(series.flatMap((each) => each.points.map((point) => point.x)))].sort(
    (a, b) => a - b,
  );
  const valueAt = (each: Series, x: number) => each.points.find((point) => point.x === x)?.y;
  return (
    <Sheet
      caption={label}
      hideCaption
      rows={rows}
      rowKey={String}
      columns={[
        { key: 'x', head: xHead, cell: (x) => formatX(x) },
        ...series.map((each) => ({
          key: each.key,
          head: each.label,
          align: 'end' as const,
          cell: (x: number) => {
            const value = valueAt(each, x);
            return value === undefined ? '–' : formatY(value);
          },
        })),
      ]}
    />
  );
}
