import type { LineDifference } from './output';

/** Units by container type, types in ascending order, each once and above 0. */
export interface Contents {
  lines: readonly (readonly [type: string, units: number])[];
  units: number;
  /** Equal for equal contents. */
  signature: string;
}

/** How alike two contents are: 0 the same, 1 a few units apart, 2 like, 3 unlike. */
export type Likeness = 0 | 1 | 2 | 3;

// Common practice, no source: a miscount is by a few units and leaves nine tenths of the load as declared.
const A_FEW = 10;
const BARELY_CHANGED = 0.9;
const LIKE = 0.7;

const byType = (a: readonly [string, number], b: readonly [string, number]) =>
  a[0] < b[0] ? -1 : a[0] > b[0] ? 1 : 0;

export function contentsOf(lines: { type: string; quantity: number }[]): Contents {
  const units = new Map<string, number>();
  for (const { type, quantity } of lines) units.set(type, (units.get(type) ?? 0) + quantity);
  return fromUnits(units);
}

export function sumOf(parts: readonly Contents[]): Contents {
  if (parts.length === 1 && parts[0]) return parts[0];
  const units = new Map<string, number>();
  for (const part of parts) for (const [type, n] of part.lines) units.set(type, (units.get(type) ?? 0) + n);
  return fromUnits(units);
}

function fromUnits(units: Map<string, number>): Contents {
  const lines = [...units].sort(byType);
  const total = lines.reduce((sum, [, n]) => sum + n, 0);
  return { lines, units: total, signature: JSON.stringify(lines) };
}

/** Declared and counted units of each type in either, in the order of the types. */
function sideBySide(declared: Contents, counted: Contents): [string, number, number][] {
  const rows = new Map<string, [string, number, number]>();
  for (const [type, n] of declared.lines) rows.set(type, [type, n, 0]);
  for (const [type, n] of counted.lines) rows.set(type, [type, rows.get(type)?.[1] ?? 0, n]);
  return [...rows.values()].sort((a, b) => byType([a[0], 0], [b[0], 0]));
}

/** Units by which two contents differ, over all types, more and fewer added up. */
export function unitsApart(a: Contents, b: Contents): number {
  if (a.signature === b.signature) return 0;
  return sideBySide(a, b).reduce((sum, [, x, y]) => sum + Math.abs(x - y), 0);
}

/** A wrong type leaves contents like when another line agrees. */
export function likenessOf(a: Contents, b: Contents): Likeness {
  if (a.signature === b.signature) return 0;
  const shared = 1 - LIKE;
  if (Math.abs(a.units - b.units) > shared * Math.max(a.units, b.units)) return 3;
  const rows = sideBySide(a, b);
  const apart = rows.reduce((sum, [, x, y]) => sum + Math.abs(x - y), 0);
  const share = 1 - (2 * apart) / (a.units + b.units + apart);
  const miscounted = apart <= A_FEW && rows.every(([, x, y]) => x > 0 && y > 0);
  if (share >= LIKE) return miscounted && share >= BARELY_CHANGED ? 1 : 2;
  return rows.some(([, x, y]) => x === y) && oneTypeWrong(a, b) ? 2 : 3;
}

/** What of the declared was not counted, or null when more of some type was counted than declared. */
export function restOf(declared: Contents, counted: Contents): Contents | null {
  const rest = new Map<string, number>();
  for (const [type, x, y] of sideBySide(declared, counted)) {
    if (y > x) return null;
    if (x > y) rest.set(type, x - y);
  }
  return fromUnits(rest);
}

/** All units of one type were booked under another, which may hold units of its own. */
export function oneTypeWrong(declared: Contents, counted: Contents): boolean {
  if (declared.units !== counted.units) return false;
  const changed = sideBySide(declared, counted).filter(([, x, y]) => x !== y);
  return changed.length === 2 && changed.some(([, x, y]) => x > 0 && y === 0);
}

export const differencesOf = (declared: Contents, counted: Contents): LineDifference[] =>
  sideBySide(declared, counted)
    .filter(([, x, y]) => x !== y)
    .map(([type, x, y]) => ({ type, declared: x, counted: y, difference: y - x }));
