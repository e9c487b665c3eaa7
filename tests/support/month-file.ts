import exceljs from 'exceljs';
import { uniformInt } from 'pure-rand/distribution/uniformInt';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { addDays } from '@/shared/domain/calendar';

/** Site and type codes of the demo scenario. */
const plants = ['TARNBY', 'OSTREL'] as const;
const partners = [
  'KESTREL',
  'BRAMBLE',
  'SUNDHOLM',
  'PALLWICK',
  'ORRIN',
  'MAREN',
  'VALE',
  'BRIGHTWASH',
] as const;
const types = ['TOTE-64', 'TOTE-43', 'LID-128', 'PALLET-128', 'BOX-1210', 'RACK-CP'] as const;

export const monthFileHeads = [
  'Side',
  'Reference',
  'From site',
  'To site',
  'Date',
  'Container type',
  'Units',
  'Damaged',
  'To clean',
] as const;

export type MonthRow = {
  side: 'shipment' | 'receipt';
  reference: string;
  from: string;
  to: string;
  date: string;
  type: string;
  units: number | string;
  damaged?: number;
  dirty?: number;
};

type Asked = {
  rows: number;
  seed?: number;
  firstDay: string;
  days: number;
  /** References begin with it, so that two files do not meet. */
  prefix?: string;
};

/**
 * Rows of a made-up month: shipments of one or two types between plants and partners, each followed by its receipt;
 * some counts differ by a few, some receipts lack their reference, some shipments have no receipt yet.
 */
export function monthRows({ rows: wanted, seed = 1, firstDay, days, prefix = 'MF-' }: Asked): MonthRow[] {
  const random = xoroshiro128plus(seed);
  const whole = (from: number, to: number): number => uniformInt(random, from, to);
  const one = <T>(list: readonly T[]): T => list[whole(0, list.length - 1)] as T;
  const rows: MonthRow[] = [];
  for (let number = 1; rows.length < wanted; number += 1) {
    const lane = [one(plants), one(partners)];
    const [from = '', to = ''] = whole(0, 1) === 0 ? lane : lane.reverse();
    const left = whole(0, days - 1);
    const date = addDays(firstDay, left);
    const reference = `${prefix}${100_000 + number}`;
    const chosen = new Set([one(types), one(types)].slice(0, whole(1, 2)));
    const lines = [...chosen].map((type) => ({ type, units: 4 * whole(5, 60) }));
    for (const { type, units } of lines)
      rows.push({ side: 'shipment', reference, from, to, date, type, units });
    const fate = whole(1, 100);
    if (fate > 97 || left >= days - 1) continue;
    const came = addDays(date, 1);
    for (const { type, units } of lines) {
      const counted = whole(1, 100) > 96 ? units - whole(1, 4) : units;
      const shown = fate > 94 ? '' : reference;
      rows.push({ side: 'receipt', reference: shown, from, to, date: came, type, units: counted });
    }
  }
  return rows.slice(0, wanted);
}

const cellsOf = (row: MonthRow): (string | number)[] => [
  row.side,
  row.reference,
  row.from,
  row.to,
  row.date,
  row.type,
  row.units,
  row.damaged ?? '',
  row.dirty ?? '',
];

export function csvOf(rows: readonly MonthRow[], { delimiter = ';', bom = false } = {}): Buffer {
  const lines = [[...monthFileHeads], ...rows.map(cellsOf)].map((cells) => cells.join(delimiter));
  return Buffer.from(`${bom ? '\ufeff' : ''}${lines.join('\r\n')}\r\n`);
}

export async function xlsxOf(rows: readonly MonthRow[]): Promise<Buffer> {
  const book = new exceljs.Workbook();
  const sheet = book.addWorksheet('Movements');
  sheet.addRow([...monthFileHeads]);
  for (const row of rows) {
    const cells = cellsOf(row).map((cell, at) =>
      at === 4 && typeof cell === 'string' && /^\d{4}-\d{2}-\d{2}$/.test(cell)
        ? new Date(`${cell}T00:00:00.000Z`)
        : cell,
    );
    sheet.addRow(cells);
  }
  return Buffer.from(await book.xlsx.writeBuffer());
}
