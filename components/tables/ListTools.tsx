import { useEffect, useState, type ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { DateInput } from '../ui/DateInput';
import { Disclosure } from '../ui/Disclosure';
import { DownloadLink } from '../ui/Link';
import { Select, type Option } from '../ui/Select';
import { TextInput } from '../ui/TextInput';
import { nextSort, type Column } from './column';
import type { ListState } from './use-list-state';

export type Filter = { key: string; label: string } &
  /** `usual` names what is shown while nothing is chosen, where that is not everything. */
  ({ options: readonly Option[]; usual?: string } | { day: true } | { month: true });

type Props<Row> = {
  state: ListState;
  filters: readonly Filter[];
  searchLabel?: string | undefined;
  columns: readonly Column<Row>[];
  downloads: readonly { href: string; label: string }[];
};

/** Search, filters, sort (on cards; tables sort by their heads) and downloads above a list. */
export function ListTools<Row>({ state, filters, searchLabel, columns, downloads }: Props<Row>) {
  const wide = useIsWide();
  const sortable = wide ? [] : columns.filter((column) => column.sortable);
  const choices = (
    <>
      {filters.map((filter) => (
        <FilterInput key={filter.key} filter={filter} state={state} />
      ))}
      {sortable.length > 0 ? <SortSelect state={state} columns={sortable} /> : null}
    </>
  );
  return (
    <Box row wrap gap="m" align="end">
      {searchLabel === undefined ? null : <SearchInput label={searchLabel} state={state} />}
      {wide ? choices : null}
      {state.isFiltered ? (
        <Box>
          <Button kind="quiet" label={text.ui.clearFilters} onPress={state.clear} />
        </Box>
      ) : null}
      {downloads.map((download) => (
        <Box key={download.href}>
          <DownloadLink href={download.href} label={download.label} kind="quiet" />
        </Box>
      ))}
      {!wide && filters.length + sortable.length > 0 ? <Folded state={state}>{choices}</Folded> : null}
    </Box>
  );
}

/** On a phone the list comes first: filters and sort open on demand, and stay open while one is set. */
function Folded({ state, children }: { state: ListState; children: ReactNode }) {
  const someSet = Object.values(state.filters).some((value) => value !== '');
  return (
    <Box grow least={300}>
      <Disclosure label={text.ui.filterAndSort} open={someSet}>
        <Box row wrap gap="m" align="end">
          {children}
        </Box>
      </Disclosure>
    </Box>
  );
}

const searchPause = 300;
/** On a desk a search takes no more than this, in px. */
const widestSearch = 420;

function SearchInput({ label, state }: { label: string; state: ListState }) {
  const wide = useIsWide();
  const [typed, setTyped] = useState(state.search);
  useEffect(() => {
    if (typed === state.search) return undefined;
    const timer = setTimeout(() => state.set('search', typed), searchPause);
    return () => clearTimeout(timer);
  }, [typed, state]);
  // A search that is cleared elsewhere is cleared here too.
  useEffect(() => {
    if (state.search === '') setTyped('');
  }, [state.search]);
  return (
    <Box grow least={200} {...(wide ? { most: widestSearch } : {})}>
      <TextInput label={label} type="search" value={typed} onChange={setTyped} />
    </Box>
  );
}

function FilterInput({ filter, state }: { filter: Filter; state: ListState }) {
  const wide = useIsWide();
  const value = state.filters[filter.key] ?? '';
  const change = (next: string) => state.set(filter.key, next);
  return (
    <Box grow={!wide} least={150}>
      {'options' in filter ? (
        <Select
          label={filter.label}
          placeholder={filter.usual ?? text.ui.all}
          options={filter.options}
          value={value}
          onChange={change}
        />
      ) : (
        <DateInput label={filter.label} value={value} onChange={change} month={'month' in filter} />
      )}
    </Box>
  );
}

function SortSelect<Row>({ state, columns }: { state: ListState; columns: readonly Column<Row>[] }) {
  const options = columns.flatMap(({ key, head }) => [
    { value: key, label: `${head}, ${text.ui.ascending}` },
    { value: nextSort(key, key), label: `${head}, ${text.ui.descending}` },
  ]);
  return (
    <Box grow least={150}>
      <Select
        label={text.ui.sortedBy}
        options={options}
        value={state.sort ?? ''}
        onChange={(next) => state.set('sort', next)}
      />
    </Box>
  );
}
