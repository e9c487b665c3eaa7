import { addDays } from '@/shared/domain/calendar';
import type { ReconciliationInput } from '@/shared/domain/reconciliation';
import { type Draw, drawFrom, shuffled } from './reconcile-draw';
import { cutInTwo, joinReferences, type Line, merged, miscount, mistype, restyle } from './reconcile-spoil';
import {
  FIRST_DAY,
  LAST_DAY,
  makeShipments,
  makeWorld,
  DAYS,
  type Shipment,
  type World,
} from './reconcile-world';

/** A made-up month and the truth about it (RULES 5, its measure). */
export interface Month {
  input: ReconciliationInput;
  truth: { pairs: [shipment: string, receipt: string][]; duplicates: string[] };
}

interface Slip {
  ref: string | null;
  from: string;
  to: string;
  date: string;
  lines: Line[];
  of: string[];
  double: boolean;
}

export interface MonthSettings {
  seed: number;
  shipments: number;
  lanes: number;
}

export function makeMonth({ seed, shipments: count, lanes }: MonthSettings): Month {
  const draw = drawFrom(seed);
  const world = makeWorld(draw, lanes);
  const { shipments, nextRef } = makeShipments(draw, world, count);
  const slips = receiveAll(draw, world, shipments);
  for (let n = 0; n < count; n += 1) if (draw.chance(0.003)) slips.push(unannounced(draw, world, nextRef));
  const counted = slips
    .filter(({ date }) => date <= LAST_DAY)
    .sort((a, b) => (a.date < b.date ? -1 : a.date > b.date ? 1 : 0));
  const receipts = counted.map((slip, at) => ({ slip, id: `R${at + 1}` }));
  const listed = receipts.map(({ id, slip: { ref, from, to, date, lines } }) => ({
    id,
    ref,
    from,
    to,
    date,
    lines,
  }));
  return {
    input: {
      asOf: LAST_DAY,
      windowDays: 10,
      overdueAfterDays: 7,
      shipments: shuffled(draw, shipments),
      receipts: shuffled(draw, listed),
    },
    truth: {
      pairs: receipts.flatMap(({ id, slip }) =>
        slip.double ? [] : slip.of.map((s): [string, string] => [s, id]),
      ),
      duplicates: receipts.filter(({ slip }) => slip.double).map(({ id }) => id),
    },
  };
}

/** What became of each shipment: counted whole, in two parts, together with another, or never. */
function receiveAll(draw: Draw, world: World, shipments: readonly Shipment[]): Slip[] {
  const slips: Slip[] = [];
  const alone = new Map<string, Shipment>();
  for (const shipment of shipments) {
    const lane = `${shipment.from} ${shipment.to}`;
    const waiting = alone.get(lane);
    if (waiting) {
      alone.delete(lane);
      slips.push(...receive(draw, world, [waiting, shipment]));
    } else if (draw.chance(0.003)) alone.set(lane, shipment);
    else if (!draw.chance(0.004)) slips.push(...receive(draw, world, [shipment]));
  }
  for (const shipment of alone.values()) slips.push(...receive(draw, world, [shipment]));
  return slips;
}

function receive(draw: Draw, world: World, loads: Shipment[]): Slip[] {
  const last = loads.at(-1);
  if (!last) return [];
  const lines = merged(loads.flatMap((load) => load.lines));
  const whole = loads.length === 1 && draw.chance(0.01) ? cutInTwo(draw, lines) : [lines];
  const parts = whole.filter((part) => part.length > 0);
  let date = addDays(last.date, draw.weighted(world.onTheWay));
  return parts.flatMap((part, at) => {
    if (at > 0) date = addDays(date, draw.whole(0, 2));
    const slip = {
      ref: writeRef(draw, loads),
      ...bookedAt(draw, world, last),
      date,
      lines: miscount(draw, part, world.types),
      of: loads.map(({ id }) => id),
      double: false,
    };
    // Half of a load entered twice is not told from two halves: RULES 5 calls that a split delivery.
    const covers = parts.length === 1 && slip.ref !== null;
    return covers && draw.chance(0.004) ? [slip, enteredAgain(draw, slip)] : [slip];
  });
}

/** 2 % mistyped, 3 % missing, 15 % in another style. */
function writeRef(draw: Draw, [first, second]: Shipment[]): string | null {
  if (!first) return null;
  const style = (ref: string) => (draw.chance(0.15) ? restyle(draw, ref) : ref);
  const text = second ? joinReferences(draw, style(first.ref), style(second.ref)) : style(first.ref);
  if (draw.chance(0.03)) return null;
  return draw.chance(0.02) ? mistype(draw, text) : text;
}

function bookedAt(draw: Draw, world: World, { from, to }: Shipment): { from: string; to: string } {
  if (!draw.chance(0.003)) return { from, to };
  const other = (site: string) => world.plants.find((plant) => plant !== site) ?? site;
  return world.plants.includes(to) ? { from, to: other(to) } : { from: other(from), to };
}

const enteredAgain = (draw: Draw, slip: Slip): Slip => ({
  ...slip,
  ref: slip.ref !== null && slip.of.length === 1 && draw.chance(0.3) ? restyle(draw, slip.ref) : slip.ref,
  date: addDays(slip.date, draw.whole(0, 1)),
  double: true,
});

function unannounced(draw: Draw, world: World, nextRef: (from: string) => string): Slip {
  const { from, to, standing } = draw.one(world.lanes);
  const lines = draw.chance(0.5) ? standing : [{ type: draw.one(world.types), quantity: draw.whole(4, 200) }];
  const ref = draw.one([null, nextRef(from), `${draw.whole(100_000, 999_999)}`]);
  const date = addDays(FIRST_DAY, draw.whole(0, DAYS - 1));
  return { ref, from, to, date, lines: lines.map((line) => ({ ...line })), of: [], double: false };
}
