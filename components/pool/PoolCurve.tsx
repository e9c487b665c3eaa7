import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { formatUnits } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { LazyLineChart } from '../ui/LazyLineChart';
import type { Marker } from '../ui/LineChart';
import { curveWords } from './curve-words';

const words = text.pool;

/** Cover and fall-back share over the pool size, with today's and the needed one marked. */
export function PoolCurve({ reckoned }: { reckoned: ReckonedPool }) {
  const { curve } = reckoned;
  return (
    <Card title={words.curve}>
      <LazyLineChart
        label={words.curve}
        summary={curveWords(reckoned)}
        xHead={words.curveX}
        formatX={formatUnits}
        formatY={words.share}
        markers={markersOf(reckoned)}
        series={[
          {
            key: 'cover',
            label: words.curveCover,
            tone: 'done',
            points: curve.map(({ poolSize, cover }) => ({ x: poolSize, y: cover })),
          },
          {
            key: 'fallback',
            label: words.curveFallback,
            tone: 'differs',
            dashed: true,
            points: curve.map(({ poolSize, fallbackShare }) => ({ x: poolSize, y: fallbackShare })),
          },
        ]}
      />
    </Card>
  );
}

/** From left to right, so that the words of the left one stand at its left; a pool off the curve has no mark. */
function markersOf({ result, atToday, curve }: ReckonedPool): Marker[] {
  const needed = {
    key: 'needed',
    x: result.poolSize,
    label: words.needed(result.poolSize),
    tone: 'done' as const,
  };
  const most = curve.at(-1)?.poolSize ?? 0;
  const least = curve[0]?.poolSize ?? 0;
  if (atToday === null || atToday.poolSize < least || atToday.poolSize > most) return [needed];
  const today = {
    key: 'today',
    x: atToday.poolSize,
    label: words.today(atToday.poolSize),
    tone: 'open' as const,
  };
  return [today, needed].sort((a, b) => a.x - b.x);
}
