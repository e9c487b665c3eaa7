import { Fragment } from 'react';
import { Box } from '../ui/Box';
import { StretchLink } from '../ui/StretchLink';
import { RecordCard, RecordCards } from '../ui/RecordCard';
import { CellText } from '../ui/CellText';
import type { Column } from './column';

type Props<Row> = {
  label: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  rowHref?: ((row: Row) => string) | undefined;
};

/** The same columns as cards. */
export function RecordCardList<Row>({ label, columns, rows, rowKey, rowHref }: Props<Row>) {
  const title = columns.find((column) => column.cardRole === 'title') ?? columns[0];
  const rest = columns.filter((column) => column !== title);
  const inRole = (role: Column<Row>['cardRole']) =>
    rest.filter((column) => (column.cardRole ?? 'line') === role);
  return (
    <RecordCards label={label}>
      {rows.map((row) => (
        <RecordCard key={rowKey(row)}>
          <Box gap="s">
            <Box row spread="between" align="start" gap="m">
              <CellText strong>
                {title && rowHref ? (
                  <StretchLink href={rowHref(row)}>{title.cell(row)}</StretchLink>
                ) : (
                  title?.cell(row)
                )}
              </CellText>
              {inRole('aside').map((column) => (
                <CellText key={column.key} strong firm>
                  {column.cell(row)}
                </CellText>
              ))}
            </Box>
            {inRole('tag').map((column) => (
              <Fragment key={column.key}>{column.cell(row)}</Fragment>
            ))}
            {inRole('line').map((column) => (
              <Box key={column.key} row spread="between" gap="l" align="start">
                <CellText soft firm>
                  {column.head}
                </CellText>
                <CellText end>{column.cell(row)}</CellText>
              </Box>
            ))}
          </Box>
        </RecordCard>
      ))}
    </RecordCards>
  );
}
