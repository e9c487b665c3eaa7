import { QueryClient } from '@tanstack/react-query';
import { isPassing } from './problem-error';

/** One cache for the app. Reads go again when the failure may pass; nothing else is repeated without being asked. */
export function makeQueryClient() {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (failures, error) => failures < 2 && isPassing(error),
        networkMode: 'always',
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
