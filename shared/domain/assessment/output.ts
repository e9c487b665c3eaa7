import { z } from 'zod';

import { decimalString } from '../money';
import { wholeUnits } from '../quantity';

const amount = decimalString;
const balance = z.int();

export const ageBands = ['0-14', '15-30', '31-60', '61-90', 'over 90'] as const;
export type AgeBand = (typeof ageBands)[number];

/** RULES 3, Output: one line per container type; amounts with all of the currency's decimals. */
export const assessmentLine = z.object({
  containerType: z.string(),
  units: z.object({
    opening: balance,
    issued: balance,
    returned: balance,
    lost: balance,
    found: balance,
    closing: balance,
    overReturned: balance,
  }),
  deposit: z.object({
    opening: amount,
    charged: amount,
    released: amount,
    forfeited: amount,
    reinstated: amount,
    closing: amount,
  }),
  charges: z.object({
    dwell: z.object({
      lines: z.array(z.object({ unitDays: balance, rate: amount, amount })),
      unitDays: balance,
      amount,
    }),
    loss: z.object({ units: balance, recovered: amount, amount }),
    damage: z.object({ units: balance, amount }),
    cleaning: z.object({ units: balance, amount }),
  }),
  ages: z.partialRecord(z.enum(ageBands), wholeUnits),
});

export const assessmentTotals = z.object({
  depositChange: amount,
  dwell: amount,
  loss: amount,
  damage: amount,
  cleaning: amount,
  payable: amount,
});

export const assessment = z.object({
  currency: z.string(),
  from: z.string(),
  to: z.string(),
  lines: z.array(assessmentLine),
  totals: assessmentTotals,
});

export type AssessmentLine = z.infer<typeof assessmentLine>;
export type AssessmentTotals = z.infer<typeof assessmentTotals>;
export type Assessment = z.infer<typeof assessment>;
