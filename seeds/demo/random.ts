import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { uniformInt } from 'pure-rand/distribution/uniformInt';

/** Draws that are the same at every run of the same seed. */
export type Draws = {
  /** A whole number from `low` to `high`, both included. */
  whole: (low: number, high: number) => number;
  /** True in so many of a thousand draws. */
  perMille: (share: number) => boolean;
  oneOf: <Item>(items: readonly Item[]) => Item;
};

export function drawsFrom(seed: number): Draws {
  const generator = xoroshiro128plus(seed);
  const whole = (low: number, high: number): number => uniformInt(generator, low, high);
  return {
    whole,
    perMille: (share) => whole(0, 999) < share,
    oneOf: (items) => {
      const item = items[whole(0, items.length - 1)];
      if (item === undefined) throw new Error('nothing to draw from');
      return item;
    },
  };
}
