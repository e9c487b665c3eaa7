import { deflateSync, crc32 } from 'node:zlib';

type Upload = { name: string; mimeType: string; buffer: Buffer };

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const head = Buffer.alloc(4);
  head.writeUInt32BE(data.length);
  const sum = Buffer.alloc(4);
  sum.writeUInt32BE(crc32(body) >>> 0);
  return Buffer.concat([head, body, sum]);
}

/** A real picture: 32 by 32 pixels of one grey. */
export function aPhoto(name = 'load.png'): Upload {
  const head = Buffer.alloc(13);
  head.writeUInt32BE(32, 0);
  head.writeUInt32BE(32, 4);
  head.set([8, 0, 0, 0, 0], 8);
  const rows = Buffer.alloc(32 * 33, 0x99);
  for (let row = 0; row < 32; row += 1) rows[row * 33] = 0;
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  const buffer = Buffer.concat([
    signature,
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(rows)),
    chunk('IEND', Buffer.alloc(0)),
  ]);
  return { name, mimeType: 'image/png', buffer };
}

/** A delivery note as a PDF of one empty page. */
export function aPaper(name = 'delivery-note.pdf'): Upload {
  const parts = [
    '1 0 obj<</Type/Catalog/Pages 2 0 R>>endobj',
    '2 0 obj<</Type/Pages/Kids[3 0 R]/Count 1>>endobj',
    '3 0 obj<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]>>endobj',
  ];
  const text = `%PDF-1.4\n${parts.join('\n')}\ntrailer<</Root 1 0 R>>\n%%EOF\n`;
  return { name, mimeType: 'application/pdf', buffer: Buffer.from(text, 'latin1') };
}

/** A file whose name and kind say something that its content is not. */
export function aPretender(name: string, mimeType: string): Upload {
  return { name, mimeType, buffer: Buffer.from('MZ this is a program and no picture', 'latin1') };
}

export function aLargeFile(megabytes: number, { name, mimeType, buffer }: Upload): Upload {
  return { name, mimeType, buffer: Buffer.concat([buffer, Buffer.alloc(megabytes * 1_000_000, 0x20)]) };
}
