import { v7 as newId } from 'uuid';
import type { Database } from '@/db/client';
import { companies, people, personRoles, sites, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import type { Role } from '@/shared/access/abilities';
import { hashPassword } from '@/server/modules/session/password';

export const testPassword = 'a fair long password';
const now = '2026-01-01T08:00:00.000Z';
let hashed: Promise<string> | undefined;
let serial = 0;

export type Company = typeof companies.$inferSelect;
export type Site = typeof sites.$inferSelect;

/** Rows for tests, each with what the case does not care about filled in. */
export function buildersOn(db: Database) {
  const aCompany = async (given: Partial<typeof companies.$inferInsert> = {}): Promise<Company> => {
    serial += 1;
    const company = {
      id: newId(),
      kind: 'partner' as const,
      code: `C${serial}`,
      name: `Company ${serial}`,
      currency: 'EUR',
      createdAt: now,
      ...given,
    };
    await db.insert(companies).values(company);
    const rows = await db.select().from(companies);
    return rows.find((row) => row.id === company.id) as Company;
  };
  const aSite = async (
    company: { id: string },
    given: Partial<typeof sites.$inferInsert> = {},
  ): Promise<Site> => {
    serial += 1;
    const site = {
      id: newId(),
      companyId: company.id,
      code: `S${serial}`,
      name: `Site ${serial}`,
      gln: null,
      timeZone: 'Europe/Copenhagen',
      active: true,
      createdAt: now,
      ...given,
    };
    await db.insert(sites).values(site);
    return site;
  };
  const aPerson = async (
    company: { id: string },
    roles: readonly Role[],
    given: Partial<typeof people.$inferInsert> = {},
  ) => {
    serial += 1;
    hashed ??= hashPassword(testPassword);
    const person = {
      id: newId(),
      companyId: company.id,
      email: `person${serial}@tarekeep.example`,
      name: `Person ${serial}`,
      passwordHash: await hashed,
      sessionsFrom: now,
      createdAt: now,
      ...given,
    };
    await db.insert(people).values(person);
    if (roles.length > 0)
      await db.insert(personRoles).values(roles.map((role) => ({ personId: person.id, role })));
    return person;
  };
  const aType = async (given: Partial<typeof containerTypes.$inferInsert> = {}) => {
    serial += 1;
    const type = {
      code: `TOTE-${serial}`,
      name: 'Tote 600×400×280',
      kind: 'tote' as const,
      lengthMm: 600,
      widthMm: 400,
      heightMm: 280,
      tareKg: '2.100',
      payloadKg: '25.0',
      stackLimit: 8,
      unitsPerStack: 8,
      inServiceFrom: '2024-06-01',
      replacement: '18.00',
      usefulLifeMonths: 60,
      createdAt: now,
      ...given,
    };
    await db.insert(containerTypes).values(type);
    return type;
  };
  const someTerms = async (
    company: { id: string },
    typeCode: string,
    given: Partial<typeof terms.$inferInsert> = {},
  ) => {
    const version = {
      id: newId(),
      companyId: company.id,
      typeCode,
      validFrom: '2025-01-01',
      deposit: '4.50',
      replacement: '18.00',
      freeDays: 14,
      dailyFee: '0.03',
      lostAfterDays: null,
      usefulLifeMonths: 60,
      residualFloorPct: '20',
      damageFee: '3.20',
      cleaningFee: '0.40',
      recoveryDays: 60,
      createdAt: now,
      ...given,
    };
    await db.insert(terms).values(version);
    return version;
  };
  return { aCompany, aSite, aPerson, aType, someTerms };
}

export type Builders = ReturnType<typeof buildersOn>;
