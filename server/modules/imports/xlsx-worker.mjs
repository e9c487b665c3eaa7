import { Readable } from 'node:stream';
import { parentPort, workerData } from 'node:worker_threads';
import exceljs from 'exceljs';

/* Reads the first sheet of a workbook apart from the server's own thread, so that neither its time nor its memory
   is the server's. Sends rows of plain text in batches: { rows: [{ rowNo, cells }] }, then { end: true }. */

const batchSize = 500;

/** What a person sees in a cell, as text; a day as YYYY-MM-DD. */
function plainOf(value) {
  if (value === null || value === undefined) return '';
  if (value instanceof Date) return Number.isNaN(value.getTime()) ? '' : dayOf(value);
  if (typeof value !== 'object') return String(value);
  if ('richText' in value) return value.richText.map((part) => part.text ?? '').join('');
  if ('formula' in value || 'sharedFormula' in value) return plainOf(value.result);
  if ('error' in value) return String(value.error);
  if ('text' in value) return plainOf(value.text);
  return '';
}

/** Excel's dates have no zone: their UTC parts are the day that the sheet shows. */
function dayOf(value) {
  const text = value.toISOString();
  return text.endsWith('T00:00:00.000Z') ? text.slice(0, 10) : text;
}

function cellsOf(row) {
  const cells = [];
  row.eachCell({ includeEmpty: true }, (cell, column) => {
    if (column <= workerData.mostColumns) cells[column - 1] = plainOf(cell.value).slice(0, 500).trim();
  });
  return Array.from(cells, (cell) => cell ?? '');
}

async function read() {
  const reader = new exceljs.stream.xlsx.WorkbookReader(Readable.from([Buffer.from(workerData.bytes)]), {
    worksheets: 'emit',
    sharedStrings: 'cache',
    hyperlinks: 'ignore',
    styles: 'cache',
    entries: 'ignore',
  });
  let rows = [];
  let sent = 0;
  for await (const sheet of reader) {
    for await (const row of sheet) {
      rows.push({ rowNo: row.number, cells: cellsOf(row) });
      if (rows.length < batchSize) continue;
      parentPort.postMessage({ rows });
      sent += rows.length;
      rows = [];
      if (sent > workerData.mostRows) break;
    }
    break;
  }
  parentPort.postMessage({ rows });
  parentPort.postMessage({ end: true });
}

read().catch(() => parentPort.postMessage({ broken: true }));
