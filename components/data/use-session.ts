import { useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { Ability } from '@/shared/access/abilities';
import { readSession, type SignedIn } from '@/shared/contracts/session';
import { callApi } from './call-api';
import { askToSignIn } from './signed-out';
import { keyOf } from './use-operation';

type SessionAnswer = { csrfToken: string; signedIn: SignedIn | null };

/** A session that ends under an open page does not take the page away: it asks to sign in over it. */
function stayingWith(client: QueryClient, answer: SessionAnswer): SessionAnswer {
  const before = client.getQueryData<SessionAnswer>(keyOf(readSession));
  if (!before?.signedIn || answer.signedIn) return answer;
  askToSignIn();
  return { ...answer, signedIn: before.signedIn };
}

/** Who is signed in, and what this person may do. */
export function useSession() {
  const client = useQueryClient();
  const session = useQuery<SessionAnswer>({
    queryKey: keyOf(readSession),
    queryFn: async ({ signal }) =>
      stayingWith(client, (await callApi(readSession, { signal })) as SessionAnswer),
    staleTime: 60_000,
  });
  const signedIn = session.data?.signedIn ?? null;
  return {
    isPending: session.isPending,
    error: session.error,
    retry: session.refetch,
    signedIn,
    person: signedIn?.person ?? null,
    company: signedIn?.company ?? null,
    waiting: signedIn?.waiting ?? {},
    may: (ability: Ability) => signedIn?.abilities.includes(ability) ?? false,
    keep: (answer: SessionAnswer) => client.setQueryData(keyOf(readSession), answer),
  };
}

/** For screens inside the signed-in shell, where there always is a person. */
export function useSignedIn(): SignedIn & { may: (ability: Ability) => boolean } {
  const { signedIn, may } = useSession();
  if (signedIn === null) throw new Error('No one is signed in here');
  return { ...signedIn, may };
}
