import { createConnection } from 'mysql2/promise';
import { appendOnly } from '@/db/grants';
import { databaseErrorNumber } from '@/db/transaction';
import { aDatabase, asOwner, dropDatabase, type TestDatabase } from '../../support/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await aDatabase('rights');
});
afterAll(() => dropDatabase(database));

const denied = 1142;
/** Right that the server's user lacks on the table, or on the command as a whole. */
const deniedAtAll = [denied, 1044, 1227, 1370];

async function answerTo(statement: string): Promise<number | undefined> {
  const connection = await createConnection({ uri: database.appUrl });
  try {
    await connection.query(statement);
    return undefined;
  } catch (error) {
    return databaseErrorNumber(error);
  } finally {
    await connection.end();
  }
}

describe('the server’s user', () => {
  it.each(appendOnly)(
    'can add to %s, and neither change, delete, empty, replace nor alter it',
    async (table) => {
      const [column] = await asOwner(database.name, async (owner) => {
        const [rows] = await owner.query(`SHOW COLUMNS FROM ${table}`);
        return (rows as { Field: string }[]).map((row) => row.Field);
      });
      for (const statement of [
        `UPDATE ${table} SET ${column} = ${column}`,
        `DELETE FROM ${table} WHERE 1 = 0`,
        `TRUNCATE TABLE ${table}`,
        `REPLACE INTO ${table} SELECT * FROM ${table}`,
        `INSERT INTO ${table} SELECT * FROM ${table} ON DUPLICATE KEY UPDATE ${column} = ${table}.${column}`,
        `ALTER TABLE ${table} ADD COLUMN extra INT`,
        `DROP TABLE ${table}`,
        `RENAME TABLE ${table} TO ${table}_gone`,
        `CREATE INDEX extra ON ${table} (${column})`,
        `LOCK TABLES ${table} WRITE`,
      ])
        expect([statement, deniedAtAll]).toEqual([
          statement,
          expect.arrayContaining([await answerTo(statement)]),
        ]);
      expect(await answerTo(`SELECT 1 FROM ${table}`)).toBeUndefined();
    },
  );

  it('cannot take away a guard, make one, or step around the schema', async () => {
    for (const statement of [
      'DROP TRIGGER ledger_lines_guard',
      'CREATE TRIGGER x BEFORE INSERT ON ledger_lines FOR EACH ROW SET NEW.units = 1',
      'CREATE TABLE extra (id INT)',
      'SET GLOBAL foreign_key_checks = 0',
      'SET SESSION sql_log_bin = 0',
      `GRANT UPDATE ON ledger_lines TO CURRENT_USER()`,
      `SELECT 1 INTO OUTFILE '/tmp/tarekeep-outfile'`,
    ])
      expect([statement, await answerTo(statement)]).not.toEqual([statement, undefined]);
  });

  it('reads no other database of the server', async () => {
    expect(await answerTo('SELECT * FROM mysql.global_priv')).toBe(denied);
  });
});
