import * as contracts from '@/shared/contracts/balances';
import { file, post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { adjustStock } from './adjust-stock';
import { adjustmentChoices } from './adjustment-choices';
import { balancesWorkbook } from './balances-workbook';
import { movementRows } from './list-movements';
import { balanceRows, oneBalance } from './read-model';
import { reverseEntry } from './reverse-entry';

export const balanceRoutes: Route[] = [
  read(contracts.listBalances, 'see balances', async ({ query, person, db, at }) =>
    balanceRows(db, { query, person, today: await operatorDay(db, at.now) }),
  ),
  file(contracts.downloadBalances, 'see balances', async ({ query, person, db, at }) =>
    balancesWorkbook(db, { query, person, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.readBalance, 'see balances', async ({ params, query, person, db, at }) =>
    oneBalance(db, { params, query, person, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.listMovements, 'see balances', ({ params, query, person, db }) =>
    movementRows(db, { params, query, person }),
  ),
  read(contracts.listAdjustmentChoices, 'adjust stock', ({ db, at }) => adjustmentChoices(db, at.now)),
  post(contracts.adjustStock, 'adjust stock', async ({ body, tx, person, at }) => {
    const { entryId } = await adjustStock(tx, { ...body, personId: person.id, now: at.now });
    return { entryId, units: body.units };
  }),
  post(contracts.reverseEntry, 'adjust stock', async ({ params, body, tx, person, at }) => {
    const { entryId } = await reverseEntry(tx, {
      entryId: params.entry,
      reason: body.reason,
      personId: person.id,
      now: at.now,
    });
    return { entryId, correctsEntryId: params.entry };
  }),
];
