import * as contracts from '@/shared/contracts/months';
import { file, post, read, type Route } from '../../http/route';
import { monthFile } from '../statements/spreadsheets';
import { closeMonth, draftAgain, issueAll } from './close-month';
import { monthPage, monthsPage } from './read-model';

export const monthRoutes: Route[] = [
  read(contracts.listMonths, 'see months', ({ db, query, at }) =>
    monthsPage(db, { now: at.now, after: query.after, limit: query.limit }),
  ),
  read(contracts.readMonth, 'see months', ({ db, params, person, at }) =>
    monthPage(db, { month: params.month, person, now: at.now }),
  ),
  file(contracts.downloadMonth, 'see months', ({ deps, params }) => monthFile(deps, params.month)),
  post(contracts.closeMonth, 'close months', async ({ tx, params, body, person, at }) => {
    const closing = { month: params.month, reason: body.reason, personId: person.id, now: at.now };
    return { month: params.month, ...(await closeMonth(tx, closing)) };
  }),
  post(contracts.draftStatements, 'close months', ({ tx, params, person, at }) =>
    draftAgain(tx, { month: params.month, key: at.key ?? at.now, personId: person.id, now: at.now }),
  ),
  post(contracts.issueStatements, 'close months', ({ tx, params, person, at }) =>
    issueAll(tx, { month: params.month, key: at.key ?? at.now, personId: person.id, now: at.now }),
  ),
];
