/** Geometry of the circuit, in px. The loop keeps its height; its straights grow with the width. */
export const loop = { height: 280, top: 78, bottom: 206, side: 150 } as const;

const thinnest = 6;
const thickest = 46;

/** Thickness by the root of the units, so that a stretch with four times the units is twice as thick; 0 stays a hairline. */
export function thickness(units: number, most: number): number {
  if (units <= 0 || most <= 0) return 1;
  return Math.max(thinnest, Math.round(thickest * Math.sqrt(units / most)));
}

export type LoopPaths = {
  partners: string;
  full: string;
  plants: string;
  empty: string;
  question: { x: number; y: number };
};

/** The four stretches of a loop drawn in a box of this width; `question` is where the block on the lower straight sits. */
export function loopPaths(width: number): LoopPaths {
  const radius = (loop.bottom - loop.top) / 2;
  const left = loop.side;
  const right = Math.max(left + 200, width - loop.side);
  return {
    partners: `M${left} ${loop.top} A${radius} ${radius} 0 0 0 ${left} ${loop.bottom}`,
    full: `M${left} ${loop.top} L${right} ${loop.top}`,
    plants: `M${right} ${loop.top} A${radius} ${radius} 0 0 1 ${right} ${loop.bottom}`,
    empty: `M${right} ${loop.bottom} L${left} ${loop.bottom}`,
    question: { x: left + (right - left) * 0.56, y: loop.bottom },
  };
}
