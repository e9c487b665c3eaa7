import { verifyLedger, sealLedger } from '@/server/modules/ledger/seal';
import { outsideAccount, siteAccount } from '@/server/modules/ledger/accounts';
import { postEntry } from '@/server/modules/ledger/post-entry';
import { inTransaction } from '@/db/transaction';
import { aProduct, type Product } from '../../support/app';
import { asOwner } from '../../support/database';

let product: Product;
beforeAll(async () => {
  product = await aProduct('seals');
});
afterAll(() => product.close());

async function someEntries(number: number): Promise<number[]> {
  const operator = await product.aCompany({ kind: 'operator' });
  const site = await product.aSite(operator);
  const type = await product.aType();
  const ids: number[] = [];
  for (let n = 1; n <= number; n += 1) {
    ids.push(
      await inTransaction(product.deps.db, async (tx) =>
        postEntry(tx, {
          kind: 'bought',
          valueDate: '2026-03-02',
          moves: [
            {
              typeCode: type.code,
              from: await outsideAccount(tx, 'bought'),
              to: await siteAccount(tx, site),
              units: n,
            },
          ],
          personId: null,
        }),
      ),
    );
  }
  return ids;
}

describe('the seals of the ledger', () => {
  it('fit while nothing was touched, and name the entry that the owner of the tables changed', async () => {
    const ids = await someEntries(5);
    product.setClock(new Date(Date.now() + 600_000).toISOString());
    await sealLedger(product.deps);
    expect(await verifyLedger(product.deps.db)).toEqual({ sealedEntries: 5, firstBroken: null });

    const third = ids[2] ?? 0;
    await asOwner(product.database.name, (owner) =>
      owner.query('UPDATE ledger_lines SET units = units + 1 WHERE entry_id = ?', [third]),
    );
    expect((await verifyLedger(product.deps.db)).firstBroken).toBe(third);
    await asOwner(product.database.name, (owner) =>
      owner.query('UPDATE ledger_lines SET units = units - 1 WHERE entry_id = ?', [third]),
    );
    expect((await verifyLedger(product.deps.db)).firstBroken).toBeNull();
  });

  it('leave alone what is too young to have settled', async () => {
    await someEntries(2);
    product.setClock(new Date().toISOString());
    const before = (await verifyLedger(product.deps.db)).sealedEntries;
    await sealLedger(product.deps);
    expect((await verifyLedger(product.deps.db)).sealedEntries).toBe(before);
  });
});
