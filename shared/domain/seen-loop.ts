/** What the loop's legs and the seen stretches have in common here: a stretch of the circuit, days as text. */
interface Leg {
  stretch: string;
  days: { mean: string; sd: string };
}
interface Seen {
  stretch: string;
  days: number | null;
  sd: number | null;
}

/** Days planned for a stretch: the sum of its legs' means, in working days. */
export function plannedDays(legs: readonly Leg[], stretch: string): number {
  return legs.filter((leg) => leg.stretch === stretch).reduce((days, leg) => days + Number(leg.days.mean), 0);
}

/**
 * The legs with the days that the book saw. Where several legs share a stretch, its days are spread over them as
 * planned (evenly if all are planned at 0). The spread of a way is taken where its stretch is one leg; other
 * spreads stay, since a stock shows its average only. Days are written with two decimals.
 */
export function withSeenDays<One extends Leg>(legs: readonly One[], seen: readonly Seen[]): One[] {
  return legs.map((leg) => {
    const there = seen.find((each) => each.stretch === leg.stretch);
    if (!there || there.days === null) return leg;
    const together = legs.filter((each) => each.stretch === leg.stretch);
    const planned = plannedDays(legs, leg.stretch);
    const share = planned > 0 ? Number(leg.days.mean) / planned : 1 / together.length;
    const mean = written(there.days * share);
    const sd = there.sd !== null && together.length === 1 ? written(there.sd) : leg.days.sd;
    return { ...leg, days: { mean, sd: mean === '0' ? '0' : sd } };
  });
}

const written = (days: number) => String(Math.round(days * 100) / 100);
