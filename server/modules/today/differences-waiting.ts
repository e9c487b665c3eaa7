import { and, asc, desc, eq, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import type { Today } from '@/shared/contracts/today';
import { daysBetween } from '@/shared/domain/calendar';
import { formatMinor } from '@/shared/domain/money';
import { may, type Person, scopeOf } from '../../http/person';
import { countListed } from '../differences/count-listed';
import { fromSite, toSite } from '../shipments/shipment-rows';

/** Open differences, the oldest first: the coordinator's to settle. */
export async function differencesToSettle(
  db: Reader,
  { person, day }: { person: Person; day: string },
): Promise<Today['differences']> {
  if (!may(person, 'settle differences')) return null;
  const rows = await selectDifferences(db)
    .where(eq(differences.state, 'open'))
    .orderBy(asc(differences.openedOn), asc(differences.id))
    .limit(6);
  return {
    total: await countListed(db, day),
    rows: rows.map((row) => ({
      ...shown(row),
      openDays: Math.max(0, daysBetween(row.difference.openedOn, day)),
      atStake: { currency: row.currency, amount: formatMinor(row.difference.atStake, row.currency) },
    })),
  };
}

/** The latest open differences of shipments that the own company sent or counted. */
export async function ownDifferences(db: Reader, person: Person): Promise<Today['ownDifferences']> {
  const scope = scopeOf(person);
  if (scope === null || !may(person, 'see shipments')) return null;
  const rows = await selectDifferences(db)
    .where(
      and(
        eq(differences.state, 'open'),
        or(eq(shipments.fromCompanyId, scope), eq(shipments.toCompanyId, scope)),
      ),
    )
    .orderBy(desc(differences.openedOn), desc(differences.id))
    .limit(4);
  return rows.map(shown);
}

function selectDifferences(db: Reader) {
  return db
    .select({
      difference: differences,
      reference: shipments.reference,
      from: fromSite.name,
      to: toSite.name,
      typeName: containerTypes.name,
      currency: companies.currency,
    })
    .from(differences)
    .innerJoin(shipments, eq(shipments.id, differences.shipmentId))
    .innerJoin(fromSite, eq(fromSite.id, shipments.fromSiteId))
    .innerJoin(toSite, eq(toSite.id, shipments.toSiteId))
    .innerJoin(containerTypes, eq(containerTypes.code, differences.typeCode))
    .innerJoin(companies, eq(companies.id, differences.partnerId))
    .$dynamic();
}

function shown({ difference, ...row }: Awaited<ReturnType<typeof selectDifferences>>[number]) {
  return {
    id: difference.id,
    shipmentId: difference.shipmentId,
    reference: row.reference,
    from: row.from,
    to: row.to,
    typeName: row.typeName,
    openUnits: difference.openUnits,
    openedOn: difference.openedOn,
  };
}
