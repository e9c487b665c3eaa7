import { scheduleSlots } from '@/db/schema/work';
import type { Deps } from '../deps';
import { instantOf } from '../deps';

export type Scheduled = { name: string; every: 'hour' | 'day'; run: (deps: Deps) => Promise<void> };

/** Runs what is due. Every server may call this: the slot's row lets one of them through. */
export async function runDue(deps: Deps, scheduled: readonly Scheduled[]): Promise<void> {
  const now = instantOf(deps.clock);
  for (const work of scheduled) {
    const slot = work.every === 'hour' ? now.slice(0, 13) : now.slice(0, 10);
    const [taken] = await deps.db
      .insert(scheduleSlots)
      .ignore()
      .values({ name: work.name, slot, takenAt: now });
    if (taken.affectedRows !== 1) continue;
    await work
      .run(deps)
      .catch((error: unknown) => deps.logger.error({ err: error, work: work.name }, 'scheduled work failed'));
  }
}
