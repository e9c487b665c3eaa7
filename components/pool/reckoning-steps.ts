import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { formatNumber, formatUnits } from '@/shared/text/format';

const words = text.pool.reckoned;

export type Step = { key: string; step: string; with: string; value: string };

const two = (value: number) => formatNumber(value, 2);
const sumOf = (terms: readonly string[]) => terms.join(' + ');

/** Each step of RULES 7 in words, with the case's own figures filled in. */
export function reckoningSteps(reckoned: ReckonedPool): Step[] {
  return [...flowSteps(reckoned), ...peakSteps(reckoned), ...sizeSteps(reckoned)];
}

function flowSteps({ input, result }: ReckonedPool): Step[] {
  const { flows, legs } = input;
  return [
    {
      key: 'm',
      step: words.perDay,
      with: sumOf(flows.map((flow) => `${formatNumber(flow.unitsPerDay.mean)} ÷ ${flow.unitsPerContainer}`)),
      value: two(result.containersPerDay),
    },
    {
      key: 'v',
      step: words.spread,
      with: sumOf(flows.map((flow) => `(${formatNumber(flow.unitsPerDay.sd)} ÷ ${flow.unitsPerContainer})²`)),
      value: two(result.sdPerDay ** 2),
    },
    {
      key: 'loop',
      step: words.loop,
      with: `${sumOf(legs.map((leg) => two(leg.days.mean)))}; √(${sumOf(legs.map((leg) => `${two(leg.days.sd)}²`))})`,
      value: `${two(result.loopDays)} ± ${two(result.loopSd)}`,
    },
    {
      key: 'average',
      step: words.average,
      with: `${two(result.containersPerDay)} × ${two(result.loopDays)}`,
      value: two(result.averageInLoop),
    },
  ];
}

function peakSteps({ input, result }: ReckonedPool): Step[] {
  return [
    { key: 'peakMean', step: words.peakMean, with: '', value: two(result.peakMean) },
    {
      key: 'peakVariance',
      step: words.peakVariance[input.travel],
      with: '',
      value: two(result.peakVariance),
    },
    {
      key: 'distribution',
      step: words.distribution[result.distribution],
      with: `${two(result.peakVariance)} : ${two(result.peakMean)}`,
      value: '',
    },
  ];
}

function sizeSteps({ input, result }: ReckonedPool): Step[] {
  const share = (percent: number) => formatNumber(percent / 100, 4);
  return [
    {
      key: 'cover',
      step: words.cover(input.coverProbability),
      with: '',
      value: formatUnits(result.neededForCover),
    },
    {
      key: 'buffer',
      step: words.buffer,
      with: `${two(result.containersPerDay)} × (${two(result.loopDays)} + ${two(input.bufferDays)})`,
      value: formatUnits(result.neededForBuffer),
    },
    {
      key: 'size',
      step: words.size,
      with: `${formatUnits(result.needed)} ÷ (1 − ${share(input.heldPct)} − ${share(input.repairPct)})`,
      value: formatUnits(result.poolSize),
    },
    {
      key: 'palm',
      step: words.palm,
      with: two(result.averageInLoop),
      value: formatUnits(result.poissonNeeded),
    },
    {
      key: 'erlang',
      step: words.erlang,
      with: `${two(result.averageInLoop)}; ${formatUnits(result.needed)}`,
      value: text.pool.share(result.fallbackShareAtNeeded),
    },
    {
      key: 'replaced',
      step: words.replaced,
      with: `${two(result.containersPerDay)} × ${input.workingDaysPerYear} × ${share(input.lossPerTripPct)}`,
      value: formatNumber(result.replacementsPerYear, 1),
    },
    {
      key: 'trips',
      step: words.trips,
      with: `${two(result.containersPerDay)} × ${input.workingDaysPerYear} ÷ ${formatUnits(result.poolSize)}`,
      value: formatNumber(result.tripsPerContainerPerYear, 1),
    },
  ];
}
