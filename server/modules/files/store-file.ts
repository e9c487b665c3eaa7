import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { files } from '@/db/schema/files';
import type { StoredFile } from '@/shared/contracts/files';
import { Problem } from '@/shared/problems/problems';
import type { FileStore } from '../../files/file-store';
import type { Person } from '../../http/person';
import type { UploadedFile } from '../../http/route';
import { mediaTypeOf } from './sniff';

type Storing = { uploaded: readonly UploadedFile[]; person: Person; store: FileStore; now: string };

/** Keeps one uploaded file. The bytes lie under their hash, so putting them before the commit harms nothing. */
export async function storeFile(tx: Transaction, storing: Storing): Promise<StoredFile> {
  const [file, ...more] = storing.uploaded;
  if (!file || more.length > 0 || file.bytes.length === 0) {
    throw new Problem('not valid', {
      fields: [{ path: 'files', message: 'Send one file that is not empty' }],
    });
  }
  const mediaType = await mediaTypeOf(file);
  await storing.store.put(file.sha256, file.bytes);
  const stored = { id: newId(), name: file.name, bytes: file.bytes.length, mediaType };
  await tx.insert(files).values({
    ...stored,
    companyId: storing.person.companyId,
    sha256: file.sha256,
    uploadedBy: storing.person.id,
    createdAt: storing.now,
  });
  return stored;
}
