import path from 'node:path';
import { drizzle } from 'drizzle-orm/mysql2';
import { migrate } from 'drizzle-orm/mysql2/migrator';
import { createConnection } from 'mysql2/promise';
import { grantToServer } from './grants';

/**
 * Brings the database up to date as its owner, then grants the server's user its rights.
 * Two servers that start at once wait for each other on a named lock held by this one connection.
 */
export async function migrateDatabase(ownerUrl: string, appUrl: string): Promise<void> {
  const connection = await createConnection({ uri: ownerUrl, timezone: 'Z', multipleStatements: false });
  try {
    await connection.query("SELECT GET_LOCK('tarekeep migrations', 120)");
    await migrate(drizzle(connection), { migrationsFolder: path.join(__dirname, 'migrations') });
    const app = new URL(appUrl);
    const owner = new URL(ownerUrl);
    if (app.username !== owner.username) {
      await grantToServer(connection, { user: decodeURIComponent(app.username), host: await hostOf(app) });
    }
    await connection.query("SELECT RELEASE_LOCK('tarekeep migrations')");
  } finally {
    await connection.end();
  }
}

/** The host part under which the server's user is known: asked from a connection of its own. */
async function hostOf(app: URL): Promise<string> {
  const connection = await createConnection({ uri: hrefWithoutDatabase(app) });
  try {
    const [rows] = await connection.query('SELECT SUBSTRING_INDEX(CURRENT_USER(), "@", -1) AS host');
    return (rows as { host: string }[])[0]?.host ?? '%';
  } finally {
    await connection.end();
  }
}

/** The server's user may not yet see the database before its rights are granted. */
function hrefWithoutDatabase(url: URL): string {
  const bare = new URL(url.href);
  bare.pathname = '/';
  return bare.href;
}
