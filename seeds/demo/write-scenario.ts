import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { companies as companyRows, people, personRoles, sites, terms } from '@/db/schema/companies';
import { containerTypes as typeRows, packedWith, parts as partRows, poolPlans } from '@/db/schema/containers';
import { addDays } from '@/shared/domain/calendar';
import { hashPassword } from '@/server/modules/session/password';
import { companies } from './scenario-companies';
import { loops, parts } from './scenario-pool';
import { containerTypes } from './scenario-types';
import signIns from './sign-ins.json';

const zone = 'Europe/Copenhagen';

/** Who and what the demo is about, by code. */
export type Cast = {
  companyIds: Map<string, string>;
  siteIds: Map<string, string>;
  /** By e-mail. */
  personIds: Map<string, string>;
  /** The person of each company who counts and sends. */
  hands: Map<string, string>;
};

/** Writes companies, sites, people, types, terms, parts and loops as of the day the book is opened. */
export async function writeScenario(
  tx: Transaction,
  opened: { on: string; rateChangeOn: string },
): Promise<Cast> {
  const now = `${opened.on}T06:00:00.000Z`;
  const cast = await writeCompanies(tx, now);
  await writeTypes(tx, now);
  await writeTerms(tx, { cast, now, opened });
  await writePool(tx, { cast, now });
  return cast;
}

async function writeCompanies(tx: Transaction, now: string): Promise<Cast> {
  const cast: Cast = { companyIds: new Map(), siteIds: new Map(), personIds: new Map(), hands: new Map() };
  const passwordHash = await hashPassword(signIns[0]?.password ?? '');
  for (const company of companies) {
    const companyId = newId();
    cast.companyIds.set(company.code, companyId);
    const { kind, code, name, address, taxRate, taxTreatment } = company;
    const tolerancePct = company.tolerancePct ?? '0';
    await tx.insert(companyRows).values({
      id: companyId,
      kind,
      code,
      name,
      address,
      taxRate,
      taxTreatment,
      tolerancePct,
      currency: 'EUR',
      email: company.people.at(-1)?.email ?? null,
      createdAt: now,
    });
    for (const site of company.sites) {
      const siteId = newId();
      cast.siteIds.set(site.code, siteId);
      await tx
        .insert(sites)
        .values({ id: siteId, companyId, code: site.code, name: site.name, timeZone: zone, createdAt: now });
    }
    for (const person of company.people) {
      const personId = newId();
      cast.personIds.set(person.email, personId);
      if (person.roles.includes('clerk') || person.roles.includes('coordinator'))
        cast.hands.set(company.code, personId);
      await tx.insert(people).values({
        id: personId,
        companyId,
        email: person.email,
        name: person.name,
        passwordHash,
        sessionsFrom: now,
        createdAt: now,
      });
      await tx.insert(personRoles).values(person.roles.map((role) => ({ personId, role })));
    }
  }
  return cast;
}

async function writeTypes(tx: Transaction, now: string): Promise<void> {
  for (const type of containerTypes) {
    const {
      code,
      name,
      kind,
      tareKg,
      payloadKg,
      stackLimit,
      unitsPerStack,
      replacement,
      usefulLifeMonths,
      note,
    } = type;
    const [lengthMm, widthMm, heightMm] = type.size;
    await tx.insert(typeRows).values({
      code,
      name,
      kind,
      lengthMm,
      widthMm,
      heightMm,
      tareKg,
      payloadKg,
      stackLimit,
      unitsPerStack,
      replacement,
      usefulLifeMonths,
      note,
      inServiceFrom: '2024-06-01',
      createdAt: now,
    });
  }
  await tx.insert(packedWith).values([
    { typeCode: 'PALLET-128', withTypeCode: 'TOTE-64', quantity: 20 },
    { typeCode: 'PALLET-128', withTypeCode: 'LID-128', quantity: 1 },
  ]);
}

type Writing = { cast: Cast; now: string };

/** Terms for every partner and type, and for Kestrel a dearer deposit from a later day on. */
async function writeTerms(
  tx: Transaction,
  { cast, now, opened }: Writing & { opened: { on: string; rateChangeOn: string } },
): Promise<void> {
  const mikkel = cast.personIds.get('mikkel@fennmark.example') ?? null;
  const rows = companies
    .filter((company) => company.kind === 'partner')
    .flatMap((company) =>
      containerTypes.map((type) => ({
        id: newId(),
        companyId: cast.companyIds.get(company.code) ?? '',
        typeCode: type.code,
        validFrom: addDays(opened.on, -1),
        replacement: type.replacement,
        usefulLifeMonths: type.usefulLifeMonths,
        residualFloorPct: '20',
        recoveryDays: 60,
        createdBy: mikkel,
        createdAt: now,
        ...type.terms,
      })),
    );
  const kestrel = rows.filter(
    (row) => row.companyId === cast.companyIds.get('KESTREL') && row.typeCode === 'TOTE-64',
  );
  const dearer = kestrel.map((row) => ({
    ...row,
    id: newId(),
    validFrom: opened.rateChangeOn,
    deposit: '5.00',
    dailyFee: '0.04',
  }));
  await tx.insert(terms).values([...rows, ...dearer]);
}

async function writePool(tx: Transaction, { cast, now }: Writing): Promise<void> {
  for (const part of parts) {
    await tx.insert(partRows).values({
      id: newId(),
      number: part.number,
      name: part.name,
      typeCode: part.typeCode,
      supplierSiteId: cast.siteIds.get(part.supplier) ?? '',
      plantSiteId: cast.siteIds.get(part.plant) ?? '',
      unitsPerContainer: part.unitsPerContainer,
      unitsPerDayMean: part.mean,
      unitsPerDaySd: part.sd,
      createdAt: now,
    });
  }
  for (const [typeCode, loop] of Object.entries(loops)) {
    const legs = loop.legs.map(([name, stretch, mean, sd]) => ({ name, stretch, days: { mean, sd } }));
    await tx.insert(poolPlans).values({
      typeCode,
      travel: loop.travel,
      legs,
      bufferDays: loop.bufferDays,
      coverProbability: '0.98',
      heldPct: '1.5',
      repairPct: '2',
      lossPerTripPct: '0.2',
      workingDaysPerYear: 235,
      changedBy: cast.personIds.get('sif@fennmark.example') ?? null,
      changedAt: now,
    });
  }
}
