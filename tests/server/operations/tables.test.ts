import { aDatabase, asOwner, dropDatabase, type TestDatabase } from '../../support/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await aDatabase('tables');
});
afterAll(() => dropDatabase(database));

const rows = (sql: string): Promise<Record<string, string>[]> =>
  asOwner(database.name, async (owner) => (await owner.query(sql))[0] as Record<string, string>[]);

describe('the tables', () => {
  it('have a primary key each, as a Galera cluster needs', async () => {
    const without = await rows(`
      SELECT t.table_name AS name FROM information_schema.tables t
      LEFT JOIN information_schema.table_constraints c
        ON c.table_schema = t.table_schema AND c.table_name = t.table_name AND c.constraint_type = 'PRIMARY KEY'
      WHERE t.table_schema = DATABASE() AND t.table_type = 'BASE TABLE' AND c.constraint_name IS NULL`);
    expect(without).toEqual([]);
  });

  it('lie in InnoDB, in utf8mb4', async () => {
    const others = await rows(`
      SELECT table_name AS name FROM information_schema.tables
      WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE'
        AND (engine <> 'InnoDB' OR table_collation NOT LIKE 'utf8mb4%')`);
    expect(others).toEqual([]);
  });
});
