import { and, count, eq, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences } from '@/db/schema/differences';
import { accounts, balances } from '@/db/schema/ledger';
import { shipments } from '@/db/schema/shipments';
import type { PoolOfType, Today } from '@/shared/contracts/today';
import { formatMinor } from '@/shared/domain/money';
import { may, type Person } from '../../http/person';
import { latestApprovals } from '../pool/latest-approvals';

/** Where the pool is, type by type: the circuit of the operator. */
export async function poolPicture(db: Reader, person: Person): Promise<Today['pool']> {
  if (person.companyKind !== 'operator' || !may(person, 'see pool')) return null;
  const types = await db.select().from(containerTypes).orderBy(containerTypes.name, containerTypes.code);
  const approved = new Map((await latestApprovals(db)).map(({ typeCode, size }) => [typeCode, size]));
  const pools = new Map<string, PoolOfType>(
    types.map(({ code, name }) => [
      code,
      { ...empty, typeCode: code, typeName: name, atStake: [], approved: approved.get(code) ?? null },
    ]),
  );
  for (const { typeCode, kind, units } of await standing(db)) {
    const pool = pools.get(typeCode);
    if (pool) pool[kind === 'operator' ? 'plants' : 'partners'] += Number(units);
  }
  for (const { typeCode, contents, units } of await moving(db)) {
    const pool = pools.get(typeCode);
    if (pool) pool[contents] += Number(units);
  }
  for (const { typeCode, currency, units, net, atStake } of await inQuestion(db)) {
    const pool = pools.get(typeCode);
    if (!pool) continue;
    pool.inQuestion += Number(units);
    // Fewer came: those units still lie between the two; more came: they stand at a site already.
    pool.total -= Number(net);
    pool.atStake.push({ currency, amount: formatMinor(atStake, currency) });
  }
  for (const pool of pools.values()) pool.total += pool.plants + pool.partners + pool.fulls + pool.empties;
  const used = [...pools.values()].filter(
    (pool) => pool.total !== 0 || pool.inQuestion !== 0 || pool.plants !== 0 || pool.partners !== 0,
  );
  const [partners] = await db
    .select({ n: count() })
    .from(companies)
    .where(and(eq(companies.kind, 'partner'), eq(companies.active, true)));
  return { partners: partners?.n ?? 0, types: used };
}

const empty = { fulls: 0, empties: 0, partners: 0, plants: 0, inQuestion: 0, total: 0 };

function standing(db: Reader) {
  return db
    .select({
      typeCode: balances.typeCode,
      kind: companies.kind,
      units: sql<string>`sum(${balances.units})`,
    })
    .from(accounts)
    .innerJoin(balances, eq(balances.accountId, accounts.id))
    .innerJoin(companies, eq(companies.id, accounts.companyId))
    .where(eq(accounts.kind, 'site'))
    .groupBy(balances.typeCode, companies.kind);
}

function moving(db: Reader) {
  return db
    .select({
      typeCode: balances.typeCode,
      contents: shipments.contents,
      units: sql<string>`sum(${balances.units})`,
    })
    .from(shipments)
    .innerJoin(accounts, eq(accounts.shipmentId, shipments.id))
    .innerJoin(balances, eq(balances.accountId, accounts.id))
    .where(eq(shipments.state, 'on the way'))
    .groupBy(balances.typeCode, shipments.contents);
}

function inQuestion(db: Reader) {
  return db
    .select({
      typeCode: differences.typeCode,
      currency: companies.currency,
      units: sql<string>`sum(abs(${differences.openUnits}))`,
      net: sql<string>`sum(${differences.openUnits})`,
      atStake: sql<string>`sum(${differences.atStake})`,
    })
    .from(differences)
    .innerJoin(companies, eq(companies.id, differences.partnerId))
    .where(eq(differences.state, 'open'))
    .groupBy(differences.typeCode, companies.currency)
    .orderBy(differences.typeCode, companies.currency);
}
