import { assess, type Assessment, type AssessmentInput, type AssessmentTerms } from '../assessment';
import { addDays, daysBetween } from '../calendar';
import { compare, fromMinor, isZero, multiply, roundToMinor, sum, toMinor } from '../money';
import type { Charge } from './components';

/** So many units at one figure each; for a loss that figure is the residual value less the deposit. */
export type Part = { quantity: number; each: string; residual?: string; deposit?: string };
type Known = Omit<AssessmentInput, 'from' | 'to'>;
type Frame = { known: Known; assessment: Assessment };

/** Takes an amount apart where that can be said for certain; gives nothing where it cannot. */
export function partsOf(charge: Charge, frame: Frame): Part[] {
  const own = { ...frame, known: ofType(frame.known, charge.typeCode) };
  const parts = partsBy[charge.component]?.(charge, own) ?? [];
  const { currency } = frame.known;
  const total = roundToMinor(sum(parts.map((part) => multiply(part.each, part.quantity))), currency);
  return parts.length > 0 && compare(total, charge.amount) === 0 ? parts : [];
}

const partsBy: Partial<Record<Charge['component'], (charge: Charge, frame: Frame) => Part[]>> = {
  'deposits asked': depositParts,
  damage: (charge, frame) => feeParts(charge, { ...frame, fee: 'damageFee' }),
  cleaning: (charge, frame) => feeParts(charge, { ...frame, fee: 'cleaningFee' }),
  lost: lossParts,
};

function ofType(known: Known, typeCode: string | null): Known {
  const of = <Row extends { containerType: string }>(rows: Row[]) =>
    rows.filter((row) => row.containerType === typeCode);
  return { ...known, terms: of(known.terms), events: of(known.events) };
}

/** Between two changes of terms one deposit holds, so the units behind the amount follow from it. */
function depositParts(_charge: Charge, { known, assessment }: Frame): Part[] {
  return spells(known, assessment).flatMap(({ from, to, terms }) => {
    if (!terms || isZero(terms.deposit)) return [];
    const charged = assess({ ...known, from, to }).lines[0]?.deposit.charged ?? '0';
    const quantity = toMinor(charged, known.currency) / toMinor(terms.deposit, known.currency);
    return quantity > BigInt(0) ? [{ quantity: Number(quantity), each: terms.deposit }] : [];
  });
}

function feeParts(
  _charge: Charge,
  { known, assessment, fee }: Frame & { fee: 'damageFee' | 'cleaningFee' },
): Part[] {
  const what = fee === 'damageFee' ? 'damage' : 'cleaning';
  return spells(known, assessment).flatMap(({ from, to, terms }) => {
    const quantity = assess({ ...known, from, to }).lines[0]?.charges[what].units ?? 0;
    return terms && quantity > 0 ? [{ quantity, each: terms[fee] }] : [];
  });
}

type Spell = { from: string; to: string; terms: AssessmentTerms | undefined };

/** The period cut at each day on which new terms start. */
function spells(known: Known, { from, to }: Assessment): Spell[] {
  const versions = [...known.terms].sort((a, b) => (a.validFrom < b.validFrom ? -1 : 1));
  const starts = versions.map((version) => version.validFrom).filter((day) => day > from && day <= to);
  const cuts = [from, ...starts];
  return cuts.map((start, index) => {
    const next = cuts[index + 1];
    const terms = versions.filter((version) => version.validFrom <= start).at(-1);
    return { from: start, to: next ? addDays(next, -1) : to, terms };
  });
}

/**
 * Losses by the day, those of one figure together. Only where the lost units of a day must all have carried one
 * deposit and the terms with that deposit agree on what a loss costs: else nothing is said for certain.
 */
function lossParts(_charge: Charge, { known, assessment }: Frame): Part[] {
  const { currency } = known;
  const parts = new Map<string, Part>();
  for (const day of lossDays(known, assessment)) {
    const deposit = oneDeposit(known, day);
    const count = BigInt(day.units);
    if (deposit === null || day.charged === BigInt(0) || day.charged % count !== BigInt(0)) return [];
    const each = day.charged / count;
    const key = `${each} ${deposit}`;
    parts.set(key, {
      quantity: (parts.get(key)?.quantity ?? 0) + day.units,
      each: fromMinor(each, currency),
      residual: fromMinor(each + deposit, currency),
      deposit: fromMinor(deposit, currency),
    });
  }
  return [...parts.values()];
}

/**
 * The deposit, in minor units, that every unit lost on the day carried. An average equal to the least or the
 * greatest deposit that a unit can have carried leaves no room for a mixture; any other average does.
 */
function oneDeposit(known: Known, { units, forfeited }: LossDay): bigint | null {
  const count = BigInt(units);
  if (forfeited % count !== BigInt(0)) return null;
  const average = forfeited / count;
  const minor = (terms: AssessmentTerms) => toMinor(terms.deposit, known.currency);
  // Units found late are held again without a deposit (RULES 3.11).
  const found = known.events.some((event) => event.kind === 'found') ? [BigInt(0)] : [];
  const possible = [...known.terms.map(minor), ...found];
  const isLeast = possible.every((deposit) => deposit >= average);
  const isGreatest = possible.every((deposit) => deposit <= average);
  const [first, ...more] = known.terms.filter((terms) => minor(terms) === average);
  if (!first || (!isLeast && !isGreatest)) return null;
  return more.every((terms) => costsTheSame(terms, first)) ? average : null;
}

const costsTheSame = (a: AssessmentTerms, b: AssessmentTerms): boolean =>
  compare(a.deposit, b.deposit) === 0 &&
  compare(a.replacement, b.replacement) === 0 &&
  a.usefulLifeMonths === b.usefulLifeMonths &&
  compare(a.residualFloorPct, b.residualFloorPct) === 0;

/** Amounts in minor units. */
type LossDay = { units: number; charged: bigint; forfeited: bigint };

/** The days with losses, found by halving the period: a half without losses is not looked into. */
function lossDays(known: Known, { from, to }: { from: string; to: string }): LossDay[] {
  const line = assess({ ...known, from, to }).lines[0];
  if (!line || line.units.lost === 0) return [];
  const days = daysBetween(from, to);
  if (days > 0) {
    const middle = addDays(from, Math.floor(days / 2));
    return [...lossDays(known, { from, to: middle }), ...lossDays(known, { from: addDays(middle, 1), to })];
  }
  const { loss } = line.charges;
  const minor = (amount: string) => toMinor(amount, known.currency);
  const charged = minor(loss.amount) + minor(loss.recovered);
  return [{ units: loss.units, charged, forfeited: minor(line.deposit.forfeited) }];
}
