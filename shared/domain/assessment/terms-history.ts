import { dayNumber, dayOfNumber, wholeMonthsBetween } from '../calendar';
import { compare, isWholeMinor, proportion, toMinor } from '../money';
import { type AssessmentTerms } from './input';
import { CannotAssess } from './refusal';

/** One version of a type's terms, made ready for reckoning; `deposit` in minor units. */
export interface TermsVersion {
  readonly given: AssessmentTerms;
  readonly validFrom: number;
  readonly deposit: bigint;
  /** Residual value per unit in minor units, by day of loss. */
  readonly residuals: Map<number, bigint>;
}

/** The versions of one type, by `validFrom` ascending. */
export interface TermsHistory {
  readonly currency: string;
  readonly inServiceFrom: string;
  readonly versions: readonly TermsVersion[];
}

/** Refuses a deposit or replacement finer than the minor unit (RULES 3.13) and two terms from one day. */
export function termsHistory(of: {
  currency: string;
  inServiceFrom: string;
  terms: readonly AssessmentTerms[];
}): TermsHistory {
  const versions = of.terms.map((given) => prepared(given, of.currency));
  versions.sort((a, b) => a.validFrom - b.validFrom);
  versions.forEach((version, index) => {
    if (versions[index + 1]?.validFrom !== version.validFrom) return;
    const because = `two terms of ${version.given.containerType} from ${version.given.validFrom}`;
    throw new CannotAssess('two terms from the same day', { eventId: null, because });
  });
  return { currency: of.currency, inServiceFrom: of.inServiceFrom, versions };
}

function prepared(given: AssessmentTerms, currency: string): TermsVersion {
  for (const amount of [given.deposit, given.replacement]) {
    if (isWholeMinor(amount, currency)) continue;
    const because = `${amount} of ${given.containerType} is finer than the minor unit of ${currency}`;
    throw new CannotAssess('not whole minor units', { eventId: null, because });
  }
  const deposit = toMinor(given.deposit, currency);
  return { given, validFrom: dayNumber(given.validFrom), deposit, residuals: new Map() };
}

/** The terms in force on that day, or undefined when none were yet. */
export function inForce({ versions }: TermsHistory, day: number): TermsVersion | undefined {
  let low = 0;
  let high = versions.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((versions[middle]?.validFrom ?? Infinity) <= day) low = middle + 1;
    else high = middle;
  }
  return versions[low - 1];
}

/**
 * Residual value of one unit lost on that day, in minor units (RULES 3.10): straight line over the useful life
 * by whole calendar months in service, never below the floor. A loss before `inServiceFrom` counts as age 0.
 */
export function residualValue(history: TermsHistory, version: TermsVersion, day: number): bigint {
  const known = version.residuals.get(day);
  if (known !== undefined) return known;
  const { currency, inServiceFrom } = history;
  const { replacement, usefulLifeMonths, residualFloorPct } = version.given;
  const age = wholeMonthsBetween(inServiceFrom, dayOfNumber(day));
  const left = Math.max(0, usefulLifeMonths - age);
  const byAge = proportion(replacement, { times: left, over: usefulLifeMonths, currency });
  const floor = proportion(replacement, { times: residualFloorPct, over: 100, currency });
  const residual = toMinor(compare(byAge, floor) > 0 ? byAge : floor, currency);
  version.residuals.set(day, residual);
  return residual;
}
