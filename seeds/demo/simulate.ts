import { addDays, dayNumber } from '@/shared/domain/calendar';
import type { CountedLine } from '@/server/modules/shipments/count-shipment';
import type { Book, Underway } from './book';
import type { Draws } from './random';
import { type Lane, lanes } from './scenario-lanes';
import { settleOld } from './settle-old';

/** Monday is 1. Day 0 of the day numbers, 1 January 1970, was a Thursday. */
const weekdayOf = (day: string): number => ((dayNumber(day) + 3) % 7) + 1;

export type World = {
  book: Book;
  draws: Draws;
  /** Units that the demo's people believe they have, by site and type. */
  stock: Map<string, number>;
  underway: Underway[];
};

const stockKey = (site: string, typeCode: string): string => `${site} ${typeCode}`;
export const stockOf = (world: World, site: string, typeCode: string): number =>
  world.stock.get(stockKey(site, typeCode)) ?? 0;
export function changeStock(world: World, at: { site: string; typeCode: string }, by: number): void {
  const key = stockKey(at.site, at.typeCode);
  world.stock.set(key, (world.stock.get(key) ?? 0) + by);
}

/** One day of everybody's work: what arrives is counted, old differences are settled, trucks leave. */
export async function liveDay(world: World, day: string, calm: { settle: boolean }): Promise<void> {
  const weekday = weekdayOf(day);
  if (weekday > 5) return;
  await countArrivals(world, day);
  if (calm.settle) {
    await settleOld(world.book, world.draws, {
      today: day,
      openedBy: addDays(day, -world.draws.whole(2, 6)),
    });
  }
  for (const lane of lanes) {
    if (lane.out.includes(weekday)) await depart(world, { lane, day, outward: true });
    if (lane.back.includes(weekday)) await depart(world, { lane, day, outward: false });
  }
}

async function countArrivals(world: World, day: string): Promise<void> {
  const arrived = world.underway.filter((shipment) => shipment.arrivesOn <= day);
  if (arrived.length === 0) return;
  world.underway = world.underway.filter((shipment) => shipment.arrivesOn > day);
  await world.book.onDay(async (tx) => {
    for (const underway of arrived) {
      const isReturn = !['TARNBY', 'OSTREL'].includes(underway.fromSite);
      const lines = underway.lines.map((line) => countedLine(line, { draws: world.draws, isReturn }));
      await world.book.count(tx, { underway, on: day, lines });
      for (const line of lines)
        changeStock(world, { site: underway.toSite, typeCode: line.typeCode }, line.counted);
    }
  });
}

function countedLine(
  line: { typeCode: string; declared: number },
  { draws, isReturn }: { draws: Draws; isReturn: boolean },
): CountedLine {
  const miscount = draws.perMille(55) ? draws.whole(1, Math.max(1, Math.round(line.declared / 40))) : 0;
  const counted = Math.max(0, line.declared + (draws.perMille(180) ? miscount : -miscount));
  const damaged = isReturn && draws.perMille(60) ? draws.whole(1, 3) : 0;
  const dirty = isReturn && draws.perMille(120) ? draws.whole(1, Math.max(1, Math.round(counted / 12))) : 0;
  return {
    typeCode: line.typeCode,
    counted,
    damaged: Math.min(damaged, counted),
    dirty: Math.min(dirty, counted),
  };
}

type Departure = { lane: Lane; day: string; outward: boolean };

async function depart(world: World, { lane, day, outward }: Departure): Promise<void> {
  const [fromSite, toSite] = outward ? [lane.plant, lane.partner] : [lane.partner, lane.plant];
  const lines = lane.load
    .map(({ typeCode, units }) => ({
      typeCode,
      declared: Math.min(
        outward ? outwardUnits(lane, units, day) : backUnits(lane, units),
        stockOf(world, fromSite, typeCode),
      ),
    }))
    .filter((line) => line.declared > 0);
  if (lines.length === 0) return;
  const arrivesOn = nextWorkday(day, world.draws.perMille(150) ? 2 : 1);
  const sent = await world.book.onDay((tx) =>
    world.book.send(tx, { fromSite, toSite, leftOn: day, arrivesOn, lines }),
  );
  for (const line of lines) changeStock(world, { site: fromSite, typeCode: line.typeCode }, -line.declared);
  world.underway.push(sent);
}

/** Pallwick runs short each month end: half loads from the 22nd on. */
function outwardUnits(lane: Lane, units: number, day: string): number {
  return lane.partner === 'PALLWICK' && Number(day.slice(8)) >= 22 ? Math.round(units / 2) : units;
}

function backUnits(lane: Lane, units: number): number {
  return Math.round((units * lane.out.length * lane.returnsPerMille) / (1000 * lane.back.length));
}

export function nextWorkday(day: string, workdays: number): string {
  let next = day;
  for (let left = workdays; left > 0;) {
    next = addDays(next, 1);
    if (weekdayOf(next) <= 5) left -= 1;
  }
  return next;
}
