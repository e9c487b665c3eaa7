import { listLetters, listLog, readLetter, verifyLedgerSeals } from '@/shared/contracts/log';
import { read, type Route } from '../../http/route';
import { verifyLedger } from '../ledger/seal';
import { letterOf, lettersPage, logPage } from './read-model';

export const logRoutes: Route[] = [
  read(listLog, 'read log', ({ db, query }) => logPage(db, query)),
  read(listLetters, 'read captured mail', ({ db, query }) => lettersPage(db, query)),
  read(readLetter, 'read captured mail', ({ db, params }) => letterOf(db, params.letter)),
  read(verifyLedgerSeals, 'read log', ({ db }) => verifyLedger(db)),
];
