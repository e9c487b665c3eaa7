import type { ReactNode } from 'react';

export type SheetColumn<Row> = {
  key: string;
  head: string;
  cell: (row: Row) => ReactNode;
  /** Figures stand at the right. */
  align?: 'start' | 'end';
  width?: number | `${number}%`;
  /** The first column names its row unless another says so. */
  names?: boolean;
  soft?: boolean;
};

type Props<Row> = {
  caption: string;
  hideCaption?: boolean;
  columns: readonly SheetColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** The last line below the heavy rule, by column key. */
  sum?: Record<string, ReactNode>;
  /** On a phone each row becomes a block of its own. */
  stack?: boolean;
};

const endOf = (column: { align?: 'start' | 'end'; soft?: boolean }) =>
  [column.align === 'end' ? 'tk-end' : '', column.soft ? 'tk-soft' : ''].join(' ').trim() || undefined;

/** The ruled sheet: a real table with one heavy rule under the head and one over the sum. */
export function Sheet<Row>({ caption, hideCaption, columns, rows, rowKey, sum, stack }: Props<Row>) {
  const naming = columns.find((column) => column.names)?.key ?? columns[0]?.key;
  return (
    <div className="tk-sheet-box">
      <table className={`tk-sheet${stack ? ' tk-sheet-stacked' : ''}`}>
        <caption className={hideCaption ? 'tk-hidden' : undefined}>{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" className={endOf(column)} style={{ width: column.width }}>
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column) =>
                column.key === naming ? (
                  <th key={column.key} scope="row" className={endOf(column)}>
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={endOf(column)} data-head={column.head}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
        {sum === undefined ? null : <SumLine columns={columns} sum={sum} naming={naming} />}
      </table>
    </div>
  );
}

type SumProps<Row> = {
  columns: readonly SheetColumn<Row>[];
  sum: Record<string, ReactNode>;
  naming: string | undefined;
};

function SumLine<Row>({ columns, sum, naming }: SumProps<Row>) {
  return (
    <tfoot>
      <tr>
        {columns.map((column) =>
          column.key === naming ? (
            <th key={column.key} scope="row" className={endOf(column)}>
              {sum[column.key]}
            </th>
          ) : (
            <td key={column.key} className={endOf(column)} data-head={column.head}>
              {sum[column.key]}
            </td>
          ),
        )}
      </tr>
    </tfoot>
  );
}
