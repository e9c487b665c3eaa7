import { dayInZone } from '@/shared/domain/calendar';
import {
  bookUnannounced as bookOperation,
  decideSuggestions as decideOperation,
  listImportMatches,
  listImportReceipts,
  listImportShipments,
} from '@/shared/contracts/import-results';
import {
  confirmImport as confirmOperation,
  downloadBadRows,
  dropImport as dropOperation,
  importTemplate,
  listImportRows as listRowsOperation,
  listImports,
  readImport,
  uploadImport as uploadOperation,
} from '@/shared/contracts/imports';
import { file, post, read, type Route } from '../../http/route';
import { badRowsFile } from './bad-rows-file';
import { bookUnannounced } from './book-unannounced';
import { confirmImport, dropImport } from './confirm-import';
import { decideSuggestions } from './decide-suggestions';
import { operatorZone } from './open-papers';
import { importHead, listImportRows, readImportDetail } from './read-imports';
import { pageOfMatches } from './read-matches';
import { pageOfReceipts } from './read-receipts';
import { pageOfRows, pageOfShipments } from './read-rows';
import { templateFile } from './template';
import { uploadImport } from './upload-import';

const ability = 'import movements';

export const importRoutes: Route[] = [
  read(listImports, ability, ({ db, query }) => listImportRows(db, query)),
  file(importTemplate, ability, async ({ db, query, at }) =>
    templateFile(db, { as: query.as, today: dayInZone(at.now, await operatorZone(db)) }),
  ),
  post(uploadOperation, ability, ({ tx, files, person, at }) =>
    uploadImport(tx, { files, person, now: at.now }),
  ),
  read(readImport, ability, async ({ db, params, at }) =>
    readImportDetail(db, { id: params.import, today: dayInZone(at.now, await operatorZone(db)) }),
  ),
  read(listRowsOperation, ability, async ({ db, params, query }) => {
    const { id } = await importHead(db, params.import);
    return pageOfRows(db, { ...query, importId: id });
  }),
  file(downloadBadRows, ability, async ({ db, params }) =>
    badRowsFile(db, await importHead(db, params.import)),
  ),
  post(confirmOperation, ability, ({ tx, params, body, person, at }) =>
    confirmImport(tx, { importId: params.import, leaveOut: body.leaveOut, person, now: at.now }),
  ),
  post(dropOperation, ability, ({ tx, params }) => dropImport(tx, params.import)),
  read(listImportShipments, ability, async ({ db, params, query }) => {
    const { id } = await importHead(db, params.import);
    return pageOfShipments(db, { ...query, importId: id });
  }),
  read(listImportMatches, ability, async ({ db, params, query }) => {
    const { id } = await importHead(db, params.import);
    return pageOfMatches(db, { ...query, importId: id });
  }),
  read(listImportReceipts, ability, async ({ db, params, query }) => {
    const { id } = await importHead(db, params.import);
    return pageOfReceipts(db, { ...query, importId: id });
  }),
  post(decideOperation, ability, ({ tx, body, person, at }) =>
    decideSuggestions(tx, { ...body, personId: person.id, now: at.now }),
  ),
  post(bookOperation, ability, ({ tx, body, person, at }) =>
    bookUnannounced(tx, { ...body, personId: person.id, now: at.now }),
  ),
];
