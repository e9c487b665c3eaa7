import type { AssessmentEvent } from '@/shared/domain/assessment';
import { sum } from '@/shared/domain/money';
import { reckonStatement, type StatementInput } from '@/shared/domain/statement';
import type { StatementContent } from '@/shared/domain/statement/content';
import { statementWorkbook } from '@/server/documents/statement-workbook';
import { dayOfSerial, readWorkbook, type ReadSheet } from '../../support/read-workbook';
import { recalculated } from '../../support/recalculate';

const nasty = [
  '=1+1',
  '+1',
  '-1',
  '@SUM(A1)',
  '\t=1',
  '\r=1',
  '＝1+1',
  '＋1',
  '－1',
  '＠x',
  '_x0041_',
  'a<&>"b',
  '\u0001x',
];

const terms = (containerType: string) => ({
  containerType,
  validFrom: '2026-01-01',
  deposit: '4.50',
  replacement: '18.00',
  freeDays: 7,
  dailyFee: '0.0335',
  lostAfterDays: null,
  usefulLifeMonths: 60,
  residualFloorPct: '12.5',
  damageFee: '3.205',
  cleaningFee: '0.4',
  recoveryDays: 60,
});
const types = ['TOTE', 'LID'];
const event = (
  id: number,
  date: string,
  of: [string, 'issued' | 'returned' | 'lost' | 'found' | 'damaged', number],
) => ({
  id: String(id),
  date,
  containerType: of[0],
  kind: of[1],
  quantity: of[2],
});
const february = [
  event(1, '2026-02-02', ['TOTE', 'issued', 400]),
  event(2, '2026-02-03', ['LID', 'issued', 37]),
];
const later: AssessmentEvent[] = [
  { id: '3', date: '2026-02-02', containerType: 'TOTE', kind: 'corrected', corrects: '1', quantity: -8 },
  event(4, '2026-03-04', ['TOTE', 'issued', 101]),
  event(5, '2026-03-20', ['TOTE', 'returned', 333]),
  event(6, '2026-03-25', ['TOTE', 'lost', 12]),
  event(7, '2026-03-28', ['TOTE', 'found', 5]),
  event(8, '2026-03-20', ['LID', 'damaged', 3]),
];

function contentOf(currency: string): StatementContent {
  const amountsOf = (each: ReturnType<typeof terms>) =>
    currency === 'EUR' ? each : { ...each, deposit: '450', replacement: '1800', dailyFee: '3.35' };
  const input = (month: string, events: AssessmentEvent[]): StatementInput => ({
    month,
    taxBasis: { rate: '25', treatment: 'excluded' },
    known: {
      currency,
      terms: types.map(terms).map(amountsOf),
      containerTypes: types.map((code) => ({ code, inServiceFrom: '2024-09-15' })),
      events,
    },
    earlier: [],
    closedMonths: [],
    credits: [],
  });
  const before = reckonStatement(input('2026-02', february));
  const given = input('2026-03', [...february, ...later]);
  const statement = reckonStatement({
    ...given,
    closedMonths: ['2026-02'],
    credits: [{ id: 'c', typeCode: 'TOTE', amount: '-7', reason: nasty[0] ?? '', of: 'damage' }],
    earlier: [{ month: '2026-02', taxBasis: given.taxBasis, ...before, eventIds: before.eventIds }],
  });
  return {
    version: 1,
    number: '2026-03-KESTREL',
    month: '2026-03',
    from: '2026-03-01',
    to: '2026-03-31',
    currency,
    operator: { name: 'Fennmark Heat Pumps' },
    partner: {
      id: 'p',
      code: 'KESTREL',
      name: '=Kestrel Coil Works',
      address: null,
      taxRate: '25',
      taxTreatment: 'excluded',
      objectionDays: 14,
    },
    types: types.map((code) => ({ code, name: `Type ${code}`, kind: code.toLowerCase() })),
    terms: given.known.terms,
    ...statement,
    lines: statement.lines.map(({ correction, ...line }, index) => ({
      ...line,
      id: String(index),
      correction: correction && { ...correction, causes: ['@count put right'], eventIds: correction.causes },
    })),
    movements: nasty.map((cause, index) => ({
      id: String(index),
      date: '2026-03-04',
      typeCode: 'TOTE',
      kind: 'issued',
      quantity: 101,
      corrects: null,
      reference: cause,
      shipmentId: null,
      cause,
      lateFor: null,
    })),
    openDifferences: [-8, 3].map((openUnits, index) => ({
      id: String(index),
      shipmentId: 's',
      reference: `EM-10000${index}`,
      typeCode: 'TOTE',
      declared: 100,
      counted: 100 + openUnits,
      openUnits,
      atStake: currency === 'EUR' ? '144.10' : '144',
      openedOn: '2026-03-30',
    })),
  };
}

const cellOf = (book: Map<string, ReadSheet>, sheet: string, cell: string) =>
  book.get(sheet)?.cells.get(cell);
/** The cell beside a label of the Summary. */
const beside = (book: Map<string, ReadSheet>, label: string) => {
  const cells = book.get('Summary')?.cells ?? new Map();
  const at = [...cells].find(([, cell]) => cell.value === label)?.[0] ?? '';
  return cellOf(book, 'Summary', at.replace('A', 'B'));
};

