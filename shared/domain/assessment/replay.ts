import { dayOfNumber } from '../calendar';
import { type Book, flowsOn, type Layer, type Standing, standing } from './book';
import { type Movement } from './corrections';
import { openLayer, reckonUnitDays, takeFrom, takeOldest } from './layers';
import { CannotAssess } from './refusal';
import { inForce, residualValue, type TermsVersion } from './terms-history';

/**
 * Goes through the movements of one type, given in the order of RULES 3.2 and none after the period, and ends
 * at the end of the period's last day. Gives what stood open at the end of the day before the period.
 */
export function replay(book: Book, movements: readonly Movement[]): Standing {
  const { from, to } = book.period;
  let opening: Standing | null = null;
  for (const movement of movements) {
    if (opening === null && movement.day >= from) opening = openingOf(book);
    loseAged(book, movement.day);
    if (movement.units > 0) apply[movement.kind](book, movement);
  }
  opening ??= openingOf(book);
  loseAged(book, to + 1);
  for (const layer of book.layers) reckonUnitDays(book, layer, to + 1);
  return opening;
}

function openingOf(book: Book): Standing {
  loseAged(book, book.period.from);
  return standing(book);
}

const apply: Record<Movement['kind'], (book: Book, movement: Movement) => void> = {
  issued,
  found,
  returned,
  damaged: (book, movement) => addUnits(book.damaged, book, movement),
  cleaned: (book, movement) => addUnits(book.cleaned, book, movement),
  lost,
};

/** RULES 3.3, 3.5, 3.6: fills the gap first; only the rest opens a layer and asks a deposit. */
function issued(book: Book, movement: Movement): void {
  const terms = termsOn(book, movement);
  const filling = Math.min(book.gap, movement.units);
  const units = movement.units - filling;
  book.gap -= filling;
  const flows = flowsOn(book, movement.day);
  flows.issued += movement.units;
  if (units === 0) return;
  flows.charged += BigInt(units) * terms.deposit;
  openLayer(book, { day: movement.day, terms, deposit: terms.deposit, units });
}

/** RULES 3.4 to 3.6: what no layer covers carries no money and widens the gap. */
function returned(book: Book, { day, units }: Movement): void {
  const flows = flowsOn(book, day);
  flows.returned += units;
  book.gap += takeOldest(book, { day, units }, (layer, piece) => {
    flows.released += BigInt(piece) * layer.deposit;
  });
}

function lost(book: Book, { id, day, units }: Movement): void {
  const missing = takeOldest(book, { day, units }, (layer, piece) =>
    writeOff(book, layer, { day, units: piece }),
  );
  if (missing === 0) return;
  const because = `${units} lost, ${units - missing} held on ${dayOfNumber(day)}`;
  throw new CannotAssess('more lost than held', { eventId: id, because });
}

/** RULES 3.9, for all days before `day`: a day's age losses come after that day's events, oldest layer first. */
function loseAged(book: Book, day: number): void {
  for (let layer = book.due.first(); layer && layer.dueDay < day; layer = book.due.first()) {
    book.due.removeFirst();
    const units = layer.open;
    if (units === 0) continue;
    takeFrom(book, layer, { day: layer.dueDay, units });
    writeOff(book, layer, { day: layer.dueDay, units });
  }
}

/** RULES 3.6, 3.10: the deposit is forfeited and the residual value beyond it charged. */
function writeOff(book: Book, layer: Layer, { day, units }: { day: number; units: number }): void {
  const beyond = residualValue(book.history, layer.terms, day) - layer.deposit;
  const charge = beyond > BigInt(0) ? beyond : BigInt(0);
  book.losses.push({ day, layer, charge, units });
  const flows = flowsOn(book, day);
  flows.lost += units;
  flows.forfeited += BigInt(units) * layer.deposit;
  flows.lossCharged += BigInt(units) * charge;
}

/**
 * RULES 3.11, oldest losses first, whenever they happened. Found units always make a new layer, even while more
 * was returned than held: rule 5 lets only issues fill that gap, and rule 11 has found units held again "either
 * way, in a new layer".
 */
function found(book: Book, { id, day, units }: Movement): void {
  const flows = flowsOn(book, day);
  let wanted = units;
  while (wanted > 0) {
    const loss = book.losses[book.oldestLoss];
    if (!loss) {
      const because = `${units} found, ${units - wanted} lost until ${dayOfNumber(day)}`;
      throw new CannotAssess('more found than lost', { eventId: id, because });
    }
    const piece = Math.min(wanted, loss.units);
    const { terms } = loss.layer;
    const recovered = day - loss.day <= terms.given.recoveryDays;
    const deposit = recovered ? loss.layer.deposit : BigInt(0);
    openLayer(book, { day, terms, deposit, units: piece });
    flows.reinstated += BigInt(piece) * deposit;
    if (recovered) flows.lossRecovered += BigInt(piece) * loss.charge;
    loss.units -= piece;
    if (loss.units === 0) book.oldestLoss += 1;
    wanted -= piece;
  }
  flows.found += units;
}

/** RULES 3.12: by the terms in force on the event's date; only what falls in the period is charged. */
function addUnits(units: Map<TermsVersion, number>, book: Book, movement: Movement): void {
  const terms = termsOn(book, movement);
  if (movement.day < book.period.from) return;
  units.set(terms, (units.get(terms) ?? 0) + movement.units);
}

function termsOn(book: Book, { id, day }: Movement): TermsVersion {
  const terms = inForce(book.history, day);
  if (terms) return terms;
  const because = `no terms of ${book.containerType} in force on ${dayOfNumber(day)}`;
  throw new CannotAssess('no terms in force', { eventId: id, because });
}
