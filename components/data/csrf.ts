import { readSession } from '@/shared/contracts/session';
import { reach } from './reach';

let kept: string | undefined;
let asking: Promise<string> | undefined;

export const keepCsrfToken = (token: string) => {
  kept = token;
};

export const forgetCsrfToken = () => {
  kept = undefined;
};

async function ask(): Promise<string> {
  const answer = await reach('/api/session', {
    credentials: 'same-origin',
    headers: { accept: 'application/json' },
  });
  const parsed = readSession.answer.safeParse(await answer.json().catch(() => undefined));
  if (!parsed.success) return '';
  kept = (parsed.data as { csrfToken: string }).csrfToken;
  return kept;
}

/** The token that changing requests carry; asked for once, however many requests wait for it. */
export async function csrfToken(): Promise<string> {
  if (kept !== undefined) return kept;
  asking ??= ask().finally(() => {
    asking = undefined;
  });
  return asking;
}
