/**
 * The next whole number at or above a computed value. 1e-9 is taken off first (RULES 7), so that what
 * floating point leaves behind a whole number does not cost a container: 2000 × 0.1 × 1.1 ÷ 22 is 10.
 */
export function roundUp(value: number): number {
  return Math.max(0, Math.ceil(value - 1e-9));
}
