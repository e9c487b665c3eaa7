import type { Assessment, AssessmentLine } from '../assessment';
import { add, isZero, negate, roundToMinor } from '../money';
import { byShownOrder, type Charge } from './components';

/**
 * The payable amounts of an assessment, one by one (RULES 3, `payable`): their sum is its payable. A deposit
 * forfeited by a loss was paid when it was asked and so is no charge. Amounts have the currency's decimals.
 */
export function chargesOf({ lines, currency }: Assessment): Charge[] {
  return lines.flatMap((line) => chargesOfLine(line, currency)).sort(byShownOrder);
}

function chargesOfLine(line: AssessmentLine, currency: string): Charge[] {
  const { units, deposit, charges } = line;
  const money = (amount: string) => roundToMinor(amount, currency);
  const charge = (component: Charge['component'], quantity: number, amount: string): Charge => ({
    component,
    typeCode: line.containerType,
    rate: null,
    quantity,
    amount: money(amount),
  });
  const all = [
    charge('deposits asked', units.issued, deposit.charged),
    charge('deposits released', units.returned, negate(deposit.released)),
    ...charges.dwell.lines.map(({ unitDays, rate, amount }) => ({
      ...charge('daily fee', unitDays, amount),
      rate: sameRate(rate),
    })),
    charge('lost', units.lost, add(charges.loss.amount, charges.loss.recovered)),
    charge('found again', units.found, negate(charges.loss.recovered)),
    charge('damage', charges.damage.units, charges.damage.amount),
    charge('cleaning', charges.cleaning.units, charges.cleaning.amount),
  ];
  return all.filter(isWorthShowing);
}

/** Units that were lost or damaged show even where they cost nothing; deposits of 0 do not. */
function isWorthShowing({ component, quantity, amount }: Charge): boolean {
  const silentAtZero = component === 'deposits asked' || component === 'deposits released';
  return !isZero(amount) || (quantity > 0 && !silentAtZero);
}

/** "0.030" and "0.03" are one rate. */
function sameRate(rate: string): string {
  return rate.includes('.') ? rate.replace(/\.?0+$/, '') : rate;
}
