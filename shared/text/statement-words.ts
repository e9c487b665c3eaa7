import type { AssessmentTerms } from '../domain/assessment';
import { compare, multiply, roundToMinor } from '../domain/money';
import type { ContentLine } from '../domain/statement/content';
import { formatAmount, formatUnits } from './format';
import { statements as words } from './en/statements';

export type WordContext = {
  currency: string;
  types: readonly { code: string; name: string; kind: string }[];
  terms: readonly AssessmentTerms[];
};

/** "Daily fee", or "Correction to March 2026: daily fee". */
export function lineTitle(line: Pick<ContentLine, 'component' | 'accountMonth' | 'correction'>): string {
  return line.correction === null
    ? words.component[line.component]
    : words.correctionTo(line.accountMonth, line.component);
}

/** What an amount was reckoned from, with the line's own figures. */
export function reckonedFrom(line: ContentLine, context: WordContext): string {
  if (line.correction) return line.correction.causes.join('; ') || words.reckoned.late;
  if (line.credit) return line.credit.reason;
  return byComponent[line.component](line, context);
}

/** All lines of one component together, as one row of the page shows them. */
export function reckonedTogether(lines: readonly ContentLine[], context: WordContext): string {
  const [first] = lines;
  if (!first) return '';
  if (first.correction) {
    const causes = [...new Set(lines.flatMap((line) => line.correction?.causes ?? []))];
    return causes.join('; ') || words.reckoned.late;
  }
  if (first.component === 'deposits released') {
    return words.reckoned.released(lines.map((line) => unitsOf(line, context)).join(', '));
  }
  return lines.map((line) => reckonedFrom(line, context)).join(', ');
}

/** The sum of a line written out with its own figures: "3 440 unit-days × 0.03 = 103.20". */
export function workedOut(line: ContentLine, context: WordContext): string {
  const amount = (of: string) => formatAmount(of, context.currency);
  if (line.correction) {
    return words.worked.difference(
      amount(line.correction.now),
      amount(line.correction.billed),
      amount(line.amount),
    );
  }
  if (line.rate !== null) {
    return words.worked.fee(formatUnits(line.quantity), amount(line.rate), amount(line.amount));
  }
  if (line.parts.length === 0) return `${unitsOf(line, context)}: ${amount(line.amount)}`;
  return line.parts
    .map(({ quantity, each, residual, deposit }) => {
      const total = roundToMinor(multiply(each, quantity), context.currency);
      const sum = words.worked.times(unitsOf({ ...line, quantity }, context), amount(each), amount(total));
      if (residual === undefined || deposit === undefined) return sum;
      return `${words.worked.less(amount(residual), amount(deposit), amount(each))}; ${sum}`;
    })
    .join('; ');
}

type Words = (line: ContentLine, context: WordContext) => string;

const byComponent: Record<ContentLine['component'], Words> = {
  'deposits asked': (line, context) => {
    if (line.parts.length === 0) return words.reckoned.asked(unitsOf(line, context));
    const filled = line.quantity - line.parts.reduce((sum, part) => sum + part.quantity, 0);
    const parts = eachAt(line, context);
    return filled > 0 ? `${parts}; ${words.reckoned.filled(filled)}` : parts;
  },
  'deposits released': (line, context) => words.reckoned.released(unitsOf(line, context)),
  'daily fee': (line, context) =>
    words.reckoned.fee(
      line.quantity,
      formatAmount(line.rate ?? '0', context.currency),
      freeDaysOf(line, context.terms),
    ),
  lost: (line, context) =>
    line.parts.length === 0
      ? words.reckoned.lost(unitsOf(line, context))
      : line.parts
          .map(({ quantity, each, residual, deposit }) =>
            words.reckoned.lostAt(unitsOf({ ...line, quantity }, context), residual ?? each, deposit ?? '0'),
          )
          .join(', '),
  'found again': (line, context) => words.reckoned.found(unitsOf(line, context)),
  damage: (line, context) => eachAt(line, context) || words.reckoned.fees(unitsOf(line, context)),
  cleaning: (line, context) => eachAt(line, context) || words.reckoned.fees(unitsOf(line, context)),
  credit: () => '',
};

const eachAt: Words = (line, context) =>
  line.parts
    .map(({ quantity, each }) =>
      words.reckoned.at(unitsOf({ ...line, quantity }, context), each, context.currency),
    )
    .join(', ');

/** "12 totes"; with the type's name where two types of one kind would read alike. */
export function unitsOf(
  { quantity, typeCode }: Pick<ContentLine, 'quantity' | 'typeCode'>,
  { types }: WordContext,
): string {
  const type = types.find((each) => each.code === typeCode);
  const alone = types.filter((each) => each.kind === type?.kind).length <= 1;
  const units = words.unitsOfKind(quantity, type?.kind ?? '');
  return alone || !type ? units : `${units} (${type.name})`;
}

/** The free days that went with a rate, where all terms of the type with that rate agree on them. */
function freeDaysOf(line: ContentLine, terms: readonly AssessmentTerms[]): number | null {
  const days = new Set(
    terms
      .filter(
        (each) => each.containerType === line.typeCode && compare(each.dailyFee, line.rate ?? '0') === 0,
      )
      .map((each) => each.freeDays),
  );
  const [only] = days;
  return days.size === 1 && only !== undefined ? only : null;
}
