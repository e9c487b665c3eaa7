import * as contracts from '@/shared/contracts/statements';
import { file, post, read, type Route } from '../../http/route';
import { confirmStatement, noteOpened } from './answer-statement';
import { issueStatement } from './issue-statement';
import { statementsPage } from './list-statements';
import { movementsPage } from './movements-of';
import { statementPage } from './read-statement';
import { statementFile } from './spreadsheets';

export const statementRoutes: Route[] = [
  read(contracts.listStatements, 'see statements', ({ db, query, person }) =>
    statementsPage(db, { query, person }),
  ),
  read(contracts.readStatement, 'see statements', ({ db, params, person }) =>
    statementPage(db, { id: params.statement, person }),
  ),
  read(contracts.listStatementMovements, 'see statements', ({ db, params, person, query }) =>
    movementsPage(db, { id: params.statement, person, query }),
  ),
  file(contracts.downloadStatement, 'see statements', ({ deps, params, person }) =>
    statementFile(deps, { id: params.statement, person }),
  ),
  post(contracts.openStatement, 'see statements', async ({ tx, params, person, at }) => {
    await noteOpened(tx, { statementId: params.statement, person, now: at.now });
    return { id: params.statement };
  }),
  post(contracts.confirmStatement, 'answer statements', async ({ tx, params, person, at }) => {
    await confirmStatement(tx, { statementId: params.statement, person, now: at.now });
    return { id: params.statement };
  }),
  post(contracts.issueStatement, 'close months', async ({ tx, params, person, at, deps }) => {
    await issueStatement(tx, { statementId: params.statement, personId: person.id, now: at.now, deps });
    return { id: params.statement };
  }),
];
