import { and, asc, desc, eq, gt, inArray, lt, or, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { people } from '@/db/schema/companies';
import { receiptMatches } from '@/db/schema/work';
import type { ImportMatch, MatchPaper, MatchState } from '@/shared/contracts/import-results';
import { cursor, cursorNumber, cutPage } from '../../http/page';
import type { KeptProblem } from './import-marks';
import type { MatchRow } from './post-group';
import { receiptPapers, shipmentPapers } from './read-papers';

type Asked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  state: MatchState;
  rule?: string | undefined;
};

/** Matches or suggestions of an import, the surest first; the key is score and group. */
export async function pageOfMatches(
  db: Reader,
  { importId, after, limit, state, rule }: Asked,
): Promise<{ rows: ImportMatch[]; next: string | null }> {
  const seen = cursor(after, 2);
  const heads = await db
    .selectDistinct({ groupId: receiptMatches.groupId, score: receiptMatches.score })
    .from(receiptMatches)
    .where(
      and(
        eq(receiptMatches.importId, importId),
        eq(receiptMatches.state, state),
        rule === undefined ? sql`${receiptMatches.rule} <> 'unannounced'` : eq(receiptMatches.rule, rule),
        seen ? behind({ score: cursorNumber(seen[0]), groupId: seen[1] }) : undefined,
      ),
    )
    .orderBy(desc(receiptMatches.score), asc(receiptMatches.groupId))
    .limit(limit + 1);
  const page = cutPage(heads, limit, ({ score, groupId }) => [String(score), groupId]);
  const groupIds = page.rows.map(({ groupId }) => groupId);
  return { rows: await described(db, groupIds), next: page.next };
}

const behind = ({ score, groupId }: { score: number; groupId: string }) =>
  or(
    lt(receiptMatches.score, score),
    and(eq(receiptMatches.score, score), gt(receiptMatches.groupId, groupId)),
  );

async function described(db: Reader, groupIds: readonly string[]): Promise<ImportMatch[]> {
  if (groupIds.length === 0) return [];
  const rows = await db
    .select({ pair: receiptMatches, decidedBy: people.name })
    .from(receiptMatches)
    .leftJoin(people, eq(people.id, receiptMatches.decidedBy))
    .where(inArray(receiptMatches.groupId, [...groupIds]));
  const ships = await shipmentPapers(
    db,
    rows.map(({ pair }) => pair.shipmentId),
  );
  const slips = await receiptPapers(
    db,
    rows.map(({ pair }) => pair.receiptId),
  );
  return groupIds.flatMap((groupId) => {
    const own = rows.filter(({ pair }) => pair.groupId === groupId);
    const [first] = own;
    if (!first) return [];
    const papers = {
      shipments: known(
        ships,
        own.map(({ pair }) => pair.shipmentId),
      ),
      receipts: known(
        slips,
        own.map(({ pair }) => pair.receiptId),
      ),
    };
    return [matchOf({ pair: first.pair, decidedBy: first.decidedBy, papers })];
  });
}

const known = (papers: Map<string, MatchPaper>, ids: readonly string[]): MatchPaper[] =>
  [...new Set(ids)].flatMap((id) => papers.get(id) ?? []);

type Sides = { shipments: MatchPaper[]; receipts: MatchPaper[] };
type Group = { pair: MatchRow; decidedBy: string | null; papers: Sides };

function matchOf({ pair, decidedBy, papers }: Group): ImportMatch {
  return {
    id: pair.groupId,
    state: pair.state as MatchState,
    rule: pair.rule,
    score: pair.score / 1000,
    why: pair.why,
    ...papers,
    differences: differencesBetween(papers),
    problem: pair.problem as KeptProblem | null,
    decidedBy,
  };
}

function differencesBetween({ shipments, receipts }: Sides): ImportMatch['differences'] {
  const declared = unitsByType(shipments);
  const counted = unitsByType(receipts);
  return [...new Set([...declared.keys(), ...counted.keys()])]
    .sort()
    .map((typeCode) => ({
      typeCode,
      declared: declared.get(typeCode) ?? 0,
      counted: counted.get(typeCode) ?? 0,
    }))
    .filter((line) => line.declared !== line.counted);
}

function unitsByType(papers: readonly MatchPaper[]): Map<string, number> {
  const sums = new Map<string, number>();
  for (const { lines } of papers)
    for (const { typeCode, units } of lines) sums.set(typeCode, (sums.get(typeCode) ?? 0) + units);
  return sums;
}
