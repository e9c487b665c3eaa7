export type CountedUnits = { typeCode: string; counted: number; damaged: number; dirty: number };
type Declaration = { id: string; lines: readonly { typeCode: string; declared: number }[] };

/** Adds up what several receipts say, by type. */
export function sumOfLines(lines: readonly CountedUnits[]): CountedUnits[] {
  const sums = new Map<string, CountedUnits>();
  for (const line of lines) {
    const held = sums.get(line.typeCode);
    if (!held) sums.set(line.typeCode, { ...line });
    else {
      held.counted += line.counted;
      held.damaged += line.damaged;
      held.dirty += line.dirty;
    }
  }
  return [...sums.values()];
}

/**
 * Divides counted units over shipments that came together, in the order given: each gets what it declared as long as
 * there is some, and the last of them bears what is too few or too many. Nothing is added or lost.
 */
export function allotUnits(
  declarations: readonly Declaration[],
  counted: readonly CountedUnits[],
): Map<string, CountedUnits[]> {
  const shares = new Map<string, CountedUnits[]>(declarations.map(({ id }) => [id, []]));
  const types = new Set([
    ...counted.map((line) => line.typeCode),
    ...declarations.flatMap(({ lines }) => lines.map((line) => line.typeCode)),
  ]);
  for (const typeCode of types) {
    const sum = counted.find((line) => line.typeCode === typeCode);
    const rest = { counted: 0, damaged: 0, dirty: 0, ...sum };
    declarations.forEach(({ id, lines }, at) => {
      const declared = lines.find((line) => line.typeCode === typeCode)?.declared;
      const isLast = at === declarations.length - 1;
      if (declared === undefined && !(isLast && rest.counted > 0)) return;
      const units = isLast ? rest.counted : Math.min(declared ?? 0, rest.counted);
      const share = {
        typeCode,
        counted: units,
        damaged: Math.min(units, rest.damaged),
        dirty: Math.min(units, rest.dirty),
      };
      rest.counted -= share.counted;
      rest.damaged -= share.damaged;
      rest.dirty -= share.dirty;
      shares.get(id)?.push(share);
    });
  }
  return shares;
}
