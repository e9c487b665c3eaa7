import { appUser, ownerUser } from '../../db/local/accounts.mjs';
import { startLocalDatabase } from '../../db/local/mariadb.mjs';
import { atEnd } from '../../server/launch/lifetime.mjs';
import { say, step } from '../../server/launch/say.mjs';

/**
 * A MariaDB for this run alone, gone when it ends. Its owner may make databases named tarekeep_….
 * @returns {Promise<{ TEST_DATABASE_SERVER: string }>} the environment of the tests
 */
export function provideTestDatabase() {
  return step('Throw-away database', async (note) => {
    const { host, port, accounts, stop } = await startLocalDatabase({ forTests: true, say });
    atEnd(stop);
    note(`${host}:${port}`);
    const { ownerPassword, appPassword } = accounts;
    const server = { host, port, ownerUser, ownerPassword, appUser, appPassword };
    return { TEST_DATABASE_SERVER: JSON.stringify(server) };
  });
}
