import * as contracts from '@/shared/contracts/files';
import { Problem } from '@/shared/problems/problems';
import { file, post, type Route } from '../../http/route';
import { readableFile } from './readable-file';
import { storeFile } from './store-file';

export const fileRoutes: Route[] = [
  post(contracts.uploadFile, 'send files', ({ tx, person, files, deps, at }) =>
    storeFile(tx, { uploaded: files, person, store: deps.files, now: at.now }),
  ),
  file(contracts.downloadFile, 'see shipments', async ({ params, person, db, deps }) => {
    const held = await readableFile(db, person, params.file);
    if (!(await deps.files.has(held.sha256))) throw new Problem('not found');
    return { name: held.name, mediaType: held.mediaType, content: deps.files.open(held.sha256) };
  }),
];
