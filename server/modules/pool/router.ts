import * as contracts from '@/shared/contracts/pool';
import { file, post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { approvePoolSize } from './approve';
import { poolPage } from './list-pool';
import { poolWorkbook } from './pool-workbook';
import { savePlanOf } from './plan-rows';
import { approvalsPage, poolOfType, previewOf } from './read-pool';

export const poolRoutes: Route[] = [
  read(contracts.listPool, 'see pool', ({ db, query }) => poolPage(db, query)),
  file(contracts.downloadPool, 'see pool', async ({ db, query, at }) =>
    poolWorkbook(db, { query, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.readPool, 'see pool', ({ db, params, at }) =>
    poolOfType(db, { typeCode: params.type, now: at.now }),
  ),
  read(contracts.previewPool, 'see pool', ({ db, params, body }) => previewOf(db, params.type, body)),
  read(contracts.listApprovals, 'see pool', ({ db, params, query }) =>
    approvalsPage(db, { typeCode: params.type, query }),
  ),
  post(contracts.savePlan, 'plan pool', async ({ tx, params, body, person, at }) => {
    await savePlanOf(tx, { typeCode: params.type, plan: body, personId: person.id, now: at.now });
    return { type: params.type };
  }),
  post(contracts.approvePool, 'approve pool', async ({ tx, params, body, person, at }) => ({
    id: await approvePoolSize(tx, { typeCode: params.type, form: body, personId: person.id, now: at.now }),
  })),
];
