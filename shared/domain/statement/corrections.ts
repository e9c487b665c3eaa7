import { compare, isZero, roundToMinor, subtract, sum } from '../money';
import { byShownOrder, type Charge, keyOf } from './components';

export type Billed = Charge & { accountMonth: string };

/** What a closed month comes to now, less what was billed and corrected for it so far. */
export type Correction = Charge & { accountMonth: string; billed: string; now: string };

/**
 * RULES 4: the closed month is assessed again with what is known now; each component, type and rate whose amount
 * differs from the sum billed so far gives one correction. What agrees gives none.
 */
export function correctionsOf(
  month: { accountMonth: string; now: readonly Charge[]; currency: string },
  billed: readonly Billed[],
): Correction[] {
  const before = sumsByKey(billed.filter((line) => line.accountMonth === month.accountMonth));
  const now = sumsByKey(month.now);
  const keys = new Set([...before.keys(), ...now.keys()]);
  const corrections: Correction[] = [];
  for (const key of keys) {
    const was = before.get(key);
    const is = now.get(key);
    const of = is ?? was;
    if (!of || of.component === 'credit') continue;
    const money = (amount: string) => roundToMinor(amount, month.currency);
    const [billedAmount, nowAmount] = [money(was?.amount ?? '0'), money(is?.amount ?? '0')];
    if (compare(billedAmount, nowAmount) === 0) continue;
    corrections.push({
      component: of.component,
      typeCode: of.typeCode,
      rate: of.rate,
      accountMonth: month.accountMonth,
      quantity: (is?.quantity ?? 0) - (was?.quantity ?? 0),
      amount: money(subtract(nowAmount, billedAmount)),
      billed: billedAmount,
      now: nowAmount,
    });
  }
  return corrections.filter(({ amount }) => !isZero(amount)).sort(byShownOrder);
}

function sumsByKey(charges: readonly Charge[]): Map<string, Charge> {
  const sums = new Map<string, Charge>();
  for (const charge of charges) {
    const key = keyOf(charge);
    const held = sums.get(key);
    sums.set(key, {
      ...charge,
      quantity: (held?.quantity ?? 0) + charge.quantity,
      amount: sum([held?.amount ?? '0', charge.amount]),
    });
  }
  return sums;
}
