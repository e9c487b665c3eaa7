import type { Database, Transaction } from '@/db/client';
import { inTransaction } from '@/db/transaction';
import { countShipment, type CountedLine } from '@/server/modules/shipments/count-shipment';
import { sendShipment } from '@/server/modules/shipments/send-shipment';
import { companies } from './scenario-companies';
import type { Cast } from './write-scenario';

export type Underway = {
  id: string;
  reference: string;
  fromSite: string;
  toSite: string;
  arrivesOn: string;
  lines: { typeCode: string; declared: number }[];
};

/** The demo's hands on the product: posts through the services that the API uses, on days of the past. */
export type Book = ReturnType<typeof bookOf>;

const companyOf = new Map(
  companies.flatMap((company) => company.sites.map((site) => [site.code, company] as const)),
);

export function bookOf(db: Database, cast: Cast) {
  const handOf = (site: string): string | null => cast.hands.get(companyOf.get(site)?.code ?? '') ?? null;
  const siteId = (code: string): string => {
    const id = cast.siteIds.get(code);
    if (!id) throw new Error(`no site ${code} in the scenario`);
    return id;
  };

  const send = async (
    tx: Transaction,
    asked: Omit<Underway, 'id' | 'reference'> & { leftOn: string; origin?: 'unannounced' },
  ): Promise<Underway> => {
    const contents = companyOf.get(asked.fromSite)?.kind === 'operator' ? 'empties' : 'fulls';
    const sent = await sendShipment(tx, {
      contents,
      fromSiteId: siteId(asked.fromSite),
      toSiteId: siteId(asked.toSite),
      leftOn: asked.leftOn,
      expectedOn: asked.arrivesOn,
      lines: asked.lines,
      origin: asked.origin ?? 'form',
      personId: handOf(asked.fromSite),
      now: `${asked.leftOn}T12:10:00.000Z`,
    });
    return { ...asked, id: sent.id, reference: sent.reference };
  };

  const count = async (
    tx: Transaction,
    asked: { underway: Underway; on: string; lines: readonly CountedLine[] },
  ) =>
    countShipment(tx, {
      shipmentId: asked.underway.id,
      countedOn: asked.on,
      lines: asked.lines,
      source: 'person',
      personId: handOf(asked.underway.toSite),
      now: `${asked.on}T09:30:00.000Z`,
    });

  const onDay = <Result>(work: (tx: Transaction) => Promise<Result>): Promise<Result> =>
    inTransaction(db, work);
  return { db, cast, send, count, onDay, siteId, handOf };
}
