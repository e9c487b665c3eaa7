import { Fragment, type ReactNode } from 'react';
import { Problem } from '../data/Problem';
import { PageEnd } from '../tables/PageEnd';
import type { Pages } from '../tables/RecordList';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { Skeleton } from '../ui/Skeleton';

type Props<Row> = {
  list: Pages;
  card: (row: Row) => ReactNode;
  rowKey: (row: Row) => string;
  empty: { title: string; hint?: string };
};

/** A list whose records are too wide for a table: a card each, paged by key. */
export function PagedCards<Row>({ list, card, rowKey, empty }: Props<Row>) {
  const rows = (list.data?.pages.flatMap((page) => page.rows) ?? []) as Row[];
  if (list.error && rows.length === 0)
    return <Problem error={list.error} onRetry={() => void list.refetch?.()} />;
  if (list.isPending || rows.length === 0)
    return <Card>{list.isPending ? <Skeleton lines={6} tall /> : <EmptyState {...empty} />}</Card>;
  return (
    <Box gap="m">
      {rows.map((row) => (
        <Fragment key={rowKey(row)}>{card(row)}</Fragment>
      ))}
      <PageEnd list={list} shown={rows.length} />
    </Box>
  );
}
