import { scaleLinear } from 'd3-scale';
import { curveMonotoneX, line } from 'd3-shape';

export type Point = { x: number; y: number };
export type ChartBox = { width: number; height: number };

const margin = { top: 40, right: 16, bottom: 28, left: 48 } as const;

/** Scales and paths of a line chart of this size; `yMost` is the top of the vertical axis. */
export function chartScale(points: readonly Point[], { width, height }: ChartBox, yMost: number) {
  const xs = points.map((point) => point.x);
  const x = scaleLinear(
    [Math.min(...xs), Math.max(...xs)],
    [margin.left, Math.max(margin.left + 1, width - margin.right)],
  );
  const y = scaleLinear([0, yMost], [height - margin.bottom, margin.top]);
  const path = line<Point>(
    (point) => x(point.x),
    (point) => y(point.y),
  ).curve(curveMonotoneX);
  return {
    x,
    y,
    // A number of five digits needs some 110 px beside the next.
    xTicks: x.ticks(Math.max(2, Math.min(5, Math.floor(width / 110)))),
    yTicks: y.ticks(4),
    pathOf: (series: readonly Point[]) => path([...series]) ?? '',
    margin,
  };
}