describe('the spreadsheet of a statement, read back by a second reader', () => {
  let book: Map<string, ReadSheet>;
  const content = contentOf('EUR');
  beforeAll(async () => {
    book = await readWorkbook(await statementWorkbook({ content, sha256: 'a'.repeat(64), issued: null }));
  });

  it('has its seven sheets, in order', () => {
    expect([...book.keys()]).toEqual([
      'Summary',
      'Containers',
      'Movements',
      'Money',
      'Corrections',
      'Open differences',
      'Terms',
    ]);
  });

  it('stores with each formula the result that recalculating gives', () => {
    let formulas = 0;
    for (const [sheet, { cells }] of book) {
      for (const [cell, { kind, value }] of cells) {
        if (kind !== 'formula') continue;
        formulas += 1;
        expect(`${sheet}!${cell} ${recalculated(book, { sheet, cell }).toFixed(6)}`).toBe(
          `${sheet}!${cell} ${Number(value).toFixed(6)}`,
        );
      }
    }
    expect(formulas).toBeGreaterThan(30);
  });

  it('comes to the totals of the assessment and of the statement', () => {
    const { totals } = content.assessment;
    const own = content.lines.filter(
      (line) => line.accountMonth === content.month && line.component !== 'credit',
    );
    expect(Number(sum(own.map((line) => line.amount)))).toBe(Number(totals.payable));
    const at = (label: string) => beside(book, label)?.value;
    expect(at('Daily fee')).toBe(Number(totals.dwell));
    expect(at('Damage')).toBe(Number(totals.damage));
    expect(Number(at('Lost')) + Number(at('Found again'))).toBeCloseTo(Number(totals.loss), 6);
    const change = content.assessment.lines.map(
      (line) => Number(line.deposit.charged) - Number(line.deposit.released),
    );
    expect(Number(at('Deposits asked')) + Number(at('Deposits released'))).toBeCloseTo(
      change.reduce((total, each) => total + each, 0),
      6,
    );
    expect(beside(book, 'Payable')).toMatchObject({ kind: 'formula', value: Number(content.payable) });
    expect(beside(book, 'Tax')).toMatchObject({ kind: 'formula', value: Number(content.tax) });
    expect(beside(book, 'Payable with tax')).toMatchObject({ kind: 'formula', value: Number(content.total) });
  });

  it('shows the units and deposits of each type, their closing and their sums as formulas', () => {
    const letters = ['C', 'D', 'E', 'F', 'G', 'H'] as const;
    const keys = ['opening', 'issued', 'returned', 'lost', 'found', 'closing'] as const;
    content.assessment.lines.forEach((line, index) => {
      keys.forEach((key, at) => {
        expect(cellOf(book, 'Containers', `${letters[at]}${5 + index}`)?.value).toBe(line.units[key]);
      });
      expect(cellOf(book, 'Containers', `H${5 + index}`)?.kind).toBe('formula');
      expect(cellOf(book, 'Containers', `T${5 + index}`)).toMatchObject({
        kind: 'formula',
        value: Number(line.deposit.closing),
      });
    });
    const held = content.assessment.lines.reduce((total, line) => total + line.units.closing, 0);
    expect(cellOf(book, 'Containers', 'H7')).toMatchObject({
      kind: 'formula',
      formula: 'SUM(H5:H6)',
      value: held,
    });
  });

  it('keeps every text a text, whatever it begins with, and gives it back as it was', () => {
    const read = nasty.map((_text, index) => cellOf(book, 'Movements', `F${5 + index}`));
    expect(read.map((cell) => cell?.kind)).toEqual(nasty.map(() => 'text'));
    // Escapes as ECMA-376 part 1, 22.9.2.19 reads them; a control character cannot stand in XML.
    const texts = read.map((cell) => String(cell?.value).replace(/_x005F_/g, '_'));
    expect(texts).toEqual(nasty.map((text) => text.replace('\u0001', '')));
    for (const [sheet, { cells }] of book) {
      for (const [, cell] of cells) {
        if (cell.kind === 'formula') expect(typeof cell.value).toBe('number');
        if (cell.kind === 'text' && sheet !== 'Summary') expect(cell.format).toBe('@');
      }
    }
  });

  it('writes days as dates and amounts with the decimals of the currency', async () => {
    const day = cellOf(book, 'Movements', 'A5');
    expect([day?.kind, dayOfSerial(Number(day?.value)), day?.format]).toEqual([
      'number',
      '2026-03-04',
      'yyyy-mm-dd',
    ]);
    expect(cellOf(book, 'Money', 'F5')?.format).toBe('#,##0.00');
    expect(cellOf(book, 'Money', 'E7')).toMatchObject({ value: 0.0335, format: '0.00####' });
    const yen = await readWorkbook(
      await statementWorkbook({ content: contentOf('JPY'), sha256: 'a'.repeat(64), issued: null }),
    );
    expect(cellOf(yen, 'Money', 'F5')?.format).toBe('#,##0');
  });

  it('is finished: heads frozen and repeated in print, widths set, page numbers', () => {
    for (const [name, { xml }] of book) {
      expect(xml).toMatch(/<col [^>]*width="/);
      expect(xml).toContain('&amp;P');
      if (name !== 'Summary') expect(xml).toMatch(/<pane [^>]*ySplit="4"[^>]*state="frozen"/);
    }
  });
});
