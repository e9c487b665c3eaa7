import { router, useLocalSearchParams } from 'expo-router';
import { useMemo } from 'react';

export type ListState = {
  search: string;
  /** A column key, with "-" before it for last to first. */
  sort: string | undefined;
  filters: Record<string, string>;
  /** What the list is asked with: only what is set. */
  query: Record<string, string>;
  isFiltered: boolean;
  set: (name: string, value: string) => void;
  clear: () => void;
};

type Options = { filters?: readonly string[]; sort?: string };

const one = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value) ?? '';

/** Search, sort and filters of a list live in the address: a reload, a link and the back button bring the same list. */
export function useListState({ filters = [], sort: usualSort }: Options = {}): ListState {
  const params = useLocalSearchParams<Record<string, string>>();
  const search = one(params['search']);
  const sort = one(params['sort']) || usualSort;
  const chosen = filters.map((name) => [name, one(params[name])] as const);
  const written = JSON.stringify([search, sort, chosen]);
  return useMemo(() => {
    const set = chosen.filter(([, value]) => value !== '');
    return {
      search,
      sort,
      filters: Object.fromEntries(chosen),
      query: { ...Object.fromEntries(set), ...(search ? { search } : {}), ...(sort ? { sort } : {}) },
      isFiltered: search !== '' || set.length > 0,
      set: (name, value) => router.setParams({ [name]: value === '' ? undefined : value }),
      clear: () =>
        router.setParams(Object.fromEntries(['search', ...filters].map((name) => [name, undefined]))),
    };
    // `written` stands for search, sort and chosen.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [written]);
}
