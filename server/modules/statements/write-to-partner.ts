import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { type Letter, queueMail } from '../../mail/outbox';
import { peopleWhoMay } from '../partners/people-who-may';

/** Writes to those of a partner who answer statements; where there is nobody yet, to the company's own address. */
export async function writeToPartner(
  tx: Transaction,
  { companyId, letter, now }: { companyId: string; letter: (name: string) => Letter; now: string },
): Promise<number> {
  const people = await peopleWhoMay(tx, { companyId, ability: 'answer statements' });
  const [company] = await tx.select().from(companies).where(eq(companies.id, companyId));
  const own = company?.email ? [{ name: company.name, email: company.email }] : [];
  const to = people.length > 0 ? people : own;
  for (const each of to) await queueMail(tx, { ...letter(each.name), to: each, now });
  return to.length;
}
