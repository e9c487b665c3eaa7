import type { ErrorRequestHandler, Request } from 'express';
import { databaseErrorNumber } from '@/db/transaction';
import { Problem, type ProblemAnswer, type ProblemCode } from '@/shared/problems/problems';
import type { Deps } from '../deps';
import { instantOf } from '../deps';
import { writeLog } from '../modules/log/write-log';

/** Every failure leaves as one shape. What we did not foresee is logged whole and answered without detail. */
export function answerProblem(deps: Deps): ErrorRequestHandler {
  // Express tells an error handler by its four parameters.
  // eslint-disable-next-line max-params
  return async (error: unknown, request, response, _next) => {
    const problem = problemOf(error);
    if (problem.code === 'failed here') request.log.error({ err: error }, 'failed');
    if (loggedRefusals.has(problem.code)) await logRefusal(deps, { request, problem });
    if (response.headersSent) {
      response.destroy();
      return;
    }
    if (problem.code === 'database away') response.setHeader('retry-after', '5');
    if (problem.code === 'too many tries')
      response.setHeader('retry-after', String(problem.data?.seconds ?? 60));
    const answer: ProblemAnswer = {
      code: problem.code,
      status: problem.status,
      requestId: String(request.id),
      ...(problem.fields ? { fields: problem.fields } : {}),
      ...(problem.data ? { data: problem.data } : {}),
    };
    response.status(problem.status).json(answer);
  };
}

/** Refusals that someone may want to look into afterwards. */
const loggedRefusals: ReadonlySet<ProblemCode> = new Set([
  'not allowed',
  'request not trusted',
  'too many tries',
  'link not valid',
]);

function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (isCsrf(error)) return new Problem('request not trusted');
  if (isAddressError(error)) return new Problem('not found');
  if (isBodyError(error)) {
    if (error.type === 'entity.too.large') return new Problem('too large', { data: { megabytes: 1 } });
    return new Problem('not valid', {
      fields: [{ path: '', message: 'The body is not JSON that can be read' }],
    });
  }
  if (isAway(error)) return new Problem('database away');
  return new Problem('failed here');
}

/** What reading a body fails with: too large, cut off, not JSON, not the compression that it says. */
function isBodyError(error: unknown): error is { status: number; type?: string } {
  return (
    typeof error === 'object' &&
    error !== null &&
    'status' in error &&
    typeof error.status === 'number' &&
    error.status >= 400 &&
    error.status < 500
  );
}

/** Express found a part of the address that is no text, such as "%E0%A4%A". */
function isAddressError(error: unknown): boolean {
  return error instanceof Error && error.name === 'URIError';
}

function isCsrf(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'code' in error && error.code === 'EBADCSRFTOKEN';
}

const awayCodes = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ETIMEDOUT',
  'EPIPE',
  'PROTOCOL_CONNECTION_LOST',
  'POOL_CLOSED',
  'ER_CON_COUNT_ERROR',
  'ENOENT',
]);

/** Shutting down, disk full, table full, and conflicts that many repeats did not get past (lock wait, deadlock, changed). */
const awayNumbers: ReadonlySet<number> = new Set([1053, 1021, 1114, 1205, 1213, 1020]);

function isAway(error: unknown): boolean {
  if (typeof error !== 'object' || error === null) return false;
  if ('code' in error && typeof error.code === 'string' && awayCodes.has(error.code)) return true;
  if (error instanceof Error && /Queue limit reached|Pool is closed|closed state/.test(error.message))
    return true;
  const number = databaseErrorNumber(error);
  if (number !== undefined && awayNumbers.has(number)) return true;
  return 'cause' in error && isAway(error.cause);
}

async function logRefusal(
  deps: Deps,
  { request, problem }: { request: Request; problem: Problem },
): Promise<void> {
  const at = { requestId: String(request.id), address: request.ip ?? '', now: instantOf(deps.clock) };
  const detail = { method: request.method, path: request.path };
  await writeLog(deps.db, {
    at,
    person: request.person ?? null,
    action: 'refused',
    outcome: problem.code,
    detail,
  }).catch((error: unknown) => request.log.error({ err: error }, 'refusal not logged'));
}
