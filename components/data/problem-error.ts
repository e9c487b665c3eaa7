import type { BadField } from '@/shared/problems/problems';
import type { ClientProblemCode } from '@/shared/text/en/problems';

type Detail = {
  status?: number;
  data?: Record<string, unknown>;
  fields?: BadField[];
  requestId?: string;
  cause?: unknown;
};

/** What went wrong with a request, by its code; `problem-message.ts` puts it into words. */
export class ProblemError extends Error {
  readonly code: ClientProblemCode;
  readonly status: number;
  readonly data: Record<string, unknown>;
  readonly fields: BadField[];
  readonly requestId: string | undefined;

  constructor(code: ClientProblemCode, detail: Detail = {}) {
    super(code, { cause: detail.cause });
    this.name = 'ProblemError';
    this.code = code;
    this.status = detail.status ?? 0;
    this.data = detail.data ?? {};
    this.fields = detail.fields ?? [];
    this.requestId = detail.requestId;
  }
}

/** Whether the same request may be sent again without a change. */
export const isPassing = (error: unknown) =>
  error instanceof ProblemError && (error.code === 'no connection' || error.code === 'database away');

/** Whether the server has looked at the request and said no, so that nothing of it can have happened. */
export const isRefused = (error: unknown) =>
  error instanceof ProblemError && error.status >= 400 && error.status < 500;
