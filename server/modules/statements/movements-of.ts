import type { Database } from '@/db/client';
import type { QueryOf } from '@/shared/contracts/operation';
import type { listStatementMovements } from '@/shared/contracts/statements';
import type { ContentLine, ContentMovement, StatementContent } from '@/shared/domain/statement/content';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import type { Person } from '../../http/person';
import { visibleStatement } from './read-statement';

type Query = QueryOf<typeof listStatementMovements>;
type Asked = { id: string; person: Person; query: Query };

/** The movements behind a figure, from the statement's own content: what it was reckoned from, not what came later. */
export async function movementsPage(db: Database, { id, person, query }: Asked) {
  const { content } = await visibleStatement(db, { id, person });
  const wanted = content.movements.filter(filterOf(content, query));
  const after = cursor(query.after, 1);
  const from = after ? wanted.findIndex((movement) => movement.id === after[0]) + 1 : 0;
  return cutPage(wanted.slice(from, from + query.limit + 1), query.limit, (row) => [row.id]);
}

function filterOf(content: StatementContent, query: Query): (movement: ContentMovement) => boolean {
  const line = query.line === undefined ? undefined : lineOf(content, query.line);
  const kindOf = kindsWithCorrections(content.movements);
  return (movement) =>
    (line === undefined || isBehind(movement, line, kindOf)) &&
    (query.type === undefined || movement.typeCode === query.type) &&
    (query.kind === undefined || (movement.lateFor === null && kindOf(movement) === query.kind));
}

function lineOf(content: StatementContent, id: string): ContentLine {
  const line = content.lines.find((each) => each.id === id);
  if (!line) throw new Problem('not found');
  return line;
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
