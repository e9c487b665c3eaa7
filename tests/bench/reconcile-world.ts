import { addDays } from '@/shared/domain/calendar';
import type { Draw } from './reconcile-draw';
import type { Line } from './reconcile-spoil';

export interface Shipment {
  id: string;
  ref: string;
  from: string;
  to: string;
  date: string;
  lines: Line[];
}

export interface Lane {
  from: string;
  to: string;
  standing: Line[];
  share: number;
}

export interface World {
  lanes: Lane[];
  plants: string[];
  types: string[];
  /** Weights of 0, 1, 2 … days on the way. */
  onTheWay: number[];
}

export const FIRST_DAY = '2026-03-01';
export const DAYS = 31;
export const LAST_DAY = addDays(FIRST_DAY, DAYS - 1);

const TYPES = ['TOTE-S', 'TOTE-L', 'LID', 'PALLET', 'BOX', 'RACK'];

const loadOf = (draw: Draw): Line[] => {
  const count = 1 + draw.weighted([5, 3, 1.5, 0.5]);
  const rest = [...TYPES];
  return Array.from({ length: count }, () => {
    const type = rest.splice(draw.whole(0, rest.length - 1), 1)[0] ?? 'BOX';
    const step = draw.one([1, 4, 8]);
    return { type, quantity: step * draw.whole(type === 'RACK' ? 4 : 6, 50) };
  });
};

/** Two plants, and partners that exchange fulls and empties with one or both of them. */
export function makeWorld(draw: Draw, laneCount: number): World {
  const plants = ['TARNBY', 'OSTREL'];
  const lanes: Lane[] = [];
  for (let n = 1; lanes.length < laneCount; n += 1) {
    const partner = `PARTNER ${n}`;
    for (const plant of draw.chance(0.6) ? plants : [draw.one(plants)])
      for (const [from, to] of [
        [partner, plant],
        [plant, partner],
      ] as const)
        lanes.push({ from, to, standing: loadOf(draw), share: draw.whole(5, 20) });
  }
  const onTheWay = Array.from({ length: 5 }, () => draw.whole(1, 10));
  return { lanes: lanes.slice(0, laneCount), plants, types: TYPES, onTheWay };
}

interface Pad {
  prefix: string;
  width: number;
  next: number;
}

const padOf = (draw: Draw): Pad => ({
  prefix: draw.one(['EM-', 'DN-', 'LS', 'R-', '', '']),
  width: draw.one([0, 0, 6, 8]),
  next: draw.one([draw.whole(1, 5000), draw.whole(80_000, 99_000), draw.whole(100_000, 900_000)]),
});

const write = ({ prefix, width }: Pad, number: number) => prefix + String(number).padStart(width, '0');

/** Shipments of a month in order; each sender tears its references off one pad, some sheets go elsewhere. */
export function makeShipments(
  draw: Draw,
  world: World,
  count: number,
): { shipments: Shipment[]; nextRef: (from: string) => string } {
  const pads = new Map<string, Pad>();
  const nextRef = (from: string) => {
    const pad = pads.get(from) ?? padOf(draw);
    pads.set(from, pad);
    pad.next += draw.chance(0.1) ? draw.whole(2, 4) : 1;
    return write(pad, pad.next);
  };
  const shares = world.lanes.map(({ share }) => share);
  const shipments = Array.from({ length: count }, (_, at): Shipment => {
    const lane = world.lanes[draw.weighted(shares)] ?? world.lanes[0];
    if (!lane) throw new Error('a world without lanes');
    const date = addDays(FIRST_DAY, Math.floor((at / count) * DAYS));
    const lines = draw.chance(0.5) ? lane.standing : loadOf(draw);
    const copy = lines.map((line) => ({ ...line }));
    return { id: `S${at + 1}`, ref: nextRef(lane.from), from: lane.from, to: lane.to, date, lines: copy };
  });
  return { shipments, nextRef };
}
