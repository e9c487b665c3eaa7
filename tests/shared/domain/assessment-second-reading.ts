import type {
  Assessment,
  AssessmentEvent,
  AssessmentInput,
  AssessmentTerms,
} from '@/shared/domain/assessment';

import { halfUp, scaled, unitOf, written } from './assessment-second-decimals';

/**
 * The rules of assessment read a second time, slowly: every container is an object, every day is walked through.
 * It shares no code with the product, so that a slip in one reading shows against the other.
 */

const KINDS = ['issued', 'found', 'returned', 'damaged', 'cleaned', 'lost'];
const DAY = 86_400_000;

const at = (date: string) => Date.parse(`${date}T00:00:00Z`) / DAY;

export class Impossible extends Error {
  constructor(
    readonly eventId: string,
    what: string,
  ) {
    super(`${eventId}: ${what}`);
  }
}

interface Container {
  since: number;
  terms: AssessmentTerms;
  deposit: bigint;
  lostOn: number;
  charge: bigint;
}

interface Shelf {
  held: Container[];
  missing: Container[];
  owed: number;
}

interface Count {
  [what: string]: number;
}
interface Money {
  [what: string]: bigint;
}

export function secondReading(input: AssessmentInput): Assessment {
  const from = at(input.from);
  const to = at(input.to);
  const events = asKnownNow(input.events).filter((event) => at(event.date) <= to);
  const types = [...new Set(events.map((event) => event.containerType))].sort();
  const lines = types.map((type) => lineFor(type, { input, from, to, events }));
  return {
    currency: input.currency,
    from: input.from,
    to: input.to,
    lines,
    totals: totalsFor(lines, input.currency),
  };
}

function asKnownNow(events: readonly AssessmentEvent[]): AssessmentEvent[] {
  return events
    .filter((event) => event.kind !== 'corrected')
    .map((event) => {
      const quantity = events.reduce(
        (sum, other) =>
          other.kind === 'corrected' && other.corrects === event.id ? sum + other.quantity : sum,
        event.quantity,
      );
      return { ...event, quantity };
    });
}

interface Scene {
  input: AssessmentInput;
  from: number;
  to: number;
  events: readonly AssessmentEvent[];
}

function lineFor(type: string, scene: Scene): Assessment['lines'][number] {
  const { input, from, to } = scene;
  const shelf: Shelf = { held: [], missing: [], owed: 0 };
  const reader = new TypeReader(type, input, shelf);
  const mine = scene.events.filter((event) => event.containerType === type);
  let opening = { units: 0, deposit: BigInt(0) };
  for (let day = Math.min(from - 1, ...mine.map((event) => at(event.date))); day <= to; day += 1) {
    if (day === from) reader.forgetFlows();
    for (const kind of KINDS) {
      for (const event of mine) if (event.kind === kind && at(event.date) === day) reader.happens(event, day);
    }
    reader.endOfDay(day, day >= from);
    if (day === from - 1) opening = reader.standing();
  }
  return reader.line(opening, to);
}

class TypeReader {
  private units: Count = {};
  private money: Money = {};
  private readonly feeDays = new Map<string, number>();

  constructor(
    private readonly type: string,
    private readonly input: AssessmentInput,
    private readonly shelf: Shelf,
  ) {}

  forgetFlows() {
    this.units = {};
    this.money = {};
  }

  private count(what: string, much = BigInt(0)) {
    this.units[what] = (this.units[what] ?? 0) + 1;
    this.money[what] = (this.money[what] ?? BigInt(0)) + much;
  }

  private termsOn(event: AssessmentEvent): AssessmentTerms {
    let best: AssessmentTerms | undefined;
    for (const terms of this.input.terms) {
      if (terms.containerType !== this.type || terms.validFrom > event.date) continue;
      if (!best || terms.validFrom > best.validFrom) best = terms;
    }
    if (!best) throw new Impossible(event.id, 'no terms');
    return best;
  }

