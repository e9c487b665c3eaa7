import { fileTypeFromBuffer } from 'file-type';
import type { AcceptedMediaType } from '@/shared/contracts/files';
import { Problem } from '@/shared/problems/problems';
import type { UploadedFile } from '../../http/route';

/** By kind: the endings a name may have and the media types a browser may claim. */
const kinds: Record<AcceptedMediaType, { endings: readonly string[]; claims: readonly string[] }> = {
  'image/jpeg': { endings: ['jpg', 'jpeg'], claims: ['image/jpeg', 'image/jpg'] },
  'image/png': { endings: ['png'], claims: ['image/png'] },
  'image/webp': { endings: ['webp'], claims: ['image/webp'] },
  'image/heic': { endings: ['heic', 'heif'], claims: ['image/heic', 'image/heif'] },
  'application/pdf': { endings: ['pdf'], claims: ['application/pdf'] },
};
const unsaid = ['', 'application/octet-stream'];
const sniffedAs: Record<string, AcceptedMediaType> = {
  'image/jpeg': 'image/jpeg',
  'image/png': 'image/png',
  'image/webp': 'image/webp',
  'image/heic': 'image/heic',
  'image/heif': 'image/heic',
  'application/pdf': 'application/pdf',
};

/** The kind that the bytes themselves show; refused when it is none of ours or not what name and browser say. */
export async function mediaTypeOf(file: UploadedFile): Promise<AcceptedMediaType> {
  const sniffed = await fileTypeFromBuffer(file.bytes);
  const mediaType = sniffed ? sniffedAs[sniffed.mime] : undefined;
  const refused = (): Problem => new Problem('file not as named', { data: { name: file.name } });
  if (!mediaType) throw refused();
  const { endings, claims } = kinds[mediaType];
  const ending = /\.([A-Za-z0-9]{1,8})$/.exec(file.name)?.[1]?.toLowerCase();
  if (ending !== undefined && !endings.includes(ending)) throw refused();
  const claimed = file.mediaType.split(';')[0]?.trim().toLowerCase() ?? '';
  if (!unsaid.includes(claimed) && !claims.includes(claimed)) throw refused();
  return mediaType;
}
