import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { AnswerOf, BodyInputOf, Operation, ParamsOf } from '@/shared/contracts/operation';
import { callApi, type Call } from './call-api';
import { keyOf } from './use-operation';

type Question<O extends Operation> = {
  params?: ParamsOf<O>;
  body: BodyInputOf<O>;
  enabled: boolean;
};

/** Reads an operation whose question is too long for an address and goes as a body; the last answer stays until the next. */
export function useQuestion<O extends Operation>(operation: O, { params, body, enabled }: Question<O>) {
  return useQuery<AnswerOf<O>>({
    queryKey: [...keyOf(operation, params === undefined ? {} : { params }), body],
    queryFn: ({ signal }) =>
      callApi(operation, { params, body, signal } as Call<O> & { signal: AbortSignal }),
    placeholderData: keepPreviousData,
    enabled,
  });
}
