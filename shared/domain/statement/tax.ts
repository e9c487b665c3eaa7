import { add, proportion, roundToMinor, subtract, sum } from '../money';
import type { Charge } from './components';

/**
 * Council Directive 2006/112/EC art. 92: the deposit is left out of the taxable amount, which is adjusted when the
 * packing is not returned ("excluded"), or it is in it, adjusted when it is returned ("included").
 */
export type TaxTreatment = 'excluded' | 'included';
/** `rate` in percent. */
export type TaxBasis = { rate: string; treatment: TaxTreatment };

/** Deposits kept because of a loss less those taken up again by a find, for one type in one month. */
export type Forfeit = { accountMonth: string; typeCode: string; amount: string };

/** One rate and treatment: what is taxed and the tax on it, rounded once. */
export type TaxRow = TaxBasis & { fees: string; deposits: string; base: string; tax: string };

type Taxed = {
  basis: TaxBasis;
  charges: readonly (Pick<Charge, 'component' | 'amount'> & { creditFor?: Charge['component'] | null })[];
  /** Net of what was found again. */
  forfeited: readonly string[];
};

const fees: readonly Charge['component'][] = ['daily fee', 'damage', 'cleaning'];
const deposits: readonly Charge['component'][] = ['deposits asked', 'deposits released'];

/**
 * Tax of a statement (RULES 4): daily, damage and cleaning fees, and deposits by the treatment. What is charged for
 * a loss beyond the deposit is left untaxed. A credit is taxed as what it is a credit for.
 */
export function taxRows(taxed: readonly Taxed[], currency: string): TaxRow[] {
  const rows = new Map<string, TaxRow>();
  for (const { basis, charges, forfeited } of taxed) {
    const of = (components: readonly Charge['component'][]) =>
      sum(
        charges
          .filter((charge) =>
            components.includes(
              charge.component === 'credit' ? (charge.creditFor ?? 'credit') : charge.component,
            ),
          )
          .map((charge) => charge.amount),
      );
    const key = `${basis.treatment} ${basis.rate}`;
    const held = rows.get(key) ?? { ...basis, fees: '0', deposits: '0', base: '0', tax: '0' };
    const kept = basis.treatment === 'excluded' ? sum(forfeited) : of(deposits);
    rows.set(key, { ...held, fees: add(held.fees, of(fees)), deposits: add(held.deposits, kept) });
  }
  return [...rows.values()].map((row) => withTax(row, currency));
}

function withTax(row: TaxRow, currency: string): TaxRow {
  const base = add(row.fees, row.deposits);
  const money = (amount: string) => roundToMinor(amount, currency);
  return {
    ...row,
    fees: money(row.fees),
    deposits: money(row.deposits),
    base: money(base),
    tax: proportion(base, { times: row.rate, over: 100, currency }),
  };
}

/** By type, what an assessment kept of the deposits less what it took up again. */
export function forfeitsOf(
  lines: readonly { containerType: string; deposit: { forfeited: string; reinstated: string } }[],
  month: { accountMonth: string; currency: string },
): Forfeit[] {
  return lines.map(({ containerType, deposit }) => ({
    accountMonth: month.accountMonth,
    typeCode: containerType,
    amount: roundToMinor(subtract(deposit.forfeited, deposit.reinstated), month.currency),
  }));
}
