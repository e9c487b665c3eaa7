import type { Reader } from '@/db/client';
import type { Today } from '@/shared/contracts/today';
import { may, type Person } from '../../http/person';
import { unitsInPool } from '../pool/in-pool';
import { latestApprovals } from '../pool/latest-approvals';
import { sitesOutOfLevel } from '../pool/levels';

type Level = NonNullable<Today['levels']>[number];

/** Types whose pool is under or over its approved size, each with its sites under or over their levels. */
export async function offLevel(db: Reader, person: Person): Promise<Today['levels']> {
  if (person.companyKind !== 'operator' || !may(person, 'plan pool')) return null;
  const approvals = await latestApprovals(db);
  if (approvals.length === 0) return [];
  const inPool = await unitsInPool(db);
  const outOfLevel = await sitesOutOfLevel(db);
  return approvals.flatMap(({ typeCode, typeName, size }): Level[] => {
    const there = inPool.get(typeCode) ?? 0;
    const whole = { typeCode, typeName, site: null, there, minimum: size, maximum: size };
    const atSites = outOfLevel
      .filter(({ type }) => type.code === typeCode)
      .map(({ site, units, minimum, maximum }) => ({
        typeCode,
        typeName,
        site: site.name,
        there: units,
        minimum,
        maximum,
      }));
    return there === size ? atSites : [whole, ...atSites];
  });
}
