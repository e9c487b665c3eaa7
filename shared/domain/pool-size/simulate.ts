import { dispatchDraws, loopTimeDraws, type Uniform } from './draws';
import { parsePoolInput } from './input';
import { loopTime, stillOutAfter } from './loop-time';
import { dispatchPerDay } from './peak';

/** What the simulated days showed just after each day's dispatch, in containers, with its standard errors. */
export interface SimulatedPeak {
  mean: number;
  meanError: number;
  variance: number;
  varianceError: number;
  days: number;
}

/** Days are simulated in batches, each many loop times long, so that batches are nearly independent. */
export interface SimulatedRun {
  batches: number;
  daysPerBatch: number;
  uniform: Uniform;
}

/**
 * The loop day by day: containers leave, each day's whole number drawn, and come back after a drawn loop
 * time, one by one or a day's dispatch together (RULES 7). The first days, until the loop has filled, are
 * left out. Refuses what sizePool refuses, and a demand that no whole number of containers a day can have.
 */
export function simulatePeak(raw: unknown, { batches, daysPerBatch, uniform }: SimulatedRun): SimulatedPeak {
  const input = parsePoolInput(raw);
  const loop = loopTime(input.legs);
  const filling = stillOutAfter(loop).length;
  const days = batches * daysPerBatch;
  const counts = countsByDay({
    days: filling + days,
    together: input.travel === 'together',
    dispatched: dispatchDraws(dispatchPerDay(input.flows), uniform),
    daysOut: loopTimeDraws(loop, uniform),
  }).subarray(filling);
  const mean = average(counts);
  const squares = counts.map((count) => (count - mean) ** 2);
  return {
    mean,
    meanError: errorOfMean(batchMeans(counts, daysPerBatch)),
    variance: average(squares),
    varianceError: errorOfMean(batchMeans(squares, daysPerBatch)),
    days,
  };
}

interface Days {
  days: number;
  together: boolean;
  dispatched: () => number;
  daysOut: () => number;
}

function countsByDay({ days, together, dispatched, daysOut }: Days): Float64Array {
  const change = new Float64Array(days + 1);
  const comeBack = (day: number, containers: number): void => {
    // Out k days later exactly when the loop time is more than k days.
    const back = Math.min(days, day + Math.ceil(daysOut()));
    change[back] = (change[back] ?? 0) - containers;
  };
  for (let day = 0; day < days; day += 1) {
    const containers = dispatched();
    change[day] = (change[day] ?? 0) + containers;
    if (together) comeBack(day, containers);
    else for (let each = 0; each < containers; each += 1) comeBack(day, 1);
  }
  let inLoop = 0;
  return change.subarray(0, days).map((by) => (inLoop += by));
}

function batchMeans(values: Float64Array, size: number): Float64Array {
  return Float64Array.from({ length: values.length / size }, (_, batch) =>
    average(values.subarray(batch * size, (batch + 1) * size)),
  );
}

function average(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

function errorOfMean(means: Float64Array): number {
  const middle = average(means);
  const squares = means.reduce((sum, value) => sum + (value - middle) ** 2, 0);
  return Math.sqrt(squares / (means.length - 1) / means.length);
}
