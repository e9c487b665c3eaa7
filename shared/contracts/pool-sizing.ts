import { z } from 'zod';
import { add, compare } from '../domain/money';
import { poolInput, travelModes } from '../domain/pool-size';
import { line } from './fields';
import { measure } from './measures';

/** Which stretch of the circuit a leg belongs to: what the book can see of its time depends on it. */
export const stretches = ['at the partner', 'to the plant', 'at the plant', 'back', 'elsewhere'] as const;
export type Stretch = (typeof stretches)[number];

const figure = (most: string) => measure({ decimals: 6, most, like: '1.5' });
const isZero = (value: string) => compare(value, '0') === 0;

const leg = z
  .object({
    name: line(60),
    stretch: z.enum(stretches),
    /** Working days, mean and standard deviation. */
    days: z.object({ mean: figure('1000'), sd: figure('1000') }),
  })
  .refine(({ days }) => !isZero(days.mean) || isZero(days.sd), {
    path: ['days', 'sd'],
    error: 'A leg of 0 days cannot vary',
  });

const planFigures = z.object({
  legs: z.array(leg).min(1).max(20),
  travel: z.enum(travelModes),
  bufferDays: figure('1000'),
  coverPct: measure({ decimals: 4, most: '99.9999', like: '98' }).refine((value) => !isZero(value), {
    error: 'More than 0',
  }),
  heldPct: figure('99'),
  repairPct: figure('99'),
  lossPerTripPct: figure('100'),
  workingDaysPerYear: z.int().min(1).max(366),
});

/** The few assumptions that are turned beside the figure itself. */
export const planTurns = planFigures.pick({ bufferDays: true, coverPct: true, travel: true });
export type PlanTurns = z.infer<typeof planTurns>;

/** The loop of a type and what is assumed of it; percentages in percent, days are working days. */
export const poolPlan = planFigures
  .refine(({ legs }) => legs.some((each) => !isZero(each.days.mean)), {
    path: ['legs'],
    error: 'At least one leg takes time',
  })
  .refine(({ heldPct, repairPct }) => compare(add(heldPct, repairPct), '100') < 0, {
    path: ['heldPct'],
    error: 'Held and in repair together stay below 100 %',
  });
export type PoolPlan = z.infer<typeof poolPlan>;
export type PoolLeg = PoolPlan['legs'][number];

/** RULES 7, Output. */
export const poolResult = z.object({
  containersPerDay: z.number(),
  sdPerDay: z.number(),
  loopDays: z.number(),
  loopSd: z.number(),
  averageInLoop: z.number(),
  legs: z.array(z.object({ name: z.string(), containers: z.number() })),
  peakMean: z.number(),
  peakVariance: z.number(),
  distribution: z.enum(['poisson', 'negative binomial', 'normal']),
  neededForCover: z.int(),
  neededForBuffer: z.int(),
  needed: z.int(),
  poolSize: z.int(),
  poissonNeeded: z.int(),
  fallbackShareAtNeeded: z.number(),
  tripsPerYear: z.number(),
  tripsPerContainerPerYear: z.number(),
  replacementsPerYear: z.number(),
});

const point = z.object({
  poolSize: z.int(),
  /** Free for the loop: the pool without what is held and in repair. */
  containers: z.int(),
  cover: z.number(),
  fallbackShare: z.number(),
});

/** A pool reckoned: what went in, what came out, and what each size would do. */
export const reckonedPool = z.object({
  input: poolInput,
  result: poolResult,
  curve: z.array(point),
  atNeeded: point,
  /** What the pool of today would do; null while the book holds none. */
  atToday: point.nullable(),
});
export type ReckonedPool = z.infer<typeof reckonedPool>;
export type PoolPoint = z.infer<typeof point>;

/** What the book saw of a stretch, in working days; null where it cannot see. */
export const seenStretch = z.object({
  stretch: z.enum(stretches),
  days: z.number().nullable(),
  /** Of the ways only: a stock shows its average, not its spread. */
  sd: z.number().nullable(),
  /** Ways: shipments and units counted. Stocks: average units standing and units that left. */
  shipments: z.int().nullable(),
  units: z.number(),
  unitsOut: z.int().nullable(),
});
export const seenTimes = z.object({
  from: z.string(),
  to: z.string(),
  workingDays: z.int(),
  stretches: z.array(seenStretch),
});
export type SeenTimes = z.infer<typeof seenTimes>;
