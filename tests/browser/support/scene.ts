import { inTransaction } from '@/db/transaction';
import { outsideAccount, siteAccount } from '@/server/modules/ledger/accounts';
import { postEntry } from '@/server/modules/ledger/post-entry';
import { dayInZone, firstDayOfMonth, monthOf, previousMonth } from '@/shared/domain/calendar';
import type { Stage } from './stage';

export const zone = 'Europe/Copenhagen';
/** The day it is at the plant: the server of a journey runs by the real clock. */
export const today = (): string => dayInZone(new Date(), zone);
/** The month that is over and can be closed. */
export const lastMonth = (): string => previousMonth(monthOf(today()));

/** The invented scenario in small: the operator with two plants, two partners, types with terms, people of all roles. */
export async function aScene(stage: Stage) {
  const operator = await stage.aCompany({ kind: 'operator', code: 'FENNMARK', name: 'Fennmark Heat Pumps' });
  const kestrel = await stage.aCompany({
    code: 'KESTREL',
    name: 'Kestrel Coil Works',
    taxRate: '25',
    email: 'book@kestrel.example',
  });
  const orrin = await stage.aCompany({ code: 'ORRIN', name: 'Orrin Sheet Metal', taxRate: '25' });
  const sites = {
    tarnby: await stage.aSite(operator, { code: 'TARNBY', name: 'Tarnby Assembly' }),
    ostrel: await stage.aSite(operator, { code: 'OSTREL', name: 'Ostrel Compressor Hall' }),
    kestrel: await stage.aSite(kestrel, { code: 'KESTREL', name: 'Kestrel, dock 2' }),
    orrin: await stage.aSite(orrin, { code: 'ORRIN', name: 'Orrin, yard' }),
  };
  const types = {
    tote: await stage.aType({ code: 'TOTE-64' }),
    lid: await stage.aType({ code: 'LID-128', name: 'Lid 1200×800', kind: 'lid', unitsPerStack: 20 }),
  };
  for (const partner of [kestrel, orrin]) {
    await stage.someTerms(partner, types.tote.code);
    await stage.someTerms(partner, types.lid.code, { deposit: '12.00', replacement: '34.00' });
  }
  const scene = {
    companies: { operator, kestrel, orrin },
    sites,
    types,
    people: await itsPeople(stage, { operator, kestrel, orrin }),
  };
  await openTheBook(stage, scene);
  return scene;
}

export type Scene = Awaited<ReturnType<typeof aScene>>;

type Companies = Record<'operator' | 'kestrel' | 'orrin', { id: string }>;

async function itsPeople({ aPerson }: Stage, { operator, kestrel, orrin }: Companies) {
  return {
    ane: await aPerson(operator, ['coordinator'], { name: 'Ane Ravn', email: 'ane@fennmark.example' }),
    sif: await aPerson(operator, ['engineer'], { name: 'Sif Holm', email: 'sif@fennmark.example' }),
    mikkel: await aPerson(operator, ['finance'], { name: 'Mikkel Thorn', email: 'mikkel@fennmark.example' }),
    jonas: await aPerson(operator, ['administrator'], {
      name: 'Jonas Lykke',
      email: 'jonas@fennmark.example',
    }),
    ida: await aPerson(operator, ['auditor'], { name: 'Ida Vest', email: 'ida@fennmark.example' }),
    inge: await aPerson(kestrel, ['clerk'], { name: 'Inge Madsen', email: 'inge@kestrel.example' }),
    rasmus: await aPerson(kestrel, ['manager'], { name: 'Rasmus Toft', email: 'rasmus@kestrel.example' }),
    olaf: await aPerson(orrin, ['clerk', 'manager'], { name: 'Olaf Orrin', email: 'olaf@orrin.example' }),
  };
}

/** 5 000 totes and 500 lids stand at each plant, 400 totes at Kestrel, since the first day of last month. */
async function openTheBook(stage: Stage, { sites, types }: Pick<Scene, 'sites' | 'types'>): Promise<void> {
  const stock = [
    { site: sites.tarnby, typeCode: types.tote.code, units: 5000 },
    { site: sites.tarnby, typeCode: types.lid.code, units: 500 },
    { site: sites.ostrel, typeCode: types.tote.code, units: 5000 },
    { site: sites.ostrel, typeCode: types.lid.code, units: 500 },
    { site: sites.kestrel, typeCode: types.tote.code, units: 400 },
  ];
  await inTransaction(stage.db, async (tx) => {
    const from = await outsideAccount(tx, 'opening');
    for (const { site, typeCode, units } of stock) {
      await postEntry(tx, {
        kind: 'opening',
        valueDate: firstDayOfMonth(lastMonth()),
        moves: [{ typeCode, units, from, to: await siteAccount(tx, site) }],
        reason: 'Counted when the book was opened',
        personId: null,
      });
    }
  });
}
