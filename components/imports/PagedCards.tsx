import { Fragment, type ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import type { Pages } from '../tables/RecordList';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';

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
      <Box row wrap spread="between">
        <Text variant="small" role="status">
          {list.hasNextPage ? text.ui.shown(rows.length) : text.ui.allShown(rows.length)}
        </Text>
        {list.hasNextPage ? (
          <Button
            kind="secondary"
            label={text.ui.showMore}
            busy={list.isFetchingNextPage ?? false}
            onPress={() => void list.fetchNextPage?.()}
          />
        ) : null}
      </Box>
    </Box>
  );
}
