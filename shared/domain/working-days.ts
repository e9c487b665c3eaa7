import { addDays, dayNumber } from './calendar';

/** Monday to Friday; day 0 of the day numbers, 1 January 1970, was a Thursday. Public holidays count as working days. */
export function isWeekday(day: string): boolean {
  return (((dayNumber(day) + 3) % 7) + 7) % 7 < 5;
}

/** Weekdays after `from`, up to and with `to`: Friday to Monday is 1, a day to itself 0. Refuses `to` before `from`. */
export function weekdaysBetween(from: string, to: string): number {
  const days = dayNumber(to) - dayNumber(from);
  if (days < 0) throw new RangeError(`${to} comes before ${from}`);
  const weeks = Math.floor(days / 7);
  let left = 0;
  for (let rest = 1; rest <= days % 7; rest += 1) {
    if (isWeekday(addDays(from, rest))) left += 1;
  }
  return weeks * 5 + left;
}
