import { dayNumber } from '../calendar';
import {
  type AssessmentCorrection,
  type AssessmentEvent,
  type AssessmentMovement,
  type MovementKind,
  movementKinds,
} from './input';
import { CannotAssess } from './refusal';

/** A movement at its corrected quantity (0 or more); `day` is a day number. */
export interface Movement {
  readonly id: string;
  readonly kind: MovementKind;
  readonly containerType: string;
  readonly day: number;
  readonly units: number;
}

/**
 * The movements as they are known now: each at its own day with all of its corrections, whatever their dates
 * (RULES 3.1). Refuses an id used twice, a correction of nothing or of another correction, of another type, and
 * one that leaves less than 0. Several corrections of one event are judged by their sum.
 */
export function correctedMovements(events: readonly AssessmentEvent[]): Movement[] {
  const changes = changesByEvent(events);
  const movements: Movement[] = [];
  for (const event of events) {
    if (event.kind === 'corrected') continue;
    const { id, kind, containerType } = event;
    const units = correctedUnits(event, changes.get(id));
    movements.push({ id, kind, containerType, day: dayNumber(event.date), units });
  }
  return movements;
}

function changesByEvent(events: readonly AssessmentEvent[]): Map<string, AssessmentCorrection[]> {
  const byId = new Map<string, AssessmentEvent>();
  for (const event of events) {
    if (byId.has(event.id)) refuse('id used twice', event.id, 'another event has the same id');
    byId.set(event.id, event);
  }
  const changes = new Map<string, AssessmentCorrection[]>();
  for (const event of events) {
    if (event.kind !== 'corrected') continue;
    const target = byId.get(event.corrects);
    if (!target || target.kind === 'corrected') {
      refuse('correction of nothing', event.id, `${event.corrects} is no movement that could be corrected`);
    } else if (target.containerType !== event.containerType) {
      refuse('correction of another type', event.id, `${event.corrects} moved ${target.containerType}`);
    }
    const known = changes.get(event.corrects);
    if (known) known.push(event);
    else changes.set(event.corrects, [event]);
  }
  return changes;
}

function correctedUnits(event: AssessmentMovement, changes: readonly AssessmentCorrection[] = []): number {
  const units = changes.reduce((sum, change) => sum + change.quantity, event.quantity);
  const last = changes.at(-1);
  if (units < 0 && last) refuse('corrected below zero', last.id, `leaves ${units} units of ${event.id}`);
  return units;
}

function refuse(code: CannotAssess['code'], eventId: string, because: string): never {
  throw new CannotAssess(code, { eventId, because });
}

const rank = new Map(movementKinds.map((kind, order) => [kind, order]));
/** RULES 3.2 within a day: issued, found, returned, damaged, cleaned, lost; within a kind as recorded. */
export function inOrder(movements: readonly Movement[]): Movement[] {
  // Array.sort is stable, so the order of recording stands within a kind.
  return [...movements].sort((a, b) => a.day - b.day || (rank.get(a.kind) ?? 0) - (rank.get(b.kind) ?? 0));
}
