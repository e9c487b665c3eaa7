import type { Reader } from '@/db/client';
import type { Today } from '@/shared/contracts/today';
import { may, type Person } from '../../http/person';
import { unitsByCompany } from '../balances/units-by-company';

/** What the own company holds, over all types: the strip of a partner. */
export async function holding(db: Reader, person: Person): Promise<Today['holding']> {
  if (person.companyKind !== 'partner' || !may(person, 'see balances')) return null;
  const types = (await unitsByCompany(db, { companyIds: [person.companyId] })).get(person.companyId);
  const sum = { held: 0, atSites: 0, sent: 0, sentDiffers: 0, toIt: 0 };
  for (const parts of types?.values() ?? [])
    for (const part of Object.keys(sum) as (keyof typeof sum)[]) sum[part] += parts[part];
  return sum;
}
