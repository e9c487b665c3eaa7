import type { AssessmentEvent } from '../assessment';
import { monthOf } from '../calendar';

/** An event by the month it bears on: a correction bears on the month of the event that it corrects (RULES 3.1). */
export type DatedEvent = { id: string; typeCode: string; month: string };

export function datedEvents(events: readonly AssessmentEvent[]): DatedEvent[] {
  const days = new Map(events.map((event) => [event.id, event.date]));
  return events.map((event) => ({
    id: event.id,
    typeCode: event.containerType,
    month: monthOf(event.kind === 'corrected' ? (days.get(event.corrects) ?? event.date) : event.date),
  }));
}

/** Bears on a month before this one and stands in no earlier statement: the cause of corrections. */
export function lateEvents(
  events: readonly DatedEvent[],
  { month, stated }: { month: string; stated: ReadonlySet<string> },
): DatedEvent[] {
  return events.filter((event) => event.month < month && !stated.has(event.id));
}

/** Of the late events those that can have changed a type's figures in a month: of the type, in it or before it. */
export function causesOf(
  late: readonly DatedEvent[],
  { accountMonth, typeCode }: { accountMonth: string; typeCode: string | null },
): string[] {
  return late
    .filter((event) => event.typeCode === typeCode && event.month <= accountMonth)
    .map((event) => event.id);
}