  happens(event: AssessmentEvent, day: number) {
    for (let unit = 0; unit < event.quantity; unit += 1) this.oneUnit(event, day);
  }

  private oneUnit(event: AssessmentEvent, day: number) {
    const { shelf } = this;
    if (event.kind === 'issued') this.issue(this.termsOn(event), day);
    if (event.kind === 'returned') {
      const unit = shelf.held.shift();
      if (!unit) shelf.owed += 1;
      this.count('returned', unit?.deposit);
    }
    if (event.kind === 'lost') {
      const unit = shelf.held.shift();
      if (!unit) throw new Impossible(event.id, 'none held');
      this.lose(unit, day);
    }
    if (event.kind === 'found') this.find(event, day);
    if (event.kind === 'damaged') this.count('damaged', scaled(this.termsOn(event).damageFee));
    if (event.kind === 'cleaned') this.count('cleaned', scaled(this.termsOn(event).cleaningFee));
  }

  private minor(text: string): bigint {
    return scaled(text) / unitOf(this.input.currency);
  }

  private issue(terms: AssessmentTerms, day: number) {
    if (this.shelf.owed > 0) {
      this.shelf.owed -= 1;
      this.count('issued');
      return;
    }
    const deposit = this.minor(terms.deposit);
    this.shelf.held.push({ since: day, terms, deposit, lostOn: NaN, charge: BigInt(0) });
    this.count('issued', deposit);
  }

  private lose(unit: Container, day: number) {
    const beyond = this.residual(unit.terms, day) - unit.deposit;
    const charge = beyond > BigInt(0) ? beyond : BigInt(0);
    this.shelf.missing.push({ ...unit, lostOn: day, charge });
    this.count('lost', unit.deposit);
    this.money['charge'] = (this.money['charge'] ?? BigInt(0)) + charge;
  }

  private find(event: AssessmentEvent, day: number) {
    const unit = this.shelf.missing.shift();
    if (!unit) throw new Impossible(event.id, 'none lost');
    const inTime = day <= unit.lostOn + unit.terms.recoveryDays;
    const deposit = inTime ? unit.deposit : BigInt(0);
    this.shelf.held.push({ since: day, terms: unit.terms, deposit, lostOn: NaN, charge: BigInt(0) });
    this.count('found', deposit);
    if (inTime) this.money['credit'] = (this.money['credit'] ?? BigInt(0)) + unit.charge;
  }

  private residual(terms: AssessmentTerms, day: number): bigint {
    const type = this.input.containerTypes.find((each) => each.code === this.type);
    const start = new Date(`${type?.inServiceFrom}T00:00:00Z`);
    const end = new Date(day * DAY);
    let months = 0;
    // Month by month, for as long as the same day of a later month has been reached.
    for (;;) {
      const next = start.getUTCFullYear() * 12 + start.getUTCMonth() + months + 1;
      const reached = end.getUTCFullYear() * 12 + end.getUTCMonth();
      if (next > reached || (next === reached && start.getUTCDate() > end.getUTCDate())) break;
      months += 1;
    }
    const life = BigInt(terms.usefulLifeMonths);
    const left = life > BigInt(months) ? life - BigInt(months) : BigInt(0);
    // Both shares over one denominator: life × 100 in the scale of the percentage.
    const whole = scaled('100') * life;
    const byAge = left * scaled('100');
    const floor = scaled(terms.residualFloorPct) * life;
    return halfUp(
      scaled(terms.replacement) * (byAge > floor ? byAge : floor),
      whole * unitOf(this.input.currency),
    );
  }

  endOfDay(day: number, counts: boolean) {
    const tooOld = (unit: Container) =>
      unit.terms.lostAfterDays !== null && day - unit.since >= unit.terms.lostAfterDays;
    for (const unit of this.shelf.held.filter(tooOld)) this.lose(unit, day);
    this.shelf.held = this.shelf.held.filter((unit) => !tooOld(unit));
    if (!counts) return;
    for (const unit of this.shelf.held) {
      const { freeDays, dailyFee } = unit.terms;
      if (day - unit.since >= freeDays) this.feeDays.set(dailyFee, (this.feeDays.get(dailyFee) ?? 0) + 1);
    }
  }

