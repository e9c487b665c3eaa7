import { createConnection, type Connection } from 'mysql2/promise';
import { migrateDatabase } from '@/db/migrate';

type DatabaseServer = {
  host: string;
  port: number;
  ownerUser: string;
  ownerPassword: string;
  appUser: string;
  appPassword: string;
};

/** The throw-away server that `npm test` started; TEST_DATABASE_SERVER holds its address as JSON. */
export function databaseServer(): DatabaseServer {
  const given = process.env.TEST_DATABASE_SERVER;
  if (!given) throw new Error('TEST_DATABASE_SERVER is not set: these tests are run by "npm test"');
  return JSON.parse(given) as DatabaseServer;
}

export type TestDatabase = { name: string; appUrl: string; ownerUrl: string };

/** A database of its own for one test file, migrated, with the server user's narrow rights. */
export async function aDatabase(label: string): Promise<TestDatabase> {
  const server = databaseServer();
  const name = `tarekeep_test_${label.replace(/[^a-z0-9]/g, '_')}_${process.pid}_${Date.now().toString(36)}`;
  const url = (user: string, password: string) =>
    `mysql://${user}:${encodeURIComponent(password)}@${server.host}:${server.port}/${name}`;
  await asOwner(null, (owner) =>
    owner.query(`CREATE DATABASE ${owner.escapeId(name)} CHARACTER SET utf8mb4`),
  );
  const made = {
    name,
    appUrl: url(server.appUser, server.appPassword),
    ownerUrl: url(server.ownerUser, server.ownerPassword),
  };
  await migrateDatabase(made.ownerUrl, made.appUrl);
  return made;
}

export async function dropDatabase({ name }: TestDatabase): Promise<void> {
  await asOwner(null, (owner) => owner.query(`DROP DATABASE IF EXISTS ${owner.escapeId(name)}`));
}

/** Does something as the owner of the tables, beside the server's own connection. */
export async function asOwner<Result>(
  database: string | null,
  work: (owner: Connection) => Promise<Result>,
): Promise<Result> {
  const server = databaseServer();
  const owner = await createConnection({
    host: server.host,
    port: server.port,
    user: server.ownerUser,
    password: server.ownerPassword,
    timezone: 'Z',
    dateStrings: true,
    ...(database ? { database } : {}),
  });
  try {
    return await work(owner);
  } finally {
    await owner.end();
  }
}
