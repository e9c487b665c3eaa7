import * as contracts from '@/shared/contracts/parts';
import { file, post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { addPartRow, changePartRow } from './keep-parts';
import { partsWorkbook } from './parts-workbook';
import { partChoices, partsPage, readPartRow } from './read-model';

export const partRoutes: Route[] = [
  read(contracts.listParts, 'see pool', ({ db, query }) => partsPage(db, query)),
  file(contracts.downloadParts, 'see pool', async ({ db, query, at }) =>
    partsWorkbook(db, { query, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.listPartChoices, 'see pool', ({ db }) => partChoices(db)),
  read(contracts.readPart, 'see pool', ({ db, params }) => readPartRow(db, params.part)),
  post(contracts.addPart, 'plan pool', async ({ tx, body, at }) => ({
    id: await addPartRow(tx, { body, now: at.now }),
  })),
  post(contracts.changePart, 'plan pool', async ({ tx, params, body }) => {
    await changePartRow(tx, params.part, body);
    return { id: params.part };
  }),
];
