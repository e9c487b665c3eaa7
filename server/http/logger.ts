import { type DestinationStream, type Logger, pino } from 'pino';

type ErrorLike = {
  raw?: unknown;
  name?: unknown;
  message?: unknown;
  stack?: unknown;
  code?: unknown;
  cause?: unknown;
};

/** The program's log. Headers and the values of failed statements stay out of it: they hold cookies, hashes, links. */
export function loggerOf(level: string, destination?: DestinationStream): Logger {
  const options = { level, redact: ['req.headers', 'res.headers'], serializers: { err: loggedError } };
  return destination ? pino(options, destination) : pino(options);
}

/** Kind, code, message and place of an error and of what caused it, without the values of a statement. */
export function loggedError(error: unknown): unknown {
  if (typeof error !== 'object' || error === null) return String(error);
  const { raw, name, message, stack, code, cause } = error as ErrorLike;
  // pino-http hands on what it has already written down, with the error itself beside it.
  if (raw !== undefined) return loggedError(raw);
  return {
    type: name,
    code,
    message: withoutValues(message),
    stack: withoutValues(stack),
    ...(cause === undefined ? {} : { cause: loggedError(cause) }),
  };
}

/** A failed query ends its message with the values it was given. */
function withoutValues(text: unknown): unknown {
  return typeof text === 'string' ? text.replace(/\nparams: [\s\S]*?(?=\n {4}at |$)/, '') : undefined;
}
