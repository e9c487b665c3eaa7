import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';

export const databaseName = 'tarekeep';
export const ownerUser = 'tarekeep_owner';
export const appUser = 'tarekeep_app';

/**
 * @typedef {{ rootPassword: string, ownerPassword: string, appPassword: string }} Accounts
 */

/**
 * The passwords of the local database, made at random once and kept where only their owner reads them.
 * @param {string} file
 * @returns {Accounts}
 */
export function localAccounts(file) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const accounts = newAccounts();
  writeFileSync(file, `${JSON.stringify(accounts, null, 2)}\n`, { mode: 0o600 });
  return accounts;
}

/** @returns {Accounts} */
export function newAccounts() {
  return { rootPassword: newPassword(), ownerPassword: newPassword(), appPassword: newPassword() };
}

// Letters and digits alone: it stands in SQL and in a URL.
function newPassword() {
  return randomBytes(24).toString('hex');
}

/**
 * SQL that MariaDB runs at each start, before it lets anyone in. It leaves three accounts: root over the
 * socket; the owner, who migrates; the application, which may do nothing until the migrations grant it.
 * @param {Accounts} accounts
 * @param {{ manyDatabases?: boolean, fromScratch?: boolean }} [how] manyDatabases: the owner may make further
 *   databases named tarekeep_…; fromScratch: what a cut-off first start left in the database goes
 */
export function accountsSql(accounts, { manyDatabases = false, fromScratch = false } = {}) {
  const owned = manyDatabases ? [`\`${databaseName}\``, `\`${databaseName}\\_%\``] : [`\`${databaseName}\``];
  return [
    `DELETE FROM mysql.global_priv WHERE User = '' OR (User = 'root' AND Host <> 'localhost')`,
    `FLUSH PRIVILEGES`,
    `ALTER USER root@localhost IDENTIFIED BY '${accounts.rootPassword}'`,
    ...(fromScratch ? [`DROP DATABASE IF EXISTS \`${databaseName}\``] : []),
    `CREATE DATABASE IF NOT EXISTS \`${databaseName}\` CHARACTER SET utf8mb4`,
    ...account(ownerUser, accounts.ownerPassword),
    ...owned.map((name) => `GRANT ALL PRIVILEGES ON ${name}.* TO '${ownerUser}'@'%' WITH GRANT OPTION`),
    ...account(appUser, accounts.appPassword),
    '',
  ].join(';\n');
}

/**
 * @param {string} name
 * @param {string} password
 */
function account(name, password) {
  return [
    `CREATE USER IF NOT EXISTS '${name}'@'%' IDENTIFIED BY '${password}'`,
    `ALTER USER '${name}'@'%' IDENTIFIED BY '${password}'`,
  ];
}
