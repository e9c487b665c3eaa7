// Below this many deliveries a lane has no habit to speak of, and the date window alone decides.
const ENOUGH = 20;
const RARE = 0.005;

/**
 * How long loads are on the way, learned from the deliveries that their references settled. A delivery
 * time that a lane does not know makes a candidate weaker, it never excludes one.
 */
export class UsualDays {
  private readonly lanes = new Map<string, Map<number, number>>();
  private readonly all = new Map<number, number>();

  learn(lane: string, days: number): void {
    const known = this.lanes.get(lane) ?? new Map<number, number>();
    this.lanes.set(lane, known);
    known.set(days, (known.get(days) ?? 0) + 1);
    this.all.set(days, (this.all.get(days) ?? 0) + 1);
  }

  /** Within what all but the rarest deliveries of the lane took. */
  isUsual(lane: string, days: number): boolean {
    const counts = this.countsOf(lane);
    if (!counts) return true;
    const total = totalOf(counts);
    const upTo = [...counts].reduce((sum, [d, n]) => sum + (d <= days ? n : 0), 0);
    const from = [...counts].reduce((sum, [d, n]) => sum + (d >= days ? n : 0), 0);
    const few = rareIn(total);
    return upTo > few && from > few;
  }

  /** Longer than all but the rarest deliveries of the lane took; null where no habit is known. */
  isTooLong(lane: string, days: number): boolean | null {
    const counts = this.countsOf(lane);
    if (!counts) return null;
    return [...counts].reduce((sum, [d, n]) => sum + (d >= days ? n : 0), 0) <= rareIn(totalOf(counts));
  }

  /** Share of the lane's deliveries that took this many days, never quite 0. */
  share(lane: string, days: number): number {
    const counts = this.countsOf(lane);
    if (!counts) return 1 / (2 + days);
    return ((counts.get(days) ?? 0) + 0.2) / (totalOf(counts) + 1);
  }

  private countsOf(lane: string): Map<number, number> | null {
    const own = this.lanes.get(lane);
    if (own && totalOf(own) >= ENOUGH) return own;
    return totalOf(this.all) >= ENOUGH ? this.all : null;
  }
}

/** One delivery alone makes no habit: it may be the very one that is looked at. */
const rareIn = (total: number): number => Math.max(1, RARE * total);

const totalOf = (counts: Map<number, number>): number => {
  let total = 0;
  for (const n of counts.values()) total += n;
  return total;
};
