import fc from 'fast-check';
import { createConnection } from 'mysql2/promise';
import { databaseErrorNumber } from '@/db/transaction';
import { bookCheck, checkBook } from '@/server/modules/balances/check-book';
import { runDue } from '@/server/jobs/schedule';
import { type BalanceRow, balanceParts, type MovementRow } from '@/shared/contracts/balances';
import { aProduct, type Product } from '../../support/app';
import { asOwner } from '../../support/database';
import { aLane, counted, empties, fulls, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('book');
  lane = await aLane(product);
});
afterAll(() => product.close());

const seed = 20260320;

async function sumOfMovements(row: BalanceRow, query: Record<string, string>): Promise<number> {
  let sum = 0;
  let after: string | null = null;
  do {
    const page: { rows: MovementRow[]; next: string | null } = (
      await lane.coordinator.get(`/balances/${row.companyId}/${row.typeCode}/movements`, {
        ...query,
        limit: '3',
        ...(after ? { after } : {}),
      })
    ).body;
    sum += page.rows.reduce((units, movement) => units + movement.units, 0);
    after = page.next;
  } while (after);
  return sum;
}

const steps = fc.array(
  fc.record({
    way: fc.constantFrom('out', 'in', 'bought', 'found'),
    units: fc.integer({ min: 1, max: 500 }),
    off: fc.integer({ min: -1, max: 1 }),
    isCounted: fc.boolean(),
    leftOn: fc.constantFrom('2026-03-17', '2026-03-18', '2026-03-20'),
  }),
  { minLength: 3, maxLength: 6 },
);

type Step = { way: string; units: number; off: number; isCounted: boolean; leftOn: string };

async function play({ way, units, off, isCounted, leftOn }: Step): Promise<void> {
  const load = { [lane.type.code]: units };
  if (way === 'bought' || way === 'found') {
    const site = { siteId: lane.plant.id, typeCode: lane.type.code, units, on: leftOn, reason: 'random' };
    await lane.coordinator.post('/adjustments', { kind: way, ...site });
    return;
  }
  const [sender, receiver] = way === 'out' ? [lane.coordinator, lane.clerk] : [lane.clerk, lane.coordinator];
  const form = way === 'out' ? empties(lane, load) : fulls(lane, load);
  const { body } = await sender.post('/shipments', { ...form, leftOn });
  if (isCounted)
    await receiver.post(
      `/shipments/${body.id}/counts`,
      counted({ [lane.type.code]: Math.max(0, units + off) }),
    );
}

describe('the book', () => {
  it('adds up: after random histories every figure, now and on any day, equals the sum of its movements', async () => {
    await fc.assert(
      fc.asyncProperty(steps, async (history) => {
        for (const step of history) await play(step);
        for (const query of [{}, { asOf: '2026-03-17' }, { asOf: '2026-03-19' }] as Record<
          string,
          string
        >[]) {
          const { rows } = (await lane.coordinator.get('/balances', query)).body as { rows: BalanceRow[] };
          for (const row of rows)
            for (const part of balanceParts)
              expect({ part, units: await sumOfMovements(row, { ...query, part }) }).toEqual({
                part,
                units: row[part],
              });
        }
        expect(await checkBook(product.deps.db)).toEqual({ balances: [], dailyNets: [] });
      }),
      { numRuns: 4, seed },
    );
  });

  it.each(['ledger_entries', 'ledger_lines', 'partner_events', 'settlements'])(
    'does not let the server’s user change, delete, empty, replace or alter %s',
    async (table) => {
      await sentEmpties(lane, { [lane.type.code]: 1 });
      const key = table === 'ledger_lines' ? 'entry_id' : 'id';
      const refused = async (statement: string): Promise<number | undefined> =>
        product.deps.pool.query(statement).then(
          () => undefined,
          (error: unknown) => databaseErrorNumber(error),
        );
      const denied = 1142;
      expect(await refused(`UPDATE ${table} SET ${key} = ${key}`)).toBe(denied);
      expect(await refused(`DELETE FROM ${table} WHERE 1 = 0`)).toBe(denied);
      expect(await refused(`TRUNCATE TABLE ${table}`)).toBe(denied);
      expect(await refused(`REPLACE INTO ${table} SELECT * FROM ${table} LIMIT 1`)).toBe(denied);
      expect(await refused(`ALTER TABLE ${table} ADD COLUMN extra INT`)).toBe(denied);
      expect(await refused(`DROP TABLE ${table}`)).toBe(denied);
    },
  );

  it.each(['foreign_key_checks', 'check_constraint_checks'])(
    'refuses entries from a session that switched off %s',
    async (check) => {
      const connection = await createConnection({ uri: product.database.appUrl });
      try {
        await connection.query(`SET SESSION ${check} = 0`);
        await expect(
          connection.query("INSERT INTO ledger_entries (kind, value_date) VALUES ('found', '2026-03-20')"),
        ).rejects.toThrow('only written with its checks on');
        await expect(
          connection.query(
            "INSERT INTO ledger_lines (entry_id, line_no, type_code, from_account_id, to_account_id, units, value_date) VALUES (1, 9, 'X', 1, 2, 5, '2026-03-20')",
          ),
        ).rejects.toThrow('only written with its checks on');
      } finally {
        await connection.end();
      }
    },
  );

  it('sets the recorded instant itself, whatever a session says the time is', async () => {
    const connection = await createConnection({ uri: product.database.appUrl, dateStrings: true });
    try {
      await connection.query('SET SESSION timestamp = 86400');
      const [written] = await connection.query(
        "INSERT INTO ledger_entries (kind, value_date, recorded_at) VALUES ('found', '2026-03-20', '1999-01-01')",
      );
      const id = (written as { insertId: number }).insertId;
      const [rows] = await connection.query('SELECT recorded_at AS at FROM ledger_entries WHERE id = ?', [
        id,
      ]);
      const recorded = Date.parse(`${(rows as { at: string }[])[0]?.at.replace(' ', 'T')}Z`);
      expect(Math.abs(recorded - Date.now())).toBeLessThan(60_000);
    } finally {
      await connection.end();
    }
  });

  it('tells the administrator when a kept balance is not what the lines add up to', async () => {
    const outcomeOn = async (day: string): Promise<string | undefined> => {
      product.setClock(`${day}T04:00:00.000Z`);
      await runDue(product.deps, [bookCheck]);
      const [rows] = await product.deps.pool.query(
        "SELECT outcome FROM log WHERE action = 'checkBook' ORDER BY id DESC LIMIT 1",
      );
      return (rows as { outcome: string }[])[0]?.outcome;
    };
    await sentEmpties(lane, { [lane.type.code]: 3 });
    expect(await outcomeOn('2026-03-20')).toBe('adds up');
    await asOwner(product.database.name, (owner) =>
      owner.query('UPDATE balances SET units = units + 1 LIMIT 1'),
    );
    expect(await outcomeOn('2026-03-21')).toBe('differs');
    expect((await checkBook(product.deps.db)).balances).toHaveLength(1);
  });
});
