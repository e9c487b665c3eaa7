import * as contracts from '@/shared/contracts/container-types';
import { file, post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { addType, changeType } from './keep-types';
import { readType, typesPage } from './read-model';
import { typesWorkbook } from './types-workbook';

export const containerTypeRoutes: Route[] = [
  read(contracts.listContainerTypes, 'see container types', ({ db, query }) => typesPage(db, query)),
  file(contracts.downloadContainerTypes, 'see container types', async ({ db, query, at }) =>
    typesWorkbook(db, { query, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.readContainerType, 'see container types', ({ db, params }) => readType(db, params.type)),
  post(contracts.addContainerType, 'keep container types', async ({ tx, body, at }) => ({
    id: await addType(tx, { body, now: at.now }),
  })),
  post(contracts.changeContainerType, 'keep container types', async ({ tx, params, body }) => {
    await changeType(tx, params.type, body);
    return { id: params.type };
  }),
];
