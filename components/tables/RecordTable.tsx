import { StretchLink } from '../ui/StretchLink';
import { DataTable } from '../ui/DataTable';
import { directionOf, nextSort, type Column } from './column';
import type { ListState } from './use-list-state';

type Props<Row> = {
  label: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  rowHref?: ((row: Row) => string) | undefined;
  state?: ListState | undefined;
};

/** The columns as a table, the title column as the link of its row. */
export function RecordTable<Row>({ label, columns, rows, rowKey, rowHref, state }: Props<Row>) {
  const titleKey = (columns.find((column) => column.cardRole === 'title') ?? columns[0])?.key;
  return (
    <DataTable
      label={label}
      rows={rows}
      rowKey={rowKey}
      columns={columns.map(({ key, head, cell, align, width, whole, sortable }) => ({
        key,
        head,
        ...(align === undefined ? {} : { align }),
        ...(width === undefined ? {} : { width }),
        ...(whole ? { whole } : {}),
        ...(sortable && state
          ? {
              sorted: directionOf(state.sort, key),
              onSort: () => state.set('sort', nextSort(state.sort, key)),
            }
          : {}),
        cell:
          key === titleKey && rowHref
            ? (row: Row) => <StretchLink href={rowHref(row)}>{cell(row)}</StretchLink>
            : cell,
      }))}
    />
  );
}
