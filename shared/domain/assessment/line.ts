import { fromMinor } from '../money';
import { type Book, type Standing, standing } from './book';
import { cleaningCharge, damageCharge, dwellCharge } from './charges';
import { type AgeBand, type AssessmentLine } from './output';
import { CannotAssess } from './refusal';

/** One line of the output from a book that was replayed to the end of the period. */
export function lineOf(book: Book, opening: Standing): AssessmentLine {
  const closing = standing(book);
  checkIdentities(book, opening, closing);
  const { currency } = book.history;
  const { issued, returned, lost, found, ...money } = book.during;
  const text = (minor: bigint) => fromMinor(minor, currency);
  return {
    containerType: book.containerType,
    units: {
      opening: opening.units,
      issued,
      returned,
      lost,
      found,
      closing: closing.units,
      overReturned: book.gap,
    },
    deposit: {
      opening: text(opening.deposit),
      charged: text(money.charged),
      released: text(money.released),
      forfeited: text(money.forfeited),
      reinstated: text(money.reinstated),
      closing: text(closing.deposit),
    },
    charges: {
      dwell: dwellCharge(book),
      loss: {
        units: lost,
        recovered: text(money.lossRecovered),
        amount: text(money.lossCharged - money.lossRecovered),
      },
      damage: damageCharge(book),
      cleaning: cleaningCharge(book),
    },
    ages: agesOf(book),
  };
}

/** The two identities of RULES 3, every time, on counts that were kept apart from each other. */
function checkIdentities(book: Book, opening: Standing, closing: Standing): void {
  const { issued, returned, lost, found, charged, released, forfeited, reinstated } = book.during;
  const units = opening.units + issued - returned - lost + found;
  const deposit = opening.deposit + charged - released - forfeited + reinstated;
  if (!Number.isSafeInteger(units)) {
    const because = `units of ${book.containerType} pass what can be counted exactly`;
    throw new CannotAssess('figures too large', { eventId: null, because });
  }
  if (units === closing.units && deposit === closing.deposit) return;
  const because = `${book.containerType}: opening and movements give ${units} units, ${closing.units} are open`;
  throw new CannotAssess('identity broken', { eventId: null, because });
}

const bandOf = (age: number): AgeBand =>
  age <= 14 ? '0-14' : age <= 30 ? '15-30' : age <= 60 ? '31-60' : age <= 90 ? '61-90' : 'over 90';

function agesOf(book: Book): AssessmentLine['ages'] {
  const ages: AssessmentLine['ages'] = {};
  for (let at = book.layers.length - 1; at >= book.oldest; at -= 1) {
    const layer = book.layers[at];
    if (!layer || layer.open === 0) continue;
    const band = bandOf(book.period.to - layer.day);
    ages[band] = (ages[band] ?? 0) + layer.open;
  }
  return ages;
}
