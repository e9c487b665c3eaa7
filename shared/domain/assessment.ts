import { type Book, openBook } from './assessment/book';
import { correctedMovements, inOrder, type Movement } from './assessment/corrections';
import { type AssessmentInput, parseInput } from './assessment/input';
import { lineOf } from './assessment/line';
import { type Assessment, type AssessmentLine, type AssessmentTotals } from './assessment/output';
import { CannotAssess } from './assessment/refusal';
import { replay } from './assessment/replay';
import { termsHistory } from './assessment/terms-history';
import { dayNumber } from './calendar';
import { minorUnits } from './currencies';
import { roundToMinor, subtract, sum } from './money';

export { type AssessmentEvent, type AssessmentInput, type AssessmentTerms } from './assessment/input';
export { type Assessment, type AssessmentLine, type AssessmentTotals } from './assessment/output';
export { CannotAssess, type RefusalCode } from './assessment/refusal';

/**
 * Deposits and charges of one partner in one period (RULES 3). Units are whole containers, amounts decimal
 * strings of the input's currency. Refuses what cannot be with CannotAssess, which names the event.
 * A type shows a line when it moved on or before `to`; what happens after `to` changes nothing, save the
 * corrections, which are applied whatever their date.
 */
export function assess(raw: unknown): Assessment {
  const input = parseInput(raw);
  const { currency, from, to } = input;
  checkFrame(input);
  const books = bookOpener(input);
  const lines = [...byType(correctedMovements(input.events), dayNumber(to))]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([containerType, movements]): AssessmentLine => {
      const book = books(containerType, movements);
      return lineOf(book, replay(book, inOrder(movements)));
    });
  return { currency, from, to, lines, totals: totalsOf(lines, currency) };
}

function checkFrame({ currency, from, to }: AssessmentInput): void {
  if (dayNumber(to) < dayNumber(from)) {
    throw new CannotAssess('period ends before it begins', { eventId: null, because: `${from} to ${to}` });
  }
  try {
    minorUnits(currency);
  } catch {
    throw new CannotAssess('unknown currency', {
      eventId: null,
      because: `no minor unit known for ${currency}`,
    });
  }
}

function byType(movements: readonly Movement[], lastDay: number): Map<string, Movement[]> {
  const groups = new Map<string, Movement[]>();
  for (const movement of movements) {
    if (movement.day > lastDay) continue;
    const group = groups.get(movement.containerType);
    if (group) group.push(movement);
    else groups.set(movement.containerType, [movement]);
  }
  return groups;
}

/** Opens the book of a type; refuses a type that is not listed, naming its first event. */
function bookOpener(input: AssessmentInput): (containerType: string, movements: readonly Movement[]) => Book {
  const { currency } = input;
  const period = { from: dayNumber(input.from), to: dayNumber(input.to) };
  const inService = new Map(input.containerTypes.map(({ code, inServiceFrom }) => [code, inServiceFrom]));
  const terms = new Map<string, AssessmentInput['terms']>();
  for (const given of input.terms) {
    const known = terms.get(given.containerType);
    if (known) known.push(given);
    else terms.set(given.containerType, [given]);
  }
  return (containerType, movements) => {
    const inServiceFrom = inService.get(containerType);
    if (inServiceFrom === undefined) {
      const because = `container type ${containerType} is not listed`;
      throw new CannotAssess('unknown container type', { eventId: movements[0]?.id ?? null, because });
    }
    const history = termsHistory({ currency, inServiceFrom, terms: terms.get(containerType) ?? [] });
    return openBook({ containerType, period, history });
  };
}

function totalsOf(lines: readonly AssessmentLine[], currency: string): AssessmentTotals {
  const total = (amount: (line: AssessmentLine) => string) => roundToMinor(sum(lines.map(amount)), currency);
  const dwell = total((line) => line.charges.dwell.amount);
  const loss = total((line) => line.charges.loss.amount);
  const damage = total((line) => line.charges.damage.amount);
  const cleaning = total((line) => line.charges.cleaning.amount);
  const charged = total((line) => line.deposit.charged);
  const released = total((line) => line.deposit.released);
  const depositChange = total((line) => subtract(line.deposit.closing, line.deposit.opening));
  const payable = sum([subtract(charged, released), dwell, loss, damage, cleaning]);
  return { depositChange, dwell, loss, damage, cleaning, payable: roundToMinor(payable, currency) };
}
