import { lazy, Suspense } from 'react';
import type { LineChartProps } from './LineChart';
import { Skeleton } from './Skeleton';

const LineChart = lazy(async () => ({ default: (await import('./LineChart')).LineChart }));

/** The curve in a file of its own, so that only screens that show one load the scales. Import this one. */
export function LazyLineChart(props: LineChartProps) {
  return (
    <Suspense fallback={<Skeleton lines={8} />}>
      <LineChart {...props} />
    </Suspense>
  );
}
