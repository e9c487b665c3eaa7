import { and, asc, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { multiply, roundToMinor, sum } from '@/shared/domain/money';

export type Valued = {
  companyId: string;
  currency: string;
  day: string;
  lines: readonly { typeCode: string; units: number }[];
};

/** Replacement value of each load by its partner's terms on its day, or by the type's own where there are none. */
export async function worthOfLines(db: Reader, loads: readonly Valued[]): Promise<string[]> {
  const types = [...new Set(loads.flatMap((load) => load.lines.map((line) => line.typeCode)))];
  if (types.length === 0) return loads.map((load) => roundToMinor('0', load.currency));
  const versions = await db
    .select()
    .from(terms)
    .where(
      and(
        inArray(terms.companyId, [...new Set(loads.map((load) => load.companyId))]),
        inArray(terms.typeCode, types),
      ),
    )
    .orderBy(asc(terms.validFrom));
  const own = await db
    .select({ code: containerTypes.code, replacement: containerTypes.replacement })
    .from(containerTypes)
    .where(inArray(containerTypes.code, types));
  const ownOf = new Map(own.map((type) => [type.code, type.replacement]));
  return loads.map(({ companyId, currency, day, lines }) => {
    const each = (typeCode: string): string =>
      versions.findLast(
        (version) =>
          version.companyId === companyId && version.typeCode === typeCode && version.validFrom <= day,
      )?.replacement ??
      ownOf.get(typeCode) ??
      '0';
    return roundToMinor(sum(lines.map((line) => multiply(each(line.typeCode), line.units))), currency);
  });
}