  standing() {
    const { held, owed } = this.shelf;
    return { units: held.length - owed, deposit: held.reduce((sum, unit) => sum + unit.deposit, BigInt(0)) };
  }

  line(opening: { units: number; deposit: bigint }, to: number): Assessment['lines'][number] {
    const closing = this.standing();
    const text = (minor = BigInt(0)) => written(minor, this.input.currency);
    const { units, money } = this;
    return {
      containerType: this.type,
      units: {
        opening: opening.units,
        issued: units['issued'] ?? 0,
        returned: units['returned'] ?? 0,
        lost: units['lost'] ?? 0,
        found: units['found'] ?? 0,
        closing: closing.units,
        overReturned: this.shelf.owed,
      },
      deposit: {
        opening: text(opening.deposit),
        charged: text(money['issued']),
        released: text(money['returned']),
        forfeited: text(money['lost']),
        reinstated: text(money['found']),
        closing: text(closing.deposit),
      },
      charges: this.charges(),
      ages: this.ages(to),
    };
  }

  private charges(): Assessment['lines'][number]['charges'] {
    const { units, money } = this;
    const { currency } = this.input;
    const rounded = (exact = BigInt(0)) => halfUp(exact, unitOf(currency));
    const fees = [...this.feeDays]
      .filter(([rate]) => scaled(rate) > BigInt(0))
      .sort(([a], [b]) => (scaled(a) < scaled(b) ? -1 : 1))
      .map(([rate, days]) => ({ unitDays: days, rate, minor: rounded(scaled(rate) * BigInt(days)) }));
    const credit = money['credit'] ?? BigInt(0);
    return {
      dwell: {
        lines: fees.map(({ unitDays, rate, minor }) => ({
          unitDays,
          rate,
          amount: written(minor, currency),
        })),
        unitDays: fees.reduce((sum, fee) => sum + fee.unitDays, 0),
        amount: written(
          fees.reduce((sum, fee) => sum + fee.minor, BigInt(0)),
          currency,
        ),
      },
      loss: {
        units: units['lost'] ?? 0,
        recovered: written(credit, currency),
        amount: written((money['charge'] ?? BigInt(0)) - credit, currency),
      },
      damage: { units: units['damaged'] ?? 0, amount: written(rounded(money['damaged']), currency) },
      cleaning: { units: units['cleaned'] ?? 0, amount: written(rounded(money['cleaned']), currency) },
    };
  }

  private ages(to: number): Record<string, number> {
    const ages: Record<string, number> = {};
    for (const { since } of this.shelf.held) {
      const age = to - since;
      const band =
        age < 15 ? '0-14' : age < 31 ? '15-30' : age < 61 ? '31-60' : age < 91 ? '61-90' : 'over 90';
      ages[band] = (ages[band] ?? 0) + 1;
    }
    return ages;
  }
}

function totalsFor(lines: Assessment['lines'], currency: string): Assessment['totals'] {
  const minor = (text: string) => BigInt(text.replace('.', ''));
  const total = (of: (line: Assessment['lines'][number]) => string) =>
    lines.reduce((sum, line) => sum + minor(of(line)), BigInt(0));
  const dwell = total((line) => line.charges.dwell.amount);
  const loss = total((line) => line.charges.loss.amount);
  const damage = total((line) => line.charges.damage.amount);
  const cleaning = total((line) => line.charges.cleaning.amount);
  const cash = total((line) => line.deposit.charged) - total((line) => line.deposit.released);
  const change = total((line) => line.deposit.closing) - total((line) => line.deposit.opening);
  return {
    depositChange: written(change, currency),
    dwell: written(dwell, currency),
    loss: written(loss, currency),
    damage: written(damage, currency),
    cleaning: written(cleaning, currency),
    payable: written(cash + dwell + loss + damage + cleaning, currency),
  };
}
