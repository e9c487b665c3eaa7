import type { ContentLine } from '@/shared/domain/statement/content';
import { roundToMinor, sum } from '@/shared/domain/money';
import { lineTitle } from '@/shared/text/statement-words';

/** Lines of one component and account month: one row of the page. */
export type LineGroup = { key: string; title: string; lines: ContentLine[]; amount: string };

export function lineGroups(lines: readonly ContentLine[], currency: string): LineGroup[] {
  const groups = new Map<string, ContentLine[]>();
  for (const line of lines) {
    const key = line.credit ? line.id : `${line.accountMonth} ${line.component}`;
    groups.set(key, [...(groups.get(key) ?? []), line]);
  }
  return [...groups].flatMap(([key, own]) => {
    const [first] = own;
    if (!first) return [];
    const amount = roundToMinor(sum(own.map((line) => line.amount)), currency);
    return [{ key, title: lineTitle(first), lines: own, amount }];
  });
}
