import { DueQueue } from './due-queue';
import { type TermsHistory, type TermsVersion } from './terms-history';

/** Units that came on one day under one deposit and one version of the terms (RULES 3.3). */
export interface Layer {
  readonly sequence: number;
  readonly day: number;
  readonly terms: TermsVersion;
  /** Minor units for each container. */
  readonly deposit: bigint;
  /** The day at whose end what is still open is lost; Infinity when the terms name none. */
  readonly dueDay: number;
  open: number;
  /** Unit-days are reckoned up to the end of the day before this one. */
  reckonedTo: number;
}

/** Units lost on one day out of one layer; `units` falls as they are found again. */
export interface Loss {
  readonly day: number;
  readonly layer: Layer;
  /** Loss charge per unit, minor units. */
  readonly charge: bigint;
  units: number;
}

/** What moved: units, and deposits and loss charges in minor units. */
export interface Flows {
  issued: number;
  returned: number;
  lost: number;
  found: number;
  charged: bigint;
  released: bigint;
  forfeited: bigint;
  reinstated: bigint;
  lossCharged: bigint;
  lossRecovered: bigint;
}

export interface Standing {
  units: number;
  deposit: bigint;
}

/** Days as day numbers, both inside the period. */
export interface Period {
  readonly from: number;
  readonly to: number;
}

/** All that is known of one container type at the partner while the events are gone through. */
export interface Book {
  readonly containerType: string;
  readonly period: Period;
  readonly history: TermsHistory;
  readonly layers: Layer[];
  /** No layer before this one has units open. */
  oldest: number;
  readonly due: DueQueue<Layer>;
  readonly losses: Loss[];
  /** No loss before this one has units left to be found. */
  oldestLoss: number;
  /** Units returned beyond what was held and not yet made up by issues (RULES 3.5). */
  gap: number;
  readonly before: Flows;
  readonly during: Flows;
  readonly unitDays: Map<TermsVersion, number>;
  readonly damaged: Map<TermsVersion, number>;
  readonly cleaned: Map<TermsVersion, number>;
}

const noFlows = (): Flows => ({
  issued: 0,
  returned: 0,
  lost: 0,
  found: 0,
  charged: BigInt(0),
  released: BigInt(0),
  forfeited: BigInt(0),
  reinstated: BigInt(0),
  lossCharged: BigInt(0),
  lossRecovered: BigInt(0),
});

export function openBook(of: { containerType: string; period: Period; history: TermsHistory }): Book {
  return {
    ...of,
    layers: [],
    oldest: 0,
    due: new DueQueue<Layer>(),
    losses: [],
    oldestLoss: 0,
    gap: 0,
    before: noFlows(),
    during: noFlows(),
    unitDays: new Map(),
    damaged: new Map(),
    cleaned: new Map(),
  };
}

export const flowsOn = (book: Book, day: number): Flows =>
  day < book.period.from ? book.before : book.during;

/** What stands open now, counted from the layers themselves; the gap takes the units below zero. */
export function standing(book: Book): Standing {
  let units = 0 - book.gap;
  let deposit = BigInt(0);
  for (let at = book.oldest; at < book.layers.length; at += 1) {
    const layer = book.layers[at];
    if (!layer) break;
    units += layer.open;
    deposit += BigInt(layer.open) * layer.deposit;
  }
  return { units, deposit };
}
