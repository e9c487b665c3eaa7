import { render } from '@testing-library/react';
import type { LineChartProps } from '@/components/ui/LineChart';
import { PoolCurve } from '@/components/pool/PoolCurve';
import { poolCurve, sizePool } from '@/shared/domain/pool-size';
import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { formatShare, formatUnits } from '@/shared/text/format';

let drawn: LineChartProps;

// What is drawn is the chart's own affair; here it is what it is told to draw and to say.
jest.mock('@/components/ui/LazyLineChart', () => ({
  LazyLineChart: (props: LineChartProps) => {
    drawn = props;
    return null;
  },
}));

const input = {
  flows: [{ part: 'HX-2210', unitsPerDay: { mean: 1760, sd: 240 }, unitsPerContainer: 12 }],
  legs: [{ name: 'the loop', days: { mean: 8.5, sd: 1.7 } }],
  travel: 'independent' as const,
  bufferDays: 0,
  coverProbability: 0.98,
  heldPct: 0,
  repairPct: 0,
  lossPerTripPct: 0.2,
  workingDaysPerYear: 235,
};
const result = sizePool(input);

function reckonedWith(today: number | null): ReckonedPool {
  const at = (containers: number) => {
    const [point] = poolCurve(input, { from: containers, to: containers });
    if (!point) throw new Error('no point');
    return point;
  };
  return {
    input,
    result,
    curve: poolCurve(input, { from: result.needed - 60, to: result.needed + 20, steps: 9 }),
    atNeeded: at(result.needed),
    atToday: today === null ? null : at(today),
  };
}

describe('the curve of a pool', () => {
  it('says in words what the needed and today’s pool do, with their own figures', () => {
    const reckoned = reckonedWith(result.needed - 30);
    render(<PoolCurve reckoned={reckoned} />);
    const { needed } = result;
    const { atNeeded, atToday } = reckoned;
    expect(atToday?.fallbackShare).toBeLessThan(0.0005);
    expect(drawn.summary).toContain(
      `A pool of ${formatUnits(needed)} finds enough empties for a day’s dispatch with a chance of ${formatShare(atNeeded.cover)}`,
    );
    expect(drawn.summary).toContain(
      `Today’s ${formatUnits(needed - 30)}: ${formatShare(atToday?.cover ?? 0)} and under 0.1\u202f%`,
    );
  });

  it('never says 0 of a share that is not 0', () => {
    const reckoned = reckonedWith(null);
    render(
      <PoolCurve reckoned={{ ...reckoned, atNeeded: { ...reckoned.atNeeded, fallbackShare: 0.0001 } }} />,
    );
    expect(drawn.summary).toContain('under 0.1\u202f% of loads');
    render(<PoolCurve reckoned={{ ...reckoned, atNeeded: { ...reckoned.atNeeded, fallbackShare: 0 } }} />);
    expect(drawn.summary).toContain('; 0\u202f% of loads');
  });

  it('marks today left of needed, or right of it, as they lie', () => {
    render(<PoolCurve reckoned={reckonedWith(result.needed - 30)} />);
    expect(drawn.markers?.map(({ key, x }) => [key, x])).toEqual([
      ['today', result.needed - 30],
      ['needed', result.needed],
    ]);
    render(<PoolCurve reckoned={reckonedWith(result.needed + 10)} />);
    expect(drawn.markers?.map(({ key }) => key)).toEqual(['needed', 'today']);
  });

  it('marks no today where the book holds none, or far off the curve, and says so', () => {
    render(<PoolCurve reckoned={reckonedWith(null)} />);
    expect(drawn.markers?.map(({ key }) => key)).toEqual(['needed']);
    expect(drawn.summary).toContain('The book holds none today.');
    render(<PoolCurve reckoned={reckonedWith(result.needed * 3)} />);
    expect(drawn.markers?.map(({ key }) => key)).toEqual(['needed']);
  });

  it('draws every point of both curves over the pool size', () => {
    const reckoned = reckonedWith(null);
    render(<PoolCurve reckoned={reckoned} />);
    const points = drawn.series.map((series) => series.points);
    expect(points[0]).toEqual(reckoned.curve.map(({ poolSize, cover }) => ({ x: poolSize, y: cover })));
    expect(points[1]).toEqual(
      reckoned.curve.map(({ poolSize, fallbackShare }) => ({ x: poolSize, y: fallbackShare })),
    );
  });
});
