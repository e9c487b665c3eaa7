import type { RowProblem } from '@/shared/contracts/imports';
import type { GoodRow } from './check-row';

export type DocumentLine = { typeCode: string; units: number; damaged: number; dirty: number };

/** A shipment or receipt of a file; it carries the number of its first row. */
export type ImportedDocument = {
  rowNo: number;
  side: 'shipment' | 'receipt';
  reference: string | null;
  fromSiteId: string;
  toSiteId: string;
  fromCompanyId: string;
  day: string;
  lines: DocumentLine[];
};

type Numbered = GoodRow & { rowNo: number };

/**
 * Puts rows together into documents. Shipments: one per sender and reference. Receipts: by reference, sites and day;
 * without a reference only rows that follow each other. A type that comes again begins another receipt.
 */
export class Documents {
  private readonly open = new Map<string, ImportedDocument>();
  private readonly rowOfLine = new Map<string, number>();
  private readonly all: ImportedDocument[] = [];
  private unnamed: ImportedDocument | null = null;

  get list(): readonly ImportedDocument[] {
    return this.all;
  }

  /** Adds a row, or says what it clashes with. */
  add(row: Numbered): RowProblem | null {
    return row.side === 'shipment' ? this.addShipment(row) : this.addReceipt(row);
  }

  private addShipment(row: Numbered): RowProblem | null {
    this.unnamed = null;
    const key = JSON.stringify(['shipment', row.from.companyId, row.reference]);
    const held = this.open.get(key);
    if (!held) {
      this.begin(key, row);
      return null;
    }
    if (held.fromSiteId !== row.from.id || held.toSiteId !== row.to.id || held.day !== row.day) {
      const data = { value: row.reference ?? '', row: held.rowNo };
      return { column: 'reference', reason: 'same reference, other shipment', data };
    }
    const before = this.rowOfLine.get(lineKey(held, row.typeCode));
    if (before !== undefined)
      return { column: 'type', reason: 'type twice', data: { value: row.typeCode, row: before } };
    this.addLine(held, row);
    return null;
  }

  private addReceipt(row: Numbered): null {
    const key = JSON.stringify(['receipt', row.reference, row.from.id, row.to.id, row.day]);
    const held = row.reference === null ? this.continued(row) : this.open.get(key);
    if (held && !this.rowOfLine.has(lineKey(held, row.typeCode))) this.addLine(held, row);
    else this.begin(key, row);
    return null;
  }

  /** The receipt without a reference that the row before belonged to, if this row goes on with it. */
  private continued(row: Numbered): ImportedDocument | undefined {
    const held = this.unnamed;
    const goesOn = held?.fromSiteId === row.from.id && held.toSiteId === row.to.id && held.day === row.day;
    return held && goesOn ? held : undefined;
  }

  private begin(key: string, row: Numbered): void {
    const document: ImportedDocument = {
      rowNo: row.rowNo,
      side: row.side,
      reference: row.reference,
      fromSiteId: row.from.id,
      toSiteId: row.to.id,
      fromCompanyId: row.from.companyId,
      day: row.day,
      lines: [],
    };
    this.all.push(document);
    this.open.set(key, document);
    this.addLine(document, row);
  }

  private addLine(document: ImportedDocument, row: Numbered): void {
    const { typeCode, units, damaged, dirty, rowNo } = row;
    document.lines.push({ typeCode, units, damaged, dirty });
    this.rowOfLine.set(lineKey(document, typeCode), rowNo);
    this.unnamed = row.side === 'receipt' && row.reference === null ? document : null;
  }
}

const lineKey = (document: ImportedDocument, typeCode: string): string => `${document.rowNo} ${typeCode}`;
