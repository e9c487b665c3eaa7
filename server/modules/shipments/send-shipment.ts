import { inArray } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { databaseErrorNumber } from '@/db/transaction';
import { containerTypes } from '@/db/schema/containers';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { type BadField, Problem } from '@/shared/problems/problems';
import { siteAccount, transitAccount } from '../ledger/accounts';
import { postEntry } from '../ledger/post-entry';
import { type SiteWithCompany, sitesById } from '../partners/sites';
import { nextReference } from './reference';

export type Sending = {
  /** Left out: we make one. */
  reference?: string;
  contents: 'empties' | 'fulls';
  fromSiteId: string;
  toSiteId: string;
  leftOn: string;
  expectedOn: string;
  lines: readonly { typeCode: string; declared: number }[];
  note?: string;
  origin: 'form' | 'import' | 'unannounced';
  importId?: string;
  personId: string | null;
  now: string;
};

export type Sent = { id: string; reference: string; from: SiteWithCompany; to: SiteWithCompany };

/** A shipment leaves with its declared lines: units go from the sender's site into transit (RULES 1). */
export async function sendShipment(tx: Transaction, sending: Sending): Promise<Sent> {
  const { from, to } = await checkedSites(tx, sending);
  await refuseUnknownTypes(
    tx,
    sending.lines.map((line) => line.typeCode),
  );
  const id = newId();
  const reference = sending.reference ?? (await nextReference(tx, sending));
  await insertShipment(tx, { id, reference, sending, from, to });
  const transit = await transitAccount(tx, { id, fromCompanyId: from.companyId });
  const declared = sending.lines.filter((line) => line.declared > 0);
  if (declared.length > 0) {
    await tx.insert(shipmentLines).values(declared.map((line) => ({ shipmentId: id, ...line })));
    const account = await siteAccount(tx, from);
    await postEntry(tx, {
      kind: 'sent',
      valueDate: sending.leftOn,
      moves: declared.map((line) => ({
        typeCode: line.typeCode,
        from: account,
        to: transit,
        units: line.declared,
      })),
      personId: sending.personId,
      shipmentId: id,
    });
  }
  return { id, reference, from, to };
}

type Row = Sent & { sending: Sending };

async function insertShipment(tx: Transaction, { id, reference, sending, from, to }: Row): Promise<void> {
  const { contents, leftOn, expectedOn, origin } = sending;
  try {
    await tx.insert(shipments).values({
      id,
      reference,
      contents,
      fromSiteId: from.id,
      toSiteId: to.id,
      fromCompanyId: from.companyId,
      toCompanyId: to.companyId,
      leftOn,
      expectedOn,
      state: 'on the way',
      origin,
      note: sending.note ?? '',
      importId: sending.importId ?? null,
      createdBy: sending.personId,
      createdAt: sending.now,
    });
  } catch (error) {
    if (databaseErrorNumber(error) === 1062) throw new Problem('already exists', { data: { reference } });
    throw error;
  }
}

async function checkedSites(tx: Transaction, sending: Sending) {
  const sites = await sitesById(tx, [sending.fromSiteId, sending.toSiteId]);
  const from = sites.get(sending.fromSiteId);
  const to = sites.get(sending.toSiteId);
  const fields: BadField[] = [];
  if (!from?.active) fields.push({ path: 'fromSiteId', message: 'No such site' });
  if (!to?.active) fields.push({ path: 'toSiteId', message: 'No such site' });
  if (sending.fromSiteId === sending.toSiteId)
    fields.push({ path: 'toSiteId', message: 'The same site as the sender' });
  if (sending.expectedOn < sending.leftOn)
    fields.push({ path: 'expectedOn', message: 'Before the day it leaves' });
  const types = sending.lines.map((line) => line.typeCode);
  types.forEach((type, index) => {
    if (types.indexOf(type) !== index)
      fields.push({ path: `lines.${index}.typeCode`, message: 'The same type twice' });
  });
  if (fields.length > 0 || !from || !to) throw new Problem('not valid', { fields });
  return { from, to };
}

/** Names every line whose container type is not known. */
export async function refuseUnknownTypes(tx: Transaction, codes: readonly string[]): Promise<void> {
  if (codes.length === 0) return;
  const known = await tx
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(inArray(containerTypes.code, [...codes]));
  const names = new Set(known.map((type) => type.code));
  const fields = codes.flatMap((code, index) =>
    names.has(code) ? [] : [{ path: `lines.${index}.typeCode`, message: `No container type ${code}` }],
  );
  if (fields.length > 0) throw new Problem('not valid', { fields });
}
