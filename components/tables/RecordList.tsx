import type { ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { EmptyState } from '../ui/EmptyState';
import { Skeleton } from '../ui/Skeleton';
import type { Column } from './column';
import { ListTools, type Filter } from './ListTools';
import { PageEnd } from './PageEnd';
import { RecordCardList } from './RecordCardList';
import { RecordTable } from './RecordTable';
import type { ListState } from './use-list-state';

/** What `useReadPages` gives; a plain list can be handed in as `{ data: { pages: [{ rows }] } }`. */
export type Pages = {
  data?: { pages: readonly { rows: readonly unknown[] }[] } | undefined;
  isPending?: boolean;
  isFetching?: boolean;
  error?: unknown;
  refetch?: () => unknown;
  hasNextPage?: boolean;
  isFetchingNextPage?: boolean;
  fetchNextPage?: () => unknown;
};

type Props<Row> = {
  /** What is listed, said to screen readers. */
  label: string;
  list: Pages;
  columns: readonly Column<Row>[];
  rowKey: (row: Row) => string;
  rowHref?: (row: Row) => string;
  state?: ListState;
  filters?: readonly Filter[];
  searchLabel?: string;
  /** What will stand here, and how to begin. */
  empty: { title: string; hint?: string; action?: ReactNode };
  downloads?: readonly { href: string; label: string }[];
};

/** A list: a table from 900 px, cards below, from the same columns, paged by key. */
export function RecordList<Row>({ state, filters = [], searchLabel, downloads = [], ...rest }: Props<Row>) {
  return (
    <Box gap="m">
      {state === undefined ? null : (
        <ListTools
          state={state}
          filters={filters}
          searchLabel={searchLabel}
          columns={rest.columns}
          downloads={downloads}
        />
      )}
      <Rows {...rest} {...(state === undefined ? {} : { state })} />
    </Box>
  );
}

type RowsProps<Row> = Omit<Props<Row>, 'filters' | 'searchLabel' | 'downloads'>;

function Rows<Row>({ label, list, columns, rowKey, rowHref, state, empty }: RowsProps<Row>) {
  const wide = useIsWide();
  const rows = (list.data?.pages.flatMap((page) => page.rows) ?? []) as Row[];
  if (list.error && rows.length === 0)
    return <Problem error={list.error} onRetry={() => void list.refetch?.()} />;
  if (list.isPending) return <Loading />;
  if (rows.length === 0) return <Nothing empty={empty} state={state} />;
  const shared = { label, columns, rows, rowKey, rowHref };
  return (
    <Box gap="m">
      {wide ? (
        <Card>
          <RecordTable {...shared} state={state} />
        </Card>
      ) : (
        <RecordCardList {...shared} />
      )}
      {list.error ? <Problem error={list.error} onRetry={() => void list.refetch?.()} /> : null}
      <PageEnd list={list} shown={rows.length} />
    </Box>
  );
}

function Loading() {
  return (
    <Card>
      <Skeleton lines={6} tall />
    </Card>
  );
}

function Nothing({ empty, state }: { empty: Props<unknown>['empty']; state: ListState | undefined }) {
  return (
    <Card>
      {state?.isFiltered ? (
        <EmptyState
          title={text.ui.nothingFound}
          hint={text.ui.nothingFoundHint}
          action={<Button kind="secondary" label={text.ui.clearFilters} onPress={state.clear} />}
        />
      ) : (
        <EmptyState {...empty} />
      )}
    </Card>
  );
}
