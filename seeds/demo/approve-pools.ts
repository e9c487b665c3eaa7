import { addDays } from '@/shared/domain/calendar';
import { approvePoolSize } from '@/server/modules/pool/approve';
import { flowsByType, plansByType } from '@/server/modules/pool/plan-rows';
import { sizeOf } from '@/server/modules/pool/reckon';
import type { Book } from './book';
import { approvals } from './scenario-approvals';

/** The engineer approves a size for some types: most as reckoned, one a little below, one above, with site levels. */
export async function approvePools(book: Book, { on }: { on: string }): Promise<void> {
  const engineer = book.cast.personIds.get('sif@fennmark.example');
  if (!engineer) throw new Error('no engineer in the scenario');
  for (const { typeCode, perMille, note, levels, daysBefore } of approvals) {
    await book.onDay(async (tx) => {
      const plan = (await plansByType(tx, typeCode)).get(typeCode)?.plan;
      if (!plan) throw new Error(`no loop for ${typeCode} in the scenario`);
      const reckoned = sizeOf(plan, (await flowsByType(tx, typeCode)).get(typeCode) ?? []).poolSize;
      await approvePoolSize(tx, {
        typeCode,
        personId: engineer,
        now: `${addDays(on, -daysBefore)}T13:20:00.000Z`,
        form: {
          size: Math.round((reckoned * perMille) / 1000),
          reckoned,
          note,
          levels: levels.map(([site, minimum, maximum]) => ({
            siteId: book.siteId(site),
            minimum,
            maximum,
          })),
        },
      });
    });
  }
}
