import { z } from 'zod';

import { assessmentTerms, movementKinds } from '../assessment/input';
import { assessment } from '../assessment/output';
import { day, month } from '../calendar';
import { decimalString } from '../money';
import { lineComponents } from './components';

/** Everything that a statement says, as it is stored, hashed, shown and written into its workbook. */

const amount = decimalString;
const component = z.enum(lineComponents);

export const contentLine = z.object({
  id: z.string(),
  component,
  accountMonth: month,
  typeCode: z.string().nullable(),
  quantity: z.int(),
  rate: amount.nullable(),
  amount,
  parts: z.array(
    z.object({ quantity: z.int(), each: amount, residual: amount.optional(), deposit: amount.optional() }),
  ),
  correction: z
    .object({
      billed: amount,
      now: amount,
      /** In words, one for each event behind it that has any; empty where none is known. */
      causes: z.array(z.string()),
      eventIds: z.array(z.string()),
    })
    .nullable(),
  credit: z.object({ id: z.string(), reason: z.string(), of: component.nullable() }).nullable(),
});

export const contentMovement = z.object({
  id: z.string(),
  date: day,
  typeCode: z.string(),
  kind: z.enum([...movementKinds, 'corrected']),
  quantity: z.int(),
  /** The movement that it corrects. */
  corrects: z.string().nullable(),
  reference: z.string().nullable(),
  shipmentId: z.string().nullable(),
  cause: z.string(),
  /** The closed month before this one on which it bears; null for a movement of the month itself. */
  lateFor: month.nullable(),
});

export const contentDifference = z.object({
  id: z.string(),
  shipmentId: z.string(),
  reference: z.string(),
  typeCode: z.string(),
  declared: z.int(),
  counted: z.int(),
  openUnits: z.int(),
  atStake: amount,
  openedOn: day,
});

export const taxRow = z.object({
  rate: amount,
  treatment: z.enum(['excluded', 'included']),
  fees: amount,
  deposits: amount,
  base: amount,
  tax: amount,
});

export const statementContent = z.object({
  version: z.literal(1),
  number: z.string(),
  month,
  from: day,
  to: day,
  currency: z.string(),
  operator: z.object({ name: z.string() }),
  partner: z.object({
    id: z.string(),
    code: z.string(),
    name: z.string(),
    address: z.string().nullable(),
    taxRate: amount,
    taxTreatment: z.enum(['excluded', 'included']),
    objectionDays: z.int(),
  }),
  types: z.array(z.object({ code: z.string(), name: z.string(), kind: z.string() })),
  terms: z.array(assessmentTerms),
  assessment,
  lines: z.array(contentLine),
  forfeits: z.array(z.object({ accountMonth: month, typeCode: z.string(), amount })),
  taxRows: z.array(taxRow),
  payable: amount,
  tax: amount,
  total: amount,
  movements: z.array(contentMovement),
  openDifferences: z.array(contentDifference),
});

export type StatementContent = z.infer<typeof statementContent>;
export type ContentLine = z.infer<typeof contentLine>;
export type ContentMovement = z.infer<typeof contentMovement>;
export type ContentDifference = z.infer<typeof contentDifference>;
