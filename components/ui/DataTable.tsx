import type { ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';

export type DataColumn<Row> = {
  key: string;
  head: string;
  cell: (row: Row) => ReactNode;
  align?: 'start' | 'end';
  width?: number | `${number}%`;
  whole?: boolean;
  sorted?: 'ascending' | 'descending' | undefined;
  onSort?: () => void;
};

type Props<Row> = {
  label: string;
  columns: readonly DataColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
};

/** A list as a real table whose heads can sort. */
export function DataTable<Row>({ label, columns, rows, rowKey }: Props<Row>) {
  return (
    <div className="tk-sheet-box">
      <table className="tk-sheet">
        <caption className="tk-hidden">{label}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <Head key={column.key} column={column} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column) => (
                <td key={column.key} className={classOf(column)}>
                  {column.cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function classOf<Row>({ align, whole }: DataColumn<Row>): string | undefined {
  const names = [...(align === 'end' ? ['tk-end'] : []), ...(whole ? ['tk-whole'] : [])];
  return names.length > 0 ? names.join(' ') : undefined;
}

function Head<Row>({ column }: { column: DataColumn<Row> }) {
  const { head, sorted, onSort } = column;
  const says = sorted === 'ascending' ? text.ui.sortDown(head) : text.ui.sortUp(head);
  return (
    <th
      scope="col"
      className={column.align === 'end' ? 'tk-end' : undefined}
      style={{ width: column.width }}
      aria-sort={onSort ? (sorted ?? 'none') : undefined}
    >
      {onSort ? (
        <button type="button" className="tk-sort" aria-label={says} onClick={onSort}>
          {head} <span aria-hidden>{sorted === 'ascending' ? '↑' : sorted === 'descending' ? '↓' : ''}</span>
        </button>
      ) : (
        head
      )}
    </th>
  );
}
