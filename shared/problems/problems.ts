import { z } from 'zod';

/**
 * The closed list of what can go wrong, each with its HTTP status. Nobody matches on a sentence:
 * screens turn code and data into words through the text catalogue.
 */
export const problemStatus = {
  'not valid': 400,
  'key missing': 400,
  'not signed in': 401,
  'sign-in refused': 401,
  'link not valid': 400,
  'not allowed': 403,
  'request not trusted': 403,
  'not found': 404,
  'already exists': 409,
  'already counted': 409,
  'already settled': 409,
  'already answered': 409,
  'already closed': 409,
  'already issued': 409,
  'objection over': 409,
  'month closed': 409,
  'month not closed': 409,
  'month not over': 409,
  'earlier month open': 409,
  'earlier statement waits': 409,
  'dispute open': 409,
  'state changed': 409,
  'more than open': 409,
  'not enough units': 409,
  'cannot be reckoned': 409,
  'too large': 413,
  'file not as named': 415,
  'file not readable': 400,
  'content not understood': 415,
  'key used otherwise': 422,
  'too many tries': 429,
  'failed here': 500,
  'database away': 503,
} as const;

export type ProblemCode = keyof typeof problemStatus;

/** A bad field: where it stands ("lines.0.counted"), the rule it breaks, and a sentence for people. */
export const badField = z.object({ path: z.string(), message: z.string() });
export type BadField = z.infer<typeof badField>;

export const problemAnswer = z.object({
  code: z.enum(Object.keys(problemStatus) as [ProblemCode, ...ProblemCode[]]),
  status: z.number().int(),
  fields: z.array(badField).optional(),
  data: z.record(z.string(), z.unknown()).optional(),
  /** The number to read out when asking for help. */
  requestId: z.string(),
});
export type ProblemAnswer = z.infer<typeof problemAnswer>;

/** Thrown anywhere on the server; becomes the answer. `data` is shown to the person and so names nothing of other companies. */
export class Problem extends Error {
  readonly code: ProblemCode;
  readonly data: Record<string, unknown> | undefined;
  readonly fields: BadField[] | undefined;

  constructor(code: ProblemCode, detail: { data?: Record<string, unknown>; fields?: BadField[] } = {}) {
    super(code);
    this.name = 'Problem';
    this.code = code;
    this.data = detail.data;
    this.fields = detail.fields;
  }

  get status(): number {
    return problemStatus[this.code];
  }
}
