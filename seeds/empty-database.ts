import { createConnection } from 'mysql2/promise';
import { migrateDatabase } from '@/db/migrate';

/** Takes away a half-seeded demo, as the owner of the tables, and makes the tables anew. */
export async function emptyDatabase(ownerUrl: string, appUrl: string): Promise<void> {
  const name = new URL(ownerUrl).pathname.slice(1);
  const owner = await createConnection({ uri: ownerUrl });
  try {
    const [rows] = await owner.query('SHOW FULL TABLES WHERE Table_type = "BASE TABLE"');
    await owner.query('SET foreign_key_checks = 0');
    for (const row of rows as Record<string, string>[]) {
      await owner.query(`DROP TABLE ${owner.escapeId(name)}.${owner.escapeId(Object.values(row)[0] ?? '')}`);
    }
  } finally {
    await owner.end();
  }
  await migrateDatabase(ownerUrl, appUrl);
}
