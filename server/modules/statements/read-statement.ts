import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { companies, people } from '@/db/schema/companies';
import { disputeMessages, disputes } from '@/db/schema/differences';
import { statements, statementSteps } from '@/db/schema/statements';
import { undecided } from '@/shared/contracts/disputes';
import type { AnswerOf } from '@/shared/contracts/operation';
import type { readStatement } from '@/shared/contracts/statements';
import { formatMinor } from '@/shared/domain/money';
import { statementContent } from '@/shared/domain/statement/content';
import { Problem } from '@/shared/problems/problems';
import { may, type Person, scopeOf } from '../../http/person';
import { operatorZone } from '../partners/operator-day';
import { plain } from './assessment-input';
import { heldOf } from './held';
import { openDifferencesOf } from './open-differences-of';
import { statementRowOf } from './statement-rows';

type Read = AnswerOf<typeof readStatement>;
type Asked = { id: string; person: Person };

/** The statement with its partner, if this person may see it; otherwise as if it did not exist. */
export async function visibleStatement(db: Database, { id, person }: Asked) {
  const scope = scopeOf(person);
  const [found] = await db
    .select({ row: statements, partner: companies })
    .from(statements)
    .innerJoin(companies, eq(companies.id, statements.companyId))
    .where(eq(statements.id, id));
  if (!found) throw new Problem('not found');
  const hidden = scope !== null && (found.row.companyId !== scope || found.row.state === 'draft');
  if (hidden) throw new Problem('not found');
  return { ...found, content: statementContent.parse(found.row.content) };
}

/** Everything that the statement's page shows: what is frozen, and what became of it since. */
export async function statementPage(db: Database, asked: Asked): Promise<Read> {
  const { row, partner, content } = await visibleStatement(db, asked);
  const { person } = asked;
  const held = (await heldOf(db, [row.id])).get(row.id) ?? '0';
  const history = await historyOf(db, row.id);
  const ofPartner = person.companyId === row.companyId;
  const answered = row.answer === 'confirmed' || row.answer === 'confirmed by silence';
  const all = await disputesOf(db, row);
  const { movements: _movements, openDifferences: _open, ...shown } = content;
  return {
    ...statementRowOf(row, { partner, held }),
    content: shown,
    sha256: row.sha256,
    stillOpen: await openDifferencesOf(db, { partner, through: content.to }),
    disputes: all,
    history,
    timeZone: await operatorZone(db),
    mayIssue: row.state === 'draft' && may(person, 'close months'),
    mayConfirm:
      ofPartner && may(person, 'answer statements') && !answered && !all.some((each) => each.undecided),
    mayDispute: ofPartner && may(person, 'open disputes') && row.state === 'issued' && !answered,
    firstOpening: ofPartner && !history.some((each) => each.step === 'opened'),
  };
}

async function historyOf(db: Database, statementId: string): Promise<Read['history']> {
  return db
    .select({ step: statementSteps.step, by: people.name, at: statementSteps.at })
    .from(statementSteps)
    .leftJoin(people, eq(people.id, statementSteps.personId))
    .where(eq(statementSteps.statementId, statementId))
    .orderBy(asc(statementSteps.id));
}

type Row = { id: string; currency: string };

async function disputesOf(db: Database, { id, currency }: Row): Promise<Read['disputes']> {
  const rows = await db
    .select({ dispute: disputes, by: people.name, words: disputeMessages.text })
    .from(disputes)
    .leftJoin(people, eq(people.id, disputes.openedBy))
    .leftJoin(
      disputeMessages,
      and(eq(disputeMessages.disputeId, disputes.id), eq(disputeMessages.step, 'opened')),
    )
    .where(eq(disputes.statementId, id))
    .orderBy(asc(disputes.openedAt), asc(disputes.id));
  return rows.map(({ dispute, by, words }) => ({
    id: dispute.id,
    lineId: dispute.statementLineId,
    state: dispute.state,
    undecided: undecided.includes(dispute.state),
    stated: dispute.stated,
    claimed: dispute.claimed,
    held: formatMinor(plain(dispute.amountHeld), currency),
    reason: dispute.reason,
    by,
    at: dispute.openedAt,
    words: words ?? '',
  }));
}
