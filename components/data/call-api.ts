import type { AnswerOf, BodyInputOf, Operation, ParamsOf, QueryInputOf } from '@/shared/contracts/operation';
import { problemAnswer } from '@/shared/problems/problems';
import { csrfToken, forgetCsrfToken, keepCsrfToken } from './csrf';
import { ProblemError } from './problem-error';
import { reach } from './reach';
import { whenSignedInAgain } from './signed-out';
import { urlOf } from './url-of';

export type Call<O extends Operation> = {
  params?: ParamsOf<O>;
  query?: QueryInputOf<O>;
  body?: BodyInputOf<O>;
  /** Files of a multipart form, by field name; the rest of the body goes along as JSON under "body". */
  files?: Record<string, readonly File[]>;
  /** Client-made id of this attempt; kept for retries, so that one intent has one effect. */
  key?: string;
  signal?: AbortSignal;
};

/** Sends one operation of the contract and gives its checked answer, or throws a ProblemError. */
export async function callApi<O extends Operation>(operation: O, call: Call<O> = {}): Promise<AnswerOf<O>> {
  const answer = await sendTrusted(operation, call);
  const parsed = operation.answer.safeParse(await readJson(answer));
  if (!parsed.success) {
    throw new ProblemError('answer not understood', { status: answer.status, cause: parsed.error });
  }
  const token = (parsed.data as { csrfToken?: unknown } | undefined)?.csrfToken;
  if (typeof token === 'string') keepCsrfToken(token);
  return parsed.data as AnswerOf<O>;
}

/** Once more after a new sign-in: the page stays, and what was to be sent goes then. */
async function sendTrusted<O extends Operation>(operation: O, call: Call<O>): Promise<Response> {
  try {
    return await sendWithToken(operation, call);
  } catch (error) {
    if (!(error instanceof ProblemError)) throw error;
    if (error.code !== 'not signed in' || operation.path === '/session') throw error;
    await whenSignedInAgain(error);
    return sendWithToken(operation, call);
  }
}

/** Once more with a fresh token: that of a session that has ended is refused before anyone asks who is signed in. */
async function sendWithToken<O extends Operation>(operation: O, call: Call<O>): Promise<Response> {
  try {
    return await send(operation, call);
  } catch (error) {
    const isStale = error instanceof ProblemError && error.code === 'request not trusted';
    if (!isStale || operation.method === 'GET') throw error;
    forgetCsrfToken();
    return send(operation, call);
  }
}

async function send<O extends Operation>(operation: O, call: Call<O>): Promise<Response> {
  const changes = operation.method !== 'GET';
  const headers: Record<string, string> = { accept: 'application/json' };
  if (changes) headers['x-csrf-token'] = await csrfToken();
  if (operation.keyed && call.key !== undefined) headers['idempotency-key'] = call.key;
  const body = bodyOf(operation, call);
  if (typeof body === 'string') headers['content-type'] = 'application/json';
  const answer = await reach(urlOf(operation, call), {
    method: operation.method,
    headers,
    credentials: 'same-origin',
    ...(body === undefined ? {} : { body }),
    ...(call.signal === undefined ? {} : { signal: call.signal }),
  });
  if (!answer.ok) throw await problemOf(answer);
  return answer;
}

function bodyOf<O extends Operation>(operation: O, call: Call<O>): string | FormData | undefined {
  if (operation.sends !== 'files') return call.body === undefined ? undefined : JSON.stringify(call.body);
  const form = new FormData();
  form.append('body', JSON.stringify(call.body ?? {}));
  for (const [field, files] of Object.entries(call.files ?? {})) {
    for (const file of files) form.append(field, file, file.name);
  }
  return form;
}

async function readJson(answer: Response): Promise<unknown> {
  if (answer.status === 204) return undefined;
  try {
    return await answer.json();
  } catch {
    throw new ProblemError('answer not understood', { status: answer.status });
  }
}

async function problemOf(answer: Response): Promise<ProblemError> {
  const parsed = problemAnswer.safeParse(await answer.json().catch(() => undefined));
  if (parsed.success) {
    const { code, status, data, fields, requestId } = parsed.data;
    return new ProblemError(code, { status, requestId, ...(data && { data }), ...(fields && { fields }) });
  }
  // A proxy in between answers without our shape.
  const code = answer.status === 503 || answer.status === 502 ? 'database away' : 'failed here';
  return new ProblemError(code, { status: answer.status });
}
