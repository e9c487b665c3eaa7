import { notAsNamed } from './unreadable';

export type SheetKind = 'csv' | 'xlsx';

const startsWith = (bytes: Buffer, text: string): boolean =>
  bytes.subarray(0, text.length).toString('latin1') === text;

/** What a file is by its first bytes, which must be what its name says. Whether a ZIP is a workbook is looked at later. */
export function kindOf({ name, bytes }: { name: string; bytes: Buffer }): SheetKind {
  const ending = /\.([a-z0-9]+)$/i.exec(name)?.[1]?.toLowerCase() ?? '';
  if (ending === 'xlsx' && startsWith(bytes, 'PK\u0003\u0004')) return 'xlsx';
  if (['csv', 'txt', 'tsv'].includes(ending) && !startsWith(bytes, 'PK') && !startsWith(bytes, '%PDF'))
    return 'csv';
  throw notAsNamed();
}

/** Text of a CSV: UTF-8, UTF-16 with its mark, or what older office programs save. Refuses what is no text. */
export function textOf(bytes: Buffer): string {
  const text = decoded(bytes);
  if (/[\u0000-\u0008\u000b\u000e-\u001f]/.test(text) || /^\s*</.test(text)) throw notAsNamed();
  return text;
}

function decoded(bytes: Buffer): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return new TextDecoder('utf-16le').decode(bytes);
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return new TextDecoder('utf-16be').decode(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
