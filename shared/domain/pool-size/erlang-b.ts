/**
 * Erlang's loss formula for 0, 1, 2 … `most` containers: the share of shipments, arriving one at a time at
 * random, that finds every container out. `load` = shipments a day × mean days in the loop. It holds whatever
 * the distribution of the loop time. By the recursion B(0) = 1, B(n) = load B(n−1) ÷ (n + load B(n−1)).
 */
export function* erlangB(load: number, most: number): Generator<number, void, undefined> {
  let share = 1;
  yield share;
  for (let containers = 1; containers <= most; containers += 1) {
    const offered = load * share;
    share = offered / (containers + offered);
    yield share;
  }
}

/** The share that finds none with this many containers (RULES 7, fall-back share). */
export function fallbackShare(load: number, containers: number): number {
  let last = 1;
  for (const share of erlangB(load, containers)) last = share;
  return last;
}
