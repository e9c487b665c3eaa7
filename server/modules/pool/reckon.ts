import type { PoolPlan, PoolPoint, ReckonedPool } from '@/shared/contracts/pool-sizing';
import { CannotSize, poolCurve, type PoolInput, type PoolSize, sizePool } from '@/shared/domain/pool-size';
import { Problem } from '@/shared/problems/problems';

type Flows = PoolInput['flows'];

/** What sizePool takes, from the plan as people state it: days and percentages as numbers, cover as a share. */
export function inputOf(plan: PoolPlan, flows: Flows): PoolInput {
  return {
    flows,
    legs: plan.legs.map(({ name, days }) => ({
      name,
      days: { mean: Number(days.mean), sd: Number(days.sd) },
    })),
    travel: plan.travel,
    bufferDays: Number(plan.bufferDays),
    coverProbability: Number(plan.coverPct) / 100,
    heldPct: Number(plan.heldPct),
    repairPct: Number(plan.repairPct),
    lossPerTripPct: Number(plan.lossPerTripPct),
    workingDaysPerYear: plan.workingDaysPerYear,
  };
}

/** The size alone; a refusal becomes the problem that names the field of the plan. */
export function sizeOf(plan: PoolPlan, flows: Flows): PoolSize {
  return named(() => sizePool(inputOf(plan, flows)));
}

/** The size, the curve around it, and what today's pool would do. */
export function reckonPool(plan: PoolPlan, of: { flows: Flows; inPool: number }): ReckonedPool {
  return named(() => {
    const input = inputOf(plan, of.flows);
    const result = sizePool(input);
    const today = freeForLoop(of.inPool, input);
    return {
      input,
      result,
      curve: poolCurve(input, { ...rangeOf(result, today), steps: 41 }),
      atNeeded: pointAt(input, result.needed, result.poolSize),
      atToday: today > 0 ? pointAt(input, today, of.inPool) : null,
    };
  });
}

/** Containers of a pool that are neither held for quality nor in repair, rounded down. */
function freeForLoop(poolSize: number, { heldPct, repairPct }: PoolInput): number {
  return Math.max(0, Math.floor(poolSize * (1 - heldPct / 100 - repairPct / 100) + 1e-9));
}

function pointAt(input: PoolInput, containers: number, poolSize: number): PoolPoint {
  const [point] = poolCurve(input, { from: containers, to: containers });
  return { containers, poolSize, cover: point?.cover ?? 0, fallbackShare: point?.fallbackShare ?? 1 };
}

/** From a little below what matters to a little above; a pool many times too large or small is not drawn out to. */
function rangeOf(result: PoolSize, today: number): { from: number; to: number } {
  const near = today > result.needed / 3 && today < result.needed * 3 ? today : result.needed;
  const from = Math.floor(Math.min(result.averageInLoop, result.needed, near) * 0.9);
  return { from, to: Math.ceil(Math.max(result.needed, near) * 1.08) + 3 };
}

const fieldOf: Record<string, string> = { coverProbability: 'coverPct' };

function named<Result>(reckon: () => Result): Result {
  try {
    return reckon();
  } catch (error) {
    if (!(error instanceof CannotSize)) throw error;
    if (error.at === '' || error.at.startsWith('flows')) {
      throw new Problem('cannot be reckoned', { data: { why: `${error.message}.` } });
    }
    const because = error.message.replace(/^Pool size: /, '').replace(`${error.at}: `, '');
    throw new Problem('not valid', { fields: [{ path: fieldOf[error.at] ?? error.at, message: because }] });
  }
}
