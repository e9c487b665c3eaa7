import { Readable } from 'node:stream';
import { parse } from 'csv-parse';
import { textOf } from './file-kind';
import { unreadable } from './unreadable';

export type RawRow = { rowNo: number; cells: string[] };

const pieceLength = 32_768;

/** Rows of a CSV with their line in the file, piece by piece so that others are served in between. */
export async function* readCsv(bytes: Buffer): AsyncGenerator<RawRow> {
  const text = textOf(bytes);
  const parser = Readable.from(piecesOf(text)).pipe(
    parse({
      bom: true,
      delimiter: delimiterOf(text),
      relax_column_count: true,
      skip_empty_lines: false,
      trim: true,
      max_record_size: 20_000,
      info: true,
    }),
  );
  try {
    for await (const { record, info } of parser as AsyncIterable<{
      record: string[];
      info: { lines: number };
    }>) {
      yield { rowNo: info.lines, cells: record };
    }
  } catch {
    throw unreadable('broken');
  }
}

function* piecesOf(text: string): Generator<string> {
  for (let at = 0; at < text.length; at += pieceLength) yield text.slice(at, at + pieceLength);
}

/** The sign that parts the columns: whichever stands most often in the first line, outside quotes. */
function delimiterOf(text: string): string {
  const end = text.search(/\r|\n/);
  const head = (end < 0 ? text : text.slice(0, end)).replace(/"[^"]*"/g, '');
  const times = (sign: string): number => head.split(sign).length;
  return [';', ',', '\t'].reduce((best, sign) => (times(sign) > times(best) ? sign : best));
}
