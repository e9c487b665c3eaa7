import type { Database } from '@/db/client';
import * as contracts from '@/shared/contracts/disputes';
import { Problem } from '@/shared/problems/problems';
import type { Deps } from '../../deps';
import type { Person } from '../../http/person';
import { type Circumstances, file, post, read, type Route } from '../../http/route';
import { operatorZone } from '../partners/operator-day';
import { answerDispute } from './answer-dispute';
import type { Seen } from './dispute-rows';
import { listDisputes } from './list-disputes';
import { openDispute } from './open-dispute';
import { disputeFile, readDispute } from './read-dispute';
import { readCountSubject, readLineSubject } from './read-subject';
import { replyToDispute, withdrawDispute } from './reply-dispute';

type Call = { db: Database; person: Person; at: Circumstances };
const seenBy = async ({ db, person, at }: Call): Promise<Seen> => ({
  person,
  now: at.now,
  zone: await operatorZone(db),
});
const speaking = ({ person, at, deps }: { person: Person; at: Circumstances; deps: Deps }) => ({
  person,
  now: at.now,
  publicUrl: deps.config.PUBLIC_URL,
});

export const disputeRoutes: Route[] = [
  read(contracts.listDisputes, 'see disputes', async ({ query, ...call }) =>
    listDisputes(call.db, { query, seen: await seenBy(call) }),
  ),
  read(contracts.readCountSubject, 'open disputes', ({ params, db, person, at }) =>
    readCountSubject(db, { shipmentId: params.shipment, person, now: at.now }),
  ),
  read(contracts.readLineSubject, 'open disputes', ({ params, db, person, at }) =>
    readLineSubject(db, { lineId: params.line, person, now: at.now }),
  ),
  read(contracts.readDispute, 'see disputes', async ({ params, ...call }) =>
    readDispute(call.db, { id: params.dispute, seen: await seenBy(call) }),
  ),
  file(contracts.downloadDisputeFile, 'see disputes', async ({ params, person, db, deps }) => {
    const held = await disputeFile(db, { id: params.dispute, fileId: params.file, seen: { person } });
    if (!(await deps.files.has(held.sha256))) throw new Problem('not found');
    return { name: held.name, mediaType: held.mediaType, content: deps.files.open(held.sha256) };
  }),
  post(contracts.openDispute, 'open disputes', ({ body, tx, ...call }) =>
    openDispute(tx, { form: body, ...speaking(call) }),
  ),
  post(contracts.answerDispute, 'answer disputes', ({ params, body, tx, ...call }) =>
    answerDispute(tx, { disputeId: params.dispute, form: body, ...speaking(call) }),
  ),
  post(contracts.replyToDispute, 'open disputes', ({ params, body, tx, ...call }) =>
    replyToDispute(tx, { disputeId: params.dispute, ...body, ...speaking(call) }),
  ),
  post(contracts.withdrawDispute, 'open disputes', ({ params, body, tx, ...call }) =>
    withdrawDispute(tx, { disputeId: params.dispute, ...body, ...speaking(call) }),
  ),
];
