import { z } from 'zod';

/** The largest count a single line may state: far above any pool, far below what sums could not hold. */
export const MOST_UNITS = 1_000_000_000;

/** Whole containers, 0 or more. Refuses fractions, NaN, -0, text and more than MOST_UNITS. */
export const wholeUnits = z
  .int()
  .min(0)
  .max(MOST_UNITS)
  .refine((units) => !Object.is(units, -0), { error: 'minus zero is not a count' });

/** Whole containers, 1 or more. */
export const positiveUnits = z.int().min(1).max(MOST_UNITS);

/** A signed change of a count, never 0: what a correction adds or takes away. */
export const signedUnits = z
  .int()
  .min(-MOST_UNITS)
  .max(MOST_UNITS)
  .refine((units) => units !== 0, { error: 'a change of 0 changes nothing' });
