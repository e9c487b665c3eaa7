import type { Deps } from './deps';
import type { Limits } from './http/rate-limit';
import type { Route } from './http/route';
import { containerTypeRoutes } from './modules/container-types/router';
import { differenceRoutes } from './modules/differences/router';
import { disputeRoutes } from './modules/disputes/router';
import { balanceRoutes } from './modules/balances/router';
import { fileRoutes } from './modules/files/router';
import { healthRoutes } from './modules/health/router';
import { importRoutes } from './modules/imports/router';
import { logRoutes } from './modules/log/router';
import { monthRoutes } from './modules/months/router';
import { partnerRoutes } from './modules/partners/router';
import { partRoutes } from './modules/parts/router';
import { peopleRoutes } from './modules/people/router';
import { poolRoutes } from './modules/pool/router';
import { sessionRoutes } from './modules/session/router';
import { shipmentRoutes } from './modules/shipments/router';
import { statementRoutes } from './modules/statements/router';
import { termsRoutes } from './modules/terms/router';
import { todayRoutes } from './modules/today/router';

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
    ...disputeRoutes,
    ...fileRoutes,
    ...balanceRoutes,
    ...shipmentRoutes,
    ...containerTypeRoutes,
    ...partRoutes,
    ...poolRoutes,
    ...todayRoutes,
    ...termsRoutes,
    ...monthRoutes,
    ...statementRoutes,
  ];
}
