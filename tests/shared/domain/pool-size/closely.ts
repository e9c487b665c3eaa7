/** Stands for one number within a share of its size, in toEqual. */
class Near {
  constructor(
    readonly value: number,
    readonly relative: number,
  ) {}

  asymmetricMatch(other: unknown): boolean {
    if (typeof other !== 'number') return false;
    return Math.abs(other - this.value) <= this.relative * Math.abs(this.value);
  }

  toString(): string {
    return `near ${this.value}`;
  }
}

export const near = (value: number, relative = 1e-9): number =>
  new Near(value, relative) as unknown as number;

/** The same shape with every number that is not whole taken within 1e-9 of its size. */
export function closely(value: unknown): unknown {
  if (typeof value === 'number') return Number.isInteger(value) ? value : near(value);
  if (Array.isArray(value)) return value.map(closely);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, closely(inner)]));
}
