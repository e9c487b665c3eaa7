import { isWholeMinor, multiply, roundToMinor } from './money';

type Yearly = { share: number; tripsPerYear: number; costPerLoad: string; currency: string };

/**
 * What the loads that find no empty cost in a year: share × trips a year × cost of one load in one-way packaging,
 * rounded once to the minor unit. Null while the cost is not an amount of the currency, 0 or more. The share and the
 * trips are computed figures, so they enter with nine decimals.
 */
export function yearlyFallbackCost({ share, tripsPerYear, costPerLoad, currency }: Yearly): string | null {
  if (!/^(0|[1-9]\d{0,11})(\.\d{1,6})?$/.test(costPerLoad) || !isWholeMinor(costPerLoad, currency))
    return null;
  return roundToMinor(multiply(costPerLoad, (share * tripsPerYear).toFixed(9)), currency);
}
