import type { Deps } from './deps';
import type { Limits } from './http/rate-limit';
import type { Route } from './http/route';
import { differenceRoutes } from './modules/differences/router';
import { balanceRoutes } from './modules/balances/router';
import { fileRoutes } from './modules/files/router';
import { healthRoutes } from './modules/health/router';
import { importRoutes } from './modules/imports/router';
import { logRoutes } from './modules/log/router';
import { partnerRoutes } from './modules/partners/router';
import { peopleRoutes } from './modules/people/router';
import { sessionRoutes } from './modules/session/router';
import { shipmentRoutes } from './modules/shipments/router';

/** Every route of the product, by noun. */
export function allRoutes(_deps: Deps, limits: Limits): Route[] {
  return [
    ...healthRoutes,
    ...sessionRoutes(limits),
    ...partnerRoutes,
    ...peopleRoutes,
    ...importRoutes,
    ...logRoutes,
    ...differenceRoutes,
    ...fileRoutes,
    ...balanceRoutes,
    ...shipmentRoutes,
  ];
}
