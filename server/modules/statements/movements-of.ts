import { and, asc, eq, lt } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { statements } from '@/db/schema/statements';
import type { QueryOf } from '@/shared/contracts/operation';
import type { listStatementMovements } from '@/shared/contracts/statements';
import {
  type ContentLine,
  type ContentMovement,
  statementContent,
  type StatementContent,
} from '@/shared/domain/statement/content';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import type { Person } from '../../http/person';
import { visibleStatement } from './read-statement';

type Query = QueryOf<typeof listStatementMovements>;
type Asked = { id: string; person: Person; query: Query };

/** The movements behind a figure, from the statements' own content: what it was reckoned from, not what came later. */
export async function movementsPage(db: Database, { id, person, query }: Asked) {
  const { content, row } = await visibleStatement(db, { id, person });
  const movements = query.before ? await movementsBefore(db, row, content) : content.movements;
  const wanted = movements.filter(filterOf(content, query));
  const after = cursor(query.after, 1);
  const from = after ? wanted.findIndex((movement) => movement.id === after[0]) + 1 : 0;
  return cutPage(wanted.slice(from, from + query.limit + 1), query.limit, (each) => [each.id]);
}

/** What the partner's earlier statements took in, and what this one learnt late of their months. */
async function movementsBefore(
  db: Database,
  row: { companyId: string; month: string },
  { movements }: StatementContent,
): Promise<ContentMovement[]> {
  const earlier = await db
    .select({ content: statements.content })
    .from(statements)
    .where(and(eq(statements.companyId, row.companyId), lt(statements.month, row.month)))
    .orderBy(asc(statements.month));
  const told = earlier.flatMap(({ content }) => statementContent.parse(content).movements);
  return [...told, ...movements.filter((movement) => movement.lateFor !== null)].sort((a, b) =>
    a.date < b.date ? -1 : a.date > b.date ? 1 : Number(a.id) - Number(b.id),
  );
}

function filterOf(content: StatementContent, query: Query): (movement: ContentMovement) => boolean {
  const lines = linesOf(content, query);
  const kindOf = kindsWithCorrections(content.movements);
  return (movement) =>
    (lines === null || lines.some((line) => isBehind(movement, line, kindOf))) &&
    (query.type === undefined || movement.typeCode === query.type) &&
    (query.kind === undefined || (movement.lateFor === null && kindOf(movement) === query.kind));
}

/** The lines asked for; null where none are, and so nothing is narrowed. */
function linesOf(content: StatementContent, query: Query): ContentLine[] | null {
  if (query.line !== undefined) {
    const line = content.lines.find((each) => each.id === query.line);
    if (!line) throw new Problem('not found');
    return [line];
  }
  if (query.component === undefined) return null;
  const month = query.corrects ?? content.month;
  return content.lines.filter((line) => line.component === query.component && line.accountMonth === month);
}

const kindBehind: Partial<Record<ContentLine['component'], ContentMovement['kind']>> = {
  'deposits asked': 'issued',
  'deposits released': 'returned',
  lost: 'lost',
  'found again': 'found',
  damage: 'damaged',
  cleaning: 'cleaned',
};

function isBehind(
  movement: ContentMovement,
  line: ContentLine,
  kindOf: (movement: ContentMovement) => string,
): boolean {
  if (line.correction) return line.correction.eventIds.includes(movement.id);
  if (movement.lateFor !== null || movement.typeCode !== line.typeCode) return false;
  // The daily fee follows from all that moved.
  if (line.component === 'daily fee') return movement.kind !== 'damaged' && movement.kind !== 'cleaned';
  return kindOf(movement) === kindBehind[line.component];
}

/** A correction stands with what it corrects. */
function kindsWithCorrections(movements: readonly ContentMovement[]): (movement: ContentMovement) => string {
  const kinds = new Map(movements.map((movement) => [movement.id, movement.kind]));
  return ({ kind, corrects }) => (corrects === null ? kind : (kinds.get(corrects) ?? kind));
}
