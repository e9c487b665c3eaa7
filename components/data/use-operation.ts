import {
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query';
import { useRef } from 'react';
import type { AnswerOf, Operation, ParamsOf, QueryInputOf } from '@/shared/contracts/operation';
import { callApi, type Call } from './call-api';
import { newId } from './new-id';
import { isRefused } from './problem-error';

type ReadArguments<O extends Operation> = { params?: ParamsOf<O>; query?: QueryInputOf<O> };

/** The one place that makes query keys: resource, operation, what it was asked with. */
export function keyOf<O extends Operation>(operation: O, args: ReadArguments<O> = {}) {
  return [operation.resource, operation.name, args.params ?? null, args.query ?? null] as const;
}

/** Reads an operation and keeps it fresh. */
export function useRead<O extends Operation>(
  operation: O,
  args: ReadArguments<O> & { enabled?: boolean; refetchEvery?: number } = {},
) {
  const { enabled, refetchEvery, ...asked } = args;
  return useQuery<AnswerOf<O>>({
    queryKey: keyOf(operation, asked as ReadArguments<O>),
    queryFn: ({ signal }) => callApi(operation, { ...(asked as Call<O>), signal }),
    ...(enabled === undefined ? {} : { enabled }),
    ...(refetchEvery === undefined ? {} : { refetchInterval: refetchEvery }),
  });
}

/** What stands in the address goes to the server as it is, which checks it. */
type ListArguments<O extends Operation> = {
  params?: ParamsOf<O>;
  query?: QueryInputOf<O> | Record<string, string>;
};

type PageAnswer = { rows: unknown[]; next: string | null };

/** Reads a list page by page; `fetchNextPage` asks for the page after the last key. */
export function useReadPages<O extends Operation>(
  operation: O,
  args: ListArguments<O> & { enabled?: boolean } = {},
) {
  const { enabled, ...asked } = args;
  return useInfiniteQuery({
    queryKey: [...keyOf(operation, asked as ReadArguments<O>), 'pages'],
    initialPageParam: undefined as string | undefined,
    queryFn: ({ signal, pageParam }) =>
      callApi(operation, {
        ...(asked as Call<O>),
        query: {
          ...(asked.query as object),
          ...(pageParam === undefined ? {} : { after: pageParam }),
        } as QueryInputOf<O>,
        signal,
      }) as Promise<PageAnswer & AnswerOf<O>>,
    getNextPageParam: (last: PageAnswer) => last.next ?? undefined,
    ...(enabled === undefined ? {} : { enabled }),
  });
}

/**
 * Sends a changing operation. The key is made at the first try and kept until the server has answered, so that a
 * try that may or may not have arrived can be repeated. Afterwards everything of the named resources is read anew.
 */
export function usePost<O extends Operation>(
  operation: O,
  { refreshes = [] }: { refreshes?: readonly string[] } = {},
) {
  const client = useQueryClient();
  const key = useRef<string | undefined>(undefined);
  return useMutation<AnswerOf<O>, Error, Call<O>>({
    mutationFn: (call) => {
      key.current ??= call.key ?? newId();
      return callApi(operation, { ...call, key: key.current });
    },
    onSuccess: async () => {
      key.current = undefined;
      await refresh(client, [operation.resource, ...refreshes]);
    },
    onError: (error) => {
      if (isRefused(error)) key.current = undefined;
    },
  });
}

/** Marks everything of these resources as old, and the numbers beside the places with it. */
export async function refresh(client: QueryClient, resources: readonly string[]) {
  await Promise.all(
    [...resources, 'session'].map((resource) => client.invalidateQueries({ queryKey: [resource] })),
  );
}
