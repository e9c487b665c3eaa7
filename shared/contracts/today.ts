import { z } from 'zod';
import { day } from '../domain/calendar';
import { id, instant, month } from './fields';
import { operation } from './operation';
import { shipmentRow } from './shipments';

const units = z.number().int();
export const moneyOf = z.object({ currency: z.string(), amount: z.string() });
export type MoneyOf = z.infer<typeof moneyOf>;

/** The most urgent ones, and how many there are in all. */
function worklist<Row extends z.ZodType>(row: Row) {
  return z.object({ total: z.number().int(), rows: z.array(row) });
}

const difference = z.object({
  id,
  shipmentId: id,
  reference: z.string(),
  from: z.string(),
  to: z.string(),
  typeName: z.string(),
  openUnits: units,
  openedOn: day,
  openDays: z.number().int(),
  atStake: moneyOf,
});

/** A difference on a shipment of the own company; what it is worth is the plant's to know. */
const ownDifference = difference.omit({ atStake: true, openDays: true });

const dispute = z.object({
  id,
  company: z.string(),
  reference: z.string().nullable(),
  typeName: z.string().nullable(),
  stated: units,
  claimed: units,
  lastWordAt: instant,
  held: moneyOf,
});

export const poolOfType = z.object({
  typeCode: z.string(),
  typeName: z.string(),
  fulls: units,
  empties: units,
  partners: units,
  plants: units,
  inQuestion: units,
  atStake: z.array(moneyOf),
  total: units,
  approved: units.nullable(),
});
export type PoolOfType = z.infer<typeof poolOfType>;

const runningShort = z.object({
  siteId: id,
  site: z.string(),
  companyId: id,
  company: z.string(),
  typeCode: z.string(),
  typeName: z.string(),
  there: units,
  /** Days of packing that what is at the site will last, by the parts kept for it. */
  days: z.number(),
});

const level = z.object({
  typeCode: z.string(),
  typeName: z.string(),
  /** The site whose level it is, or null for the size of the whole pool. */
  site: z.string().nullable(),
  there: units,
  minimum: units,
  maximum: units,
});

const statement = z.object({
  id,
  company: z.string(),
  month,
  due: moneyOf,
  objectionUntil: day.nullable(),
});

export const today = z.object({
  company: z.string(),
  day,
  timeZone: z.string(),
  toCount: worklist(shipmentRow).nullable(),
  overdue: worklist(shipmentRow).nullable(),
  holding: z.object({ held: units, atSites: units, sent: units, sentDiffers: units, toIt: units }).nullable(),
  runningShort: z.array(runningShort).nullable(),
  pool: z.object({ partners: z.number().int(), types: z.array(poolOfType) }).nullable(),
  differences: worklist(difference).nullable(),
  ownDifferences: z.array(ownDifference).nullable(),
  disputes: worklist(dispute).nullable(),
  levels: z.array(level).nullable(),
  months: z
    .object({
      toClose: z.array(month),
      drafts: z.array(z.object({ month, statements: z.number().int() })),
      disputed: z.object({ disputes: z.number().int(), held: z.array(moneyOf) }),
    })
    .nullable(),
  awaited: worklist(statement).nullable(),
  administration: z
    .object({
      invited: z.array(z.object({ id, name: z.string(), company: z.string(), since: instant })),
      failedLetters: z.number().int(),
      bookDiffers: z.boolean(),
    })
    .nullable(),
});
export type Today = z.infer<typeof today>;

export const readToday = operation({
  name: 'readToday',
  resource: 'today',
  method: 'GET',
  path: '/today',
  summary: 'What waits for this person, most urgent first, and where the units are',
  answer: today,
});
