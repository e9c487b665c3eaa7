import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { files } from '@/db/schema/files';
import { Problem } from '@/shared/problems/problems';
import type { Person } from '../../http/person';

/** Refuses ids that are not files of the person's company, at `path` of the form. Call it before hanging files on anything. */
export async function checkOwnFiles(
  tx: Transaction,
  person: Pick<Person, 'companyId'>,
  { ids, path }: { ids: readonly string[]; path: string },
): Promise<void> {
  if (ids.length === 0) return;
  const own = await tx
    .select({ id: files.id })
    .from(files)
    .where(and(inArray(files.id, [...ids]), eq(files.companyId, person.companyId)));
  const held = new Set(own.map((file) => file.id));
  const fields = ids.flatMap((id, index) =>
    held.has(id) && ids.indexOf(id) === index
      ? []
      : [
          {
            path: `${path}.${index}`,
            message: 'This file was not sent by your company, or stands here twice',
          },
        ],
  );
  if (fields.length > 0) throw new Problem('not valid', { fields });
}
