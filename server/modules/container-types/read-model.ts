import { and, asc, eq } from 'drizzle-orm';
import type { MySqlColumn } from 'drizzle-orm/mysql-core';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes, packedWith } from '@/db/schema/containers';
import type { ContainerType, listContainerTypes } from '@/shared/contracts/container-types';
import type { QueryOf } from '@/shared/contracts/operation';
import { plainDecimal } from '@/shared/domain/plain-decimal';
import { stackLoad } from '@/shared/domain/stack-load';
import { unitsPerLayer } from '@/shared/domain/unit-load';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { holdsText } from '../../http/search';
import { keyset, sortOf } from '../../http/sort';
import { hasBeenMoved } from './moved';

type TypeRow = typeof containerTypes.$inferSelect;

/** Container types by name or code, a page by key. */
export async function typesPage(db: Reader, query: QueryOf<typeof listContainerTypes>) {
  const { name, code } = containerTypes;
  const { key, down } = sortOf(query.sort, ['name', 'code']);
  const page = keyset({ by: containerTypes[key], then: code, down, after: cursor(query.after, 2) });
  const rows = await db
    .select()
    .from(containerTypes)
    .where(
      and(
        query.kind ? eq(containerTypes.kind, query.kind) : undefined,
        query.use ? eq(containerTypes.active, query.use === 'in use') : undefined,
        holdsText(query.search, name, code),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(query.limit + 1);
  return cutPage(rows.map(plainWeights), query.limit, (row) => [row[key], row.code]);
}

/** One type with its packing and what is reckoned from its figures. */
export async function readType(db: Reader, code: string): Promise<ContainerType> {
  const [row] = await db.select().from(containerTypes).where(eq(containerTypes.code, code));
  if (!row) throw new Problem('not found');
  const plain = plainWeights(row);
  return {
    ...plain,
    replacement: plainDecimal(row.replacement),
    currency: await operatorCurrency(db),
    inServiceFixed: await hasBeenMoved(db, code),
    packedWith: await packingOf(db, { of: packedWith.typeCode, named: packedWith.withTypeCode, code }),
    partOf: await packingOf(db, { of: packedWith.withTypeCode, named: packedWith.typeCode, code }),
    loads: stackLoad(plain),
    onPallets: row.kind === 'pallet' ? [] : await layersOn(db, row),
  };
}

/** Amounts of the pool itself (replacement, what to buy) are in the operator's currency. */
export async function operatorCurrency(db: Reader): Promise<string> {
  const [operator] = await db
    .select({ currency: companies.currency })
    .from(companies)
    .where(eq(companies.kind, 'operator'))
    .orderBy(asc(companies.id))
    .limit(1);
  return operator?.currency ?? 'EUR';
}

const plainWeights = (row: TypeRow) => ({
  ...row,
  tareKg: plainDecimal(row.tareKg),
  payloadKg: plainDecimal(row.payloadKg),
});

type Packing = { of: MySqlColumn; named: MySqlColumn; code: string };

function packingOf(db: Reader, { of, named, code }: Packing) {
  return db
    .select({ code: containerTypes.code, name: containerTypes.name, quantity: packedWith.quantity })
    .from(packedWith)
    .innerJoin(containerTypes, eq(containerTypes.code, named))
    .where(eq(of, code))
    .orderBy(asc(containerTypes.name));
}

/** A container that is not a sensible part of a layer (larger than the pallet, or tiny beside it) is left out. */
async function layersOn(db: Reader, row: TypeRow): Promise<ContainerType['onPallets']> {
  const pallets = await db
    .select()
    .from(containerTypes)
    .where(and(eq(containerTypes.kind, 'pallet'), eq(containerTypes.active, true)))
    .orderBy(asc(containerTypes.name));
  return pallets.flatMap((pallet) => {
    const tiny = pallet.lengthMm * pallet.widthMm > 200 * row.lengthMm * row.widthMm;
    const perLayer = tiny
      ? 0
      : unitsPerLayer(
          { length: row.lengthMm, width: row.widthMm },
          { length: pallet.lengthMm, width: pallet.widthMm },
        );
    return perLayer > 0 ? [{ code: pallet.code, name: pallet.name, perLayer }] : [];
  });
}
