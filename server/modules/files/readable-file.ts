import { and, eq, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputeFiles, disputeMessages, disputes } from '@/db/schema/differences';
import { files } from '@/db/schema/files';
import { countPhotos, counts, shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import { type Person, scopeOf } from '../../http/person';

type StoredRow = typeof files.$inferSelect;

/** The file, if this person's company sent it or is party to what it hangs on; otherwise as if it did not exist. */
export async function readableFile(db: Reader, person: Person, id: string): Promise<StoredRow> {
  const [file] = await db.select().from(files).where(eq(files.id, id));
  if (!file) throw new Problem('not found');
  const scope = scopeOf(person);
  if (scope === null || file.companyId === scope) return file;
  if ((await hangsOnCountOf(db, id, scope)) || (await hangsOnDisputeOf(db, id, scope))) return file;
  throw new Problem('not found');
}

async function hangsOnCountOf(db: Reader, fileId: string, companyId: string): Promise<boolean> {
  const [found] = await db
    .select({ id: counts.id })
    .from(countPhotos)
    .innerJoin(counts, eq(counts.id, countPhotos.countId))
    .innerJoin(shipments, eq(shipments.id, counts.shipmentId))
    .where(
      and(
        eq(countPhotos.fileId, fileId),
        or(eq(shipments.fromCompanyId, companyId), eq(shipments.toCompanyId, companyId)),
      ),
    )
    .limit(1);
  return found !== undefined;
}

async function hangsOnDisputeOf(db: Reader, fileId: string, companyId: string): Promise<boolean> {
  const [found] = await db
    .select({ id: disputes.id })
    .from(disputeFiles)
    .innerJoin(disputeMessages, eq(disputeMessages.id, disputeFiles.messageId))
    .innerJoin(disputes, eq(disputes.id, disputeMessages.disputeId))
    .where(and(eq(disputeFiles.fileId, fileId), eq(disputes.companyId, companyId)))
    .limit(1);
  return found !== undefined;
}
