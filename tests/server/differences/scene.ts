import { and, asc, eq } from 'drizzle-orm';
import { accounts, balances, ledgerEntries, ledgerLines, partnerEvents } from '@/db/schema/ledger';
import { companies } from '@/db/schema/companies';
import { differences } from '@/db/schema/differences';
import { inTransaction } from '@/db/transaction';
import { countShipment } from '@/server/modules/shipments/count-shipment';
import { sendShipment } from '@/server/modules/shipments/send-shipment';
import { assessmentInput } from '@/server/modules/statements/assessment-input';
import { assess } from '@/shared/domain/assessment';
import { aProduct, type Product } from '../../support/app';
import type { Site } from '../../support/builders';

export const now = '2026-03-20T09:00:00.000Z';

/** A plant and two partners with terms for two types, and a coordinator who is signed in. */
export async function aScene(label: string) {
  const product = await aProduct(label);
  const { db } = product.deps;
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  const tarnby = await product.aSite(operator, { name: 'Tarnby Assembly' });
  const ostrel = await product.aSite(operator, { name: 'Ostrel Compressor Hall' });
  const kestrel = await product.aCompany({ name: 'Kestrel Coil Works' });
  const kestrelDock = await product.aSite(kestrel, { name: 'Kestrel dock' });
  const orrin = await product.aCompany({ name: 'Orrin Sheet Metal' });
  const orrinDock = await product.aSite(orrin, { name: 'Orrin dock' });
  const tote = await product.aType({ name: 'Tote 600×400' });
  const small = await product.aType({ name: 'Tote 400×300' });
  for (const partner of [kestrel, orrin]) {
    for (const type of [tote, small]) await product.someTerms(partner, type.code);
  }
  const ane = await product.aPerson(operator, ['coordinator'], { name: 'Ane Ravn' });
  const sites = { tarnby, ostrel, kestrelDock, orrinDock };
  return {
    product,
    db,
    operator,
    kestrel,
    orrin,
    ...sites,
    tote: tote.code,
    small: small.code,
    ane,
    coordinator: await product.as(ane),
    ...movementsOn(product),
    ...readingsOn(product),
  };
}

export type Scene = Awaited<ReturnType<typeof aScene>>;
type Units = Record<string, number>;
type Load = { from: Site; to: Site; on?: string; declared: Units; counted: Units };

function movementsOn({ deps: { db } }: Product) {
  const send = (load: Omit<Load, 'counted'>) =>
    inTransaction(db, (tx) =>
      sendShipment(tx, {
        contents: 'empties',
        fromSiteId: load.from.id,
        toSiteId: load.to.id,
        leftOn: load.on ?? '2026-03-02',
        expectedOn: load.on ?? '2026-03-02',
        lines: Object.entries(load.declared).map(([typeCode, declared]) => ({ typeCode, declared })),
        origin: 'form',
        personId: null,
        now,
      }),
    );
  /** Sends and counts; returns the ids of shipment and count. */
  const move = async (load: Load) => {
    const sent = await send(load);
    const counted = await inTransaction(db, (tx) =>
      countShipment(tx, {
        shipmentId: sent.id,
        countedOn: load.on ?? '2026-03-02',
        lines: Object.entries(load.counted).map(([typeCode, units]) => ({
          typeCode,
          counted: units,
          damaged: 0,
          dirty: 0,
        })),
        source: 'person',
        personId: null,
        now,
      }),
    );
    return { shipmentId: sent.id, reference: sent.reference, countId: counted.id };
  };
  return { send, move };
}

function readingsOn({ deps: { db } }: Product) {
  const differencesOf = (shipmentId: string) =>
    db.select().from(differences).where(eq(differences.shipmentId, shipmentId)).orderBy(asc(differences.id));
  return {
    differencesOf,
    theDifference: async (shipmentId: string, typeCode: string) => {
      const found = (await differencesOf(shipmentId)).find((row) => row.typeCode === typeCode);
      if (!found) throw new Error('no such difference');
      return found;
    },
    atSite: (site: { id: string }, typeCode: string) => unitsIn(eq(accounts.siteId, site.id), typeCode),
    inTransit: (shipmentId: string, typeCode: string) =>
      unitsIn(eq(accounts.shipmentId, shipmentId), typeCode),
    lostUnits: (typeCode: string) => unitsIn(eq(accounts.kind, 'lost'), typeCode),
    entriesOf: (shipmentId: string) =>
      db
        .select()
        .from(ledgerEntries)
        .where(eq(ledgerEntries.shipmentId, shipmentId))
        .orderBy(asc(ledgerEntries.id)),
    linesOf: (entryId: number) =>
      db.select().from(ledgerLines).where(eq(ledgerLines.entryId, entryId)).orderBy(asc(ledgerLines.lineNo)),
    eventsOf: async (company: { id: string }) => {
      const rows = await db
        .select()
        .from(partnerEvents)
        .where(eq(partnerEvents.companyId, company.id))
        .orderBy(asc(partnerEvents.id));
      return rows.map(({ kind, date, quantity, typeCode, correctsId }) => ({
        kind,
        date,
        quantity,
        typeCode,
        corrects: correctsId !== null,
      }));
    },
    assessed: async (company: { id: string }, month: string, typeCode: string) => {
      const [partner] = await db.select().from(companies).where(eq(companies.id, company.id));
      if (!partner) throw new Error('no such company');
      const last = { '2026-02': '2026-02-28', '2026-03': '2026-03-31' }[month] ?? `${month}-30`;
      const result = assess(await assessmentInput(db, { partner, from: `${month}-01`, to: last }));
      const line = result.lines.find((each) => each.containerType === typeCode);
      if (!line) throw new Error(`no line of ${typeCode} in ${month}`);
      return { ...line, payable: result.totals.payable };
    },
  };

  async function unitsIn(where: ReturnType<typeof eq>, typeCode: string): Promise<number> {
    const rows = await db
      .select({ units: balances.units })
      .from(balances)
      .innerJoin(accounts, eq(accounts.id, balances.accountId))
      .where(and(where, eq(balances.typeCode, typeCode)));
    return rows.reduce((total, row) => total + row.units, 0);
  }
}
