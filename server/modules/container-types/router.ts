import * as contracts from '@/shared/contracts/container-types';
import { post, read, type Route } from '../../http/route';
import { addType, changeType } from './keep-types';
import { readType, typesPage } from './read-model';

export const containerTypeRoutes: Route[] = [
  read(contracts.listContainerTypes, 'see container types', ({ db, query }) => typesPage(db, query)),
  read(contracts.readContainerType, 'see container types', ({ db, params }) => readType(db, params.type)),
  post(contracts.addContainerType, 'keep container types', async ({ tx, body, at }) => ({
    id: await addType(tx, { body, now: at.now }),
  })),
  post(contracts.changeContainerType, 'keep container types', async ({ tx, params, body }) => {
    await changeType(tx, params.type, body);
    return { id: params.type };
  }),
];
