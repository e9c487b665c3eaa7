import { mostRectangles } from './unit-load/most-rectangles';

/** Outer length and width, in whole millimetres. */
export interface Footprint {
  length: number;
  width: number;
}

/** Containers stacked by a fixed height: whole stacks, and what is left over beside them. */
export interface Stacks {
  stacks: number;
  rest: number;
}

/**
 * How many containers stand side by side on one layer of a pallet, none over the edge, each along or across.
 * Geometry alone: it says nothing of load or height. Refuses sides that are not whole millimetres, and a
 * container more than 200 times smaller than the pallet.
 */
export function unitsPerLayer(container: Footprint, pallet: Footprint): number {
  for (const side of [container.length, container.width, pallet.length, pallet.width]) {
    if (!Number.isInteger(side) || side < 1) throw new RangeError(`Not whole millimetres: ${side}`);
  }
  if (pallet.length * pallet.width > 200 * container.length * container.width) {
    throw new RangeError('The container is too small for this pallet');
  }
  return mostRectangles(container, pallet);
}

/** "n stacks of k": 100 in stacks of 8 are 12 stacks and 4 beside. Refuses what is not whole. */
export function stacks(units: number, unitsPerStack: number): Stacks {
  if (!Number.isSafeInteger(units) || units < 0) throw new RangeError(`Not whole containers: ${units}`);
  if (!Number.isSafeInteger(unitsPerStack) || unitsPerStack < 1) {
    throw new RangeError(`Not a height of a stack: ${unitsPerStack}`);
  }
  return { stacks: Math.floor(units / unitsPerStack), rest: units % unitsPerStack };
}
