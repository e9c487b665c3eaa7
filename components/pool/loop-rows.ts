import type { PoolLeg, SeenTimes, Stretch } from '@/shared/contracts/pool-sizing';
import { plannedDays } from '@/shared/domain/seen-loop';

export type LoopRow = {
  key: string;
  name: string;
  days: number;
  sd: number | null;
  seen: number | null;
  units: number;
  /** A line over several legs of one stretch, which the book can only see together. */
  together: boolean;
  /** Seen at least half a day longer than planned. */
  longer: boolean;
};

/** Half a working day more than planned is worth a word; less is noise of a short look. */
const worthSaying = 0.5;

type Loop = { legs: readonly PoolLeg[]; perDay: number; seen: SeenTimes };

/** The legs as lines, and after several legs of one stretch a line of what the book saw of them together. */
export function loopRows(
  { legs, perDay, seen }: Loop,
  nameTogether: (stretch: Stretch) => string,
): LoopRow[] {
  return legs.flatMap((leg, at) => {
    const together = legs.filter((each) => each.stretch === leg.stretch);
    const isLast = legs.findLastIndex((each) => each.stretch === leg.stretch) === at;
    const seenDays = seen.stretches.find((each) => each.stretch === leg.stretch)?.days ?? null;
    const days = Number(leg.days.mean);
    const row: LoopRow = {
      key: `${at}`,
      name: leg.name,
      days,
      sd: Number(leg.days.sd),
      seen: together.length === 1 ? seenDays : null,
      units: perDay * days,
      together: false,
      longer: together.length === 1 && isLonger(days, seenDays),
    };
    if (together.length === 1 || !isLast || seenDays === null) return [row];
    const planned = plannedDays(legs, leg.stretch);
    return [
      row,
      {
        key: `${at} together`,
        name: nameTogether(leg.stretch),
        days: planned,
        sd: null,
        seen: seenDays,
        units: perDay * planned,
        together: true,
        longer: isLonger(planned, seenDays),
      },
    ];
  });
}

const isLonger = (planned: number, seen: number | null) => seen !== null && seen - planned >= worthSaying;

/** The stretch that takes most longer than planned, and what that ties up; nothing if none does. */
export function longestOverrun({ legs, perDay, seen }: Loop) {
  const overruns = seen.stretches.flatMap(({ stretch, days }) => {
    const planned = plannedDays(legs, stretch);
    if (!legs.some((leg) => leg.stretch === stretch) || !isLonger(planned, days) || days === null) return [];
    return [{ stretch, days: days - planned, units: Math.round(perDay * (days - planned)) }];
  });
  return overruns.sort((a, b) => b.days - a.days)[0];
}
