import type { LineComponent } from '@/shared/domain/statement';
import { text } from '@/shared/text/catalogue';
import { lineTitle } from '@/shared/text/statement-words';
import type { StatementPage } from './StatementScreen';

const words = text.statements;

/** Which figure the movements stand behind, in words: "Deposits asked", "Tote 600×400×280, returned". */
export function behindWords(page: StatementPage, query: Record<string, string>): string {
  const { lines, types } = page.content;
  const nameOf = (code: string | null) => types.find((type) => type.code === code)?.name ?? code ?? '';
  const line = lines.find((each) => each.id === query['line']);
  if (line) return `${lineTitle(line)}, ${nameOf(line.typeCode)}`;
  const component = query['component'] as LineComponent | undefined;
  if (component) {
    const month = query['corrects'];
    return month ? words.correctionTo(month, component) : words.component[component];
  }
  const kind = query['kind'] as keyof typeof words.kind | undefined;
  const what = query['before'] ? words.movements.before : kind ? words.kind[kind] : words.movements.all;
  return query['type'] ? `${nameOf(query['type'])}, ${what}` : what;
}
