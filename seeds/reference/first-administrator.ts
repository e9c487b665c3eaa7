import { count, eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { databaseOn, type Transaction, poolOf } from '@/db/client';
import { companies, people, personRoles, sites } from '@/db/schema/companies';
import { inTransaction } from '@/db/transaction';
import { makeToken } from '@/server/modules/session/tokens';
import { code, email, line } from '@/shared/contracts/fields';
import { timeZone } from '@/shared/contracts/partners';
import { currencyCode } from '@/shared/domain/currencies';

/** What stands in the environment when an own, empty database gets its operator. */
const wanted = z.object({
  OPERATOR_NAME: line(120),
  OPERATOR_CODE: code,
  OPERATOR_CURRENCY: currencyCode,
  PLANT_NAME: line(120),
  PLANT_CODE: code,
  PLANT_TIME_ZONE: timeZone,
  ADMINISTRATOR_NAME: line(120),
  ADMINISTRATOR_EMAIL: email,
});
type Wanted = z.output<typeof wanted>;

/** Writes the operator, its first plant and the administrator, once; returns the token of the invitation. */
export async function writeFirstAdministrator(tx: Transaction, given: Wanted, now: string): Promise<string> {
  const [operators] = await tx.select({ n: count() }).from(companies).where(eq(companies.kind, 'operator'));
  if ((operators?.n ?? 0) > 0)
    throw new Error('There is an operator already: its administrator invites further people.');
  const [companyId, personId] = [newId(), newId()];
  const { OPERATOR_CODE, OPERATOR_NAME, OPERATOR_CURRENCY, ADMINISTRATOR_NAME, ADMINISTRATOR_EMAIL } = given;
  await tx.insert(companies).values({
    id: companyId,
    kind: 'operator',
    code: OPERATOR_CODE,
    name: OPERATOR_NAME,
    currency: OPERATOR_CURRENCY,
    createdAt: now,
  });
  await tx.insert(sites).values({
    id: newId(),
    companyId,
    code: given.PLANT_CODE,
    name: given.PLANT_NAME,
    timeZone: given.PLANT_TIME_ZONE,
    createdAt: now,
  });
  await tx.insert(people).values({
    id: personId,
    companyId,
    email: ADMINISTRATOR_EMAIL,
    name: ADMINISTRATOR_NAME,
    sessionsFrom: now,
    createdAt: now,
  });
  await tx.insert(personRoles).values({ personId, role: 'administrator' });
  return makeToken(tx, { personId, purpose: 'invitation', now });
}

/** Reads what is wanted from an environment; every missing or wrong name is said at once. */
export function readWanted(environment: Record<string, string | undefined>): Wanted {
  const parsed = wanted.safeParse(environment);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The first administrator cannot be made:\n${lines.join('\n')}`);
}

async function run(): Promise<void> {
  const given = readWanted(process.env);
  const pool = poolOf(process.env.DATABASE_URL ?? '', 2);
  try {
    const now = new Date().toISOString();
    const token = await inTransaction(databaseOn(pool), (tx) => writeFirstAdministrator(tx, given, now));
    const base = (process.env.PUBLIC_URL ?? `http://localhost:${process.env.PORT ?? 4100}`).replace(
      /\/$/,
      '',
    );
    console.log(
      `${given.ADMINISTRATOR_NAME} chooses a password within 14 days at\n  ${base}/choose-password?token=${token}`,
    );
  } finally {
    await pool.end();
  }
}

if (require.main === module) {
  run().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  });
}
