import { z } from 'zod';

import { CannotSize } from './refusal';

/** Numbers up to a thousand million: far above any plant, far below where sums lose whole units. */
const magnitude = z.number().min(0).max(1e9);
const name = z.string().min(1).max(200);
const percent = z.number().min(0).max(100);

/** A quantity that varies: its mean and its standard deviation, in the same unit. */
const spread = z.object({ mean: magnitude, sd: magnitude });

/** One part that travels in the container; `unitsPerDay` are parts a working day. */
export const poolFlow = z.object({
  part: name,
  unitsPerDay: spread,
  unitsPerContainer: z.int().min(1).max(1_000_000),
});

/** One stretch of the loop: the working days for which a container is tied up there. */
export const poolLeg = z
  .object({ name, days: spread })
  .refine((leg) => leg.days.mean > 0 || leg.days.sd === 0, {
    path: ['days', 'sd'],
    error: 'a leg of 0 days cannot vary',
  });

/** Do containers of a day's dispatch come back one by one, or as a truckload? */
export const travelModes = ['independent', 'together'] as const;
export type TravelMode = (typeof travelModes)[number];

/** RULES 7, Input. Percentages are given as percent: 1.5 is 1.5 %. All days are working days. */
export const poolInput = z.object({
  flows: z.array(poolFlow).min(1).max(10_000),
  legs: z.array(poolLeg).min(1).max(100),
  travel: z.enum(travelModes),
  bufferDays: z.number().min(0).max(10_000),
  // Nearer to 1 the distribution functions can no longer tell one pool size from the next.
  coverProbability: z
    .number()
    .gt(0)
    .max(1 - 1e-9),
  heldPct: percent,
  repairPct: percent,
  lossPerTripPct: percent,
  workingDaysPerYear: z.number().gt(0).max(366),
});

export type PoolInput = z.infer<typeof poolInput>;

/** The parsed input; refuses with CannotSize, which names the field. */
export function parsePoolInput(raw: unknown): PoolInput {
  const parsed = poolInput.safeParse(raw);
  if (!parsed.success) {
    const issue = parsed.error.issues[0];
    throw new CannotSize('input not understood', {
      at: issue?.path.join('.') ?? '',
      because: issue?.message ?? 'not understood',
    });
  }
  const input = parsed.data;
  if (input.heldPct + input.repairPct >= 100) {
    throw new CannotSize('no unit left to use', { at: 'heldPct', because: 'held and in repair reach 100 %' });
  }
  return input;
}
