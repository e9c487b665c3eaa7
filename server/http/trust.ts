import type { RequestHandler } from 'express';
import { csrfSync } from 'csrf-sync';
import { Problem } from '@/shared/problems/problems';

const reading = new Set(['GET', 'HEAD', 'OPTIONS']);

const { generateToken, csrfSynchronisedProtection } = csrfSync({
  getTokenFromRequest: (request) => request.get('x-csrf-token'),
});

export { generateToken as csrfTokenOf };
export const csrfToken: RequestHandler = csrfSynchronisedProtection;

/** A changing request must come from our own pages: its origin, what the browser says of it, and its kind of body. */
export function fromOwnPages(publicUrl: string): RequestHandler {
  return (request, _response, next) => {
    if (reading.has(request.method)) return next();
    const origin = request.get('origin');
    const own = [new URL(publicUrl).host, request.get('host')];
    if (origin !== undefined && !own.includes(hostOf(origin))) throw new Problem('request not trusted');
    const site = request.get('sec-fetch-site');
    if (site === 'cross-site' || site === 'same-site') throw new Problem('request not trusted');
    const sized =
      Number(request.get('content-length') ?? 0) > 0 || request.get('transfer-encoding') !== undefined;
    if (sized && !request.is('application/json') && !request.is('multipart/form-data')) {
      throw new Problem('content not understood');
    }
    next();
  };
}

function hostOf(origin: string): string | undefined {
  return URL.canParse(origin) ? new URL(origin).host : undefined;
}
