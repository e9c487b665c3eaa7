import type { RequestHandler } from 'express';
import { problemStatus } from '@/shared/problems/problems';

/** An upload may come over a slow line; the limits of the server itself cut it off. */
const sendsFiles = 'multipart/form-data';

/**
 * Answers 503 when a request has waited too long for the database, so that nobody hangs. What was begun may still
 * commit: the same key asks for its answer. Stands before the session, whose own end of a response waits likewise.
 */
export function timeBudget(seconds: number): RequestHandler {
  return (request, response, next) => {
    if (request.is(sendsFiles)) return next();
    const end = response.end.bind(response);
    const timer = setTimeout(() => {
      if (response.headersSent) return;
      request.log.warn({ seconds }, 'request took too long');
      response.status(problemStatus['database away']);
      response.setHeader('retry-after', '5');
      response.setHeader('content-type', 'application/json; charset=utf-8');
      end(JSON.stringify({ code: 'database away', status: 503, requestId: String(request.id) }));
    }, seconds * 1000);
    response.once('close', () => clearTimeout(timer));
    next();
  };
}
