import { z } from 'zod';
import { id } from './fields';
import { operation } from './operation';

/** What may be sent along with a count or a dispute; the server looks at the content, not at the name. */
export const acceptedMediaTypes = [
  'image/jpeg',
  'image/png',
  'image/webp',
  'image/heic',
  'application/pdf',
] as const;
export type AcceptedMediaType = (typeof acceptedMediaTypes)[number];

export const mostFilesOnOne = 6;

export const storedFile = z.object({
  id,
  name: z.string(),
  bytes: z.number().int(),
  mediaType: z.enum(acceptedMediaTypes),
});
export type StoredFile = z.infer<typeof storedFile>;

export const uploadFile = operation({
  name: 'uploadFile',
  resource: 'files',
  method: 'POST',
  path: '/files',
  summary: 'Store one photo or PDF (up to 10 MB) to hang on a count or a dispute afterwards',
  sends: 'files',
  answer: storedFile,
});

export const downloadFile = operation({
  name: 'downloadFile',
  resource: 'files',
  method: 'GET',
  path: '/files/:file',
  summary: 'The stored file, for the companies that are party to what it hangs on',
  params: z.object({ file: id }),
  answers: 'file',
  answer: z.unknown(),
});
