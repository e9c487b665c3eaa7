import type { Deps } from './deps';
import type { Limits } from './http/rate-limit';
import type { Route } from './http/route';
import { healthRoutes } from './modules/health/router';
import { sessionRoutes } from './modules/session/router';

/** Every route of the product, by noun. */
export function allRoutes(_deps: Deps, limits: Limits): Route[] {
  return [...healthRoutes, ...sessionRoutes(limits)];
}
