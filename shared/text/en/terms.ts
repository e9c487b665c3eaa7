import { formatDay, formatDecimal, formatMonth, formatUnits } from '../format';
import { plural } from '../plural';

const days = (count: number) => `${formatUnits(count)} ${plural(count, { one: 'day', other: 'days' })}`;

export const terms = {
  head: 'Terms',
  lead: 'What each partner pays for which container, and from when.',
  partner: 'Partner',
  currency: 'Currency',
  tax: 'Tax',
  taxAt: (rate: string) => `${formatDecimal(rate)} %`,
  types: 'Types with terms',
  without: (types: readonly string[]) => `No terms: ${types.join(', ')}`,
  complete: 'complete',
  nextChange: 'Next change',
  search: 'Partner',
  empty: 'No partners yet',
  emptyHint: 'An administrator adds partners; their terms stand here.',
  partnerHead: (name: string) => `Terms of ${name}`,
  ownHead: 'Our terms',
  settingsHead: 'For the partner as a whole',
  settingHeads: { what: 'What', value: 'How it stands' },
  change: 'Change',
  days,
  toleranceOf: (units: number, pct: string) =>
    `${formatUnits(units)} ${plural(units, { one: 'unit', other: 'units' })} or ${formatDecimal(pct)} %`,
  treatment: {
    excluded: 'Deposits left out of the taxable amount, which is adjusted when a container is not returned',
    included: 'Deposits in the taxable amount, which is adjusted when a container is returned',
  },
  treatmentSource: 'The two treatments of Council Directive 2006/112/EC, article 92.',
  caution:
    'Tax on deposits differs by country. Ask a licensed adviser which treatment holds for this partner.',
  set: 'Set new terms',
  setFor: (type: string) => `New terms for ${type}`,
  setFirst: 'Set terms',
  noTermsNeeded: 'No terms, though this partner has had it in hand: its months cannot be reckoned.',
  otherTypes: 'Types without terms',
  earlier: (count: number) =>
    `${formatUnits(count)} earlier ${plural(count, { one: 'version', other: 'versions' })}`,
  standing: { earlier: 'earlier', 'in force': 'in force', ahead: 'from its day on' },
  setBy: (by: string | null, day: string) =>
    by ? `set by ${by}, ${formatDay(day)}` : `set ${formatDay(day)}`,
  field: {
    typeCode: 'Container type',
    validFrom: 'From',
    deposit: 'Deposit',
    replacement: 'Replacement value',
    freeDays: 'Free days',
    dailyFee: 'Daily fee after them',
    lostAfterDays: 'Counts as lost after',
    usefulLifeMonths: 'Useful life in months',
    residualFloorPct: 'Least residual value, in percent of the replacement value',
    damageFee: 'Damage fee',
    cleaningFee: 'Cleaning fee',
    recoveryDays: 'Charge given back if found within',
    currency: 'Currency',
    taxRate: 'Tax rate in percent',
    taxTreatment: 'Deposits and tax',
    objectionDays: 'Days to object to a statement',
    autoCountDays: 'Empties not counted are taken as declared after, in days',
    toleranceUnits: 'Differences settle by themselves up to, in units',
    tolerancePct: 'or up to, in percent of what was declared',
  },
  short: {
    validFrom: 'From',
    deposit: 'Deposit',
    replacement: 'Replaced at',
    freeDays: 'Free days',
    dailyFee: 'Daily fee',
    lostAfterDays: 'Lost after',
    residual: 'Life, floor',
    damageFee: 'Damage',
    cleaningFee: 'Cleaning',
    recoveryDays: 'Recovery',
    standing: 'State',
  },
  never: 'never',
  life: (months: number, floor: string) => `${formatUnits(months)} months, ${formatDecimal(floor)} %`,
  hint: {
    validFrom: (closed: string | null) =>
      closed ? `After ${formatMonth(closed)}, which is closed.` : 'The first day on which they hold.',
    lostAfterDays: 'In days. Leave it empty if containers never count as lost by age.',
    fees: 'Up to six decimals.',
    recoveryDays: 'In days after the loss.',
    currencyFixed: 'Containers have moved, so the currency stays.',
  },
  formNote:
    'Earlier versions stay as they are. Containers issued before the first day keep the terms of their issue.',
  save: 'Set these terms',
  saved: 'The terms are set.',
  saveSettings: 'Keep',
  savedSettings: 'Kept.',
  settingsForm: (name: string) => `What holds for ${name}`,
  worked: 'How this is reckoned',
  example: {
    fee: (freeDays: number, fee: string, ten: string) =>
      `Kept for ${formatUnits(freeDays + 10)} days, one container costs 10 × ${fee} = ${ten}.`,
    noFee: 'No daily fee is asked.',
    loss: (floor: string, replacement: string, deposit: string) =>
      `Lost, one costs its residual value (from ${replacement} when new, never below ${floor}) less its deposit of ${deposit}.`,
  },
} as const;
