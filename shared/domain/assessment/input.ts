import { z } from 'zod';

import { day } from '../calendar';
import { compare, nonNegativeDecimal } from '../money';
import { positiveUnits, signedUnits } from '../quantity';
import { CannotAssess } from './refusal';

const name = z.string().min(1).max(200);
const days = z.int().min(0).max(100_000);

export const movementKinds = ['issued', 'found', 'returned', 'damaged', 'cleaned', 'lost'] as const;
export type MovementKind = (typeof movementKinds)[number];

/** Terms of one container type, in force from `validFrom` until the next ones; amounts per unit. */
export const assessmentTerms = z.object({
  containerType: name,
  validFrom: day,
  deposit: nonNegativeDecimal,
  replacement: nonNegativeDecimal,
  freeDays: days,
  dailyFee: nonNegativeDecimal,
  lostAfterDays: days.nullable(),
  usefulLifeMonths: z.int().min(1).max(100_000),
  residualFloorPct: nonNegativeDecimal.refine((percent) => compare(percent, '100') <= 0),
  damageFee: nonNegativeDecimal,
  cleaningFee: nonNegativeDecimal,
  recoveryDays: days,
});

const movement = z.object({
  id: name,
  date: day,
  containerType: name,
  kind: z.enum(movementKinds),
  quantity: positiveUnits,
});

const correction = z.object({
  id: name,
  date: day,
  containerType: name,
  kind: z.literal('corrected'),
  corrects: name,
  quantity: signedUnits,
});

export const assessmentEvent = z.discriminatedUnion('kind', [movement, correction]);

/** RULES 3, Input. `from` and `to` are both inside the period. */
export const assessmentInput = z.object({
  currency: z.string(),
  from: day,
  to: day,
  terms: z.array(assessmentTerms),
  containerTypes: z.array(z.object({ code: name, inServiceFrom: day })),
  events: z.array(assessmentEvent),
});

export type AssessmentTerms = z.infer<typeof assessmentTerms>;
export type AssessmentEvent = z.infer<typeof assessmentEvent>;
export type AssessmentMovement = z.infer<typeof movement>;
export type AssessmentCorrection = z.infer<typeof correction>;
export type AssessmentInput = z.infer<typeof assessmentInput>;

/** The parsed input; refuses with the event's id where the fault stands in an event. */
export function parseInput(raw: unknown): AssessmentInput {
  const parsed = assessmentInput.safeParse(raw);
  if (parsed.success) return parsed.data;
  const issue = parsed.error.issues[0];
  const path = issue?.path ?? [];
  const because = `${path.join('.') || 'input'}: ${issue?.message ?? 'not understood'}`;
  const atQuantity = path[0] === 'events' && path[2] === 'quantity';
  const code = atQuantity ? 'quantity not whole and positive' : 'input not understood';
  throw new CannotAssess(code, { eventId: idAt(raw, path), because });
}

function idAt(raw: unknown, path: readonly PropertyKey[]): string | null {
  if (path[0] !== 'events' || typeof path[1] !== 'number') return null;
  const event: unknown = (raw as { events: unknown[] }).events[path[1]];
  if (typeof event === 'object' && event !== null && 'id' in event && typeof event.id === 'string')
    return event.id;
  return `number ${path[1] + 1}`;
}
