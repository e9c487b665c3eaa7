import { eq } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { containerTypes, parts, poolPlans } from '@/db/schema/containers';
import { type PoolPlan, poolPlan } from '@/shared/contracts/pool-sizing';
import { multiply } from '@/shared/domain/money';
import { plainDecimal } from '@/shared/domain/plain-decimal';
import type { PoolInput } from '@/shared/domain/pool-size';
import { Problem } from '@/shared/problems/problems';

type PlanRow = typeof poolPlans.$inferSelect;
/** Legs as they stand in the row: days as numbers, as sizePool takes them. */
type StoredLeg = { name: string; stretch?: string; days: { mean: number; sd: number } };

export type PlanAtHand = { plan: PoolPlan; changed: { by: string | null; at: string } };

/** The stored plan of each type, by code. */
export async function plansByType(db: Reader, typeCode?: string): Promise<Map<string, PlanAtHand>> {
  const rows = await db
    .select({ plan: poolPlans, by: people.name })
    .from(poolPlans)
    .leftJoin(people, eq(people.id, poolPlans.changedBy))
    .where(typeCode === undefined ? undefined : eq(poolPlans.typeCode, typeCode));
  return new Map(
    rows.map(({ plan, by }) => [plan.typeCode, { plan: planOf(plan), changed: { by, at: plan.changedAt } }]),
  );
}

function planOf(row: PlanRow): PoolPlan {
  return poolPlan.parse({
    legs: (row.legs as StoredLeg[]).map((leg) => ({
      name: leg.name,
      stretch: leg.stretch ?? 'elsewhere',
      days: { mean: String(leg.days.mean), sd: String(leg.days.sd) },
    })),
    travel: row.travel,
    bufferDays: plainDecimal(row.bufferDays),
    coverPct: plainDecimal(multiply(row.coverProbability, 100)),
    heldPct: plainDecimal(row.heldPct),
    repairPct: plainDecimal(row.repairPct),
    lossPerTripPct: plainDecimal(row.lossPerTripPct),
    workingDaysPerYear: row.workingDaysPerYear,
  });
}

/** What travels in each type, by code: the active packing specifications. */
export async function flowsByType(db: Reader, typeCode?: string): Promise<Map<string, PoolInput['flows']>> {
  const rows = await db.select().from(parts).where(eq(parts.active, true)).orderBy(parts.number, parts.id);
  const flows = new Map<string, PoolInput['flows']>();
  for (const row of rows.filter((each) => typeCode === undefined || each.typeCode === typeCode)) {
    const flow = {
      part: row.number,
      unitsPerDay: { mean: Number(row.unitsPerDayMean), sd: Number(row.unitsPerDaySd) },
      unitsPerContainer: row.unitsPerContainer,
    };
    flows.set(row.typeCode, [...(flows.get(row.typeCode) ?? []), flow]);
  }
  return flows;
}

type Saving = { typeCode: string; plan: PoolPlan; personId: string; now: string };

/** Stores the plan of a type in place of the one before; approvals keep the input they were reckoned from. */
export async function savePlanOf(tx: Transaction, { typeCode, plan, personId, now }: Saving): Promise<void> {
  const [type] = await tx.select().from(containerTypes).where(eq(containerTypes.code, typeCode));
  if (!type) throw new Problem('not found');
  const values = {
    travel: plan.travel,
    legs: plan.legs.map(({ name, stretch, days }): StoredLeg => ({
      name,
      stretch,
      days: { mean: Number(days.mean), sd: Number(days.sd) },
    })),
    bufferDays: plan.bufferDays,
    coverProbability: multiply(plan.coverPct, '0.01'),
    heldPct: plan.heldPct,
    repairPct: plan.repairPct,
    lossPerTripPct: plan.lossPerTripPct,
    workingDaysPerYear: plan.workingDaysPerYear,
    changedBy: personId,
    changedAt: now,
  };
  await tx
    .insert(poolPlans)
    .values({ typeCode, ...values })
    .onDuplicateKeyUpdate({ set: values });
}
