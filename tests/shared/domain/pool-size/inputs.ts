import { type PoolInput } from '@/shared/domain/pool-size';

/** One part at one container a unit, one leg, no buffer, nothing held: state what the case is about. */
export function anInput({
  perDay = { mean: 10, sd: 3 },
  days = { mean: 5, sd: 1 },
  ...rest
}: Partial<PoolInput> & {
  perDay?: { mean: number; sd: number };
  days?: { mean: number; sd: number };
} = {}): PoolInput {
  return {
    flows: [{ part: 'bracket', unitsPerDay: perDay, unitsPerContainer: 1 }],
    legs: [{ name: 'whole loop', days }],
    travel: 'independent',
    bufferDays: 0,
    coverProbability: 0.95,
    heldPct: 0,
    repairPct: 0,
    lossPerTripPct: 0,
    workingDaysPerYear: 235,
    ...rest,
  };
}
