import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { uniformInt } from 'pure-rand/distribution/uniformInt';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';

/** Draws of one seeded stream. */
export interface Draw {
  whole: (from: number, to: number) => number;
  chance: (share: number) => boolean;
  one: <T>(of: readonly T[]) => T;
  weighted: (weights: readonly number[]) => number;
}

export function drawFrom(seed: number): Draw {
  const stream = xoroshiro128plus(seed);
  const whole = (from: number, to: number) => uniformInt(stream, from, to);
  const one = <T>(of: readonly T[]): T => {
    const drawn = of[whole(0, of.length - 1)];
    if (drawn === undefined) throw new Error('nothing to draw from');
    return drawn;
  };
  const weighted = (weights: readonly number[]) => {
    let left = uniformFloat64(stream) * weights.reduce((sum, w) => sum + w, 0);
    const at = weights.findIndex((w) => (left -= w) < 0);
    return at < 0 ? weights.length - 1 : at;
  };
  return { whole, one, weighted, chance: (share) => uniformFloat64(stream) < share };
}

export function shuffled<T>(draw: Draw, all: readonly T[]): T[] {
  const rest = [...all];
  for (let at = rest.length - 1; at > 0; at -= 1) {
    const other = draw.whole(0, at);
    const [a, b] = [rest[at], rest[other]];
    if (a !== undefined && b !== undefined) [rest[at], rest[other]] = [b, a];
  }
  return rest;
}
