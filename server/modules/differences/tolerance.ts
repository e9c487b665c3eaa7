import { compare, multiply } from '@/shared/domain/money';

type Rule = { toleranceUnits: number; tolerancePct: string };

/** At or under the partner's tolerance in units, or in percent of what was declared (RULES 6). */
export function isWithinTolerance(line: { declared: number; counted: number }, rule: Rule): boolean {
  const units = Math.abs(line.counted - line.declared);
  return (
    units <= rule.toleranceUnits ||
    compare(String(units * 100), multiply(rule.tolerancePct, line.declared)) <= 0
  );
}
