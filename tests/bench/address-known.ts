import { pino } from 'pino';
import { databaseOn, poolOf } from '@/db/client';
import { startLocalDatabase } from '@/db/local/mariadb.mjs';
import { migrateDatabase } from '@/db/migrate';
import { createApp } from '@/server/app';
import { readConfig } from '@/server/config';
import { folderStore } from '@/server/files/file-store';
import { buildersOn } from '../support/builders';
import { Caller } from '../support/caller';

/** Whether the time of an answer tells that an address is known: medians of as many tries of each kind, in turns. */
const tries = 200;
/** SCORECARD asks for less than this share between the medians. */
const most = 0.05;

const median = (times: number[]): number => times.sort((a, b) => a - b)[times.length >> 1] ?? NaN;

type Asked = {
  caller: Caller;
  forget: () => Promise<unknown>;
  path: string;
  body: (email: string) => object;
};

/** Medians for a known and an unknown address, milliseconds. */
async function medians(asked: Asked, addresses: readonly [string, string]): Promise<[number, number]> {
  const times: [number[], number[]] = [[], []];
  for (let turn = 0; turn < tries; turn += 1) {
    await asked.forget();
    // First one, then the other begins, so that neither always comes after the pause.
    for (const at of turn % 2 === 0 ? ([0, 1] as const) : ([1, 0] as const)) {
      const begun = performance.now();
      await asked.caller.post(asked.path, asked.body(addresses[at]));
      times[at].push(performance.now() - begun);
    }
  }
  return [median(times[0]), median(times[1])];
}

async function run(): Promise<void> {
  const database = await startLocalDatabase({ forTests: true, say: () => undefined });
  const pool = poolOf(database.appUrl, 8);
  try {
    await migrateDatabase(database.ownerUrl, database.appUrl);
    const config = readConfig({
      DATABASE_URL: database.appUrl,
      SESSION_SECRET: 'only for the benchmark, thirty-two characters',
    });
    const deps = {
      config,
      pool,
      db: databaseOn(pool),
      files: folderStore('.local/bench/files'),
      logger: pino({ level: 'silent' }),
      clock: { now: () => new Date() },
    };
    const make = buildersOn(deps.db);
    const { email } = await make.aPerson(await make.aCompany(), ['clerk']);
    const caller = await Caller.stranger(createApp(deps));
    const forget = () => pool.query('DELETE FROM rate_limits');
    for (const [name, path, body] of [
      [
        'sign-in with a wrong password',
        '/session',
        (address: string) => ({ email: address, password: 'not the password' }),
      ],
      ['asking for a new password', '/password-resets', (address: string) => ({ email: address })],
    ] as const) {
      const [known, unknown] = await medians({ caller, forget, path, body }, [
        email,
        'nobody@tarekeep.example',
      ]);
      const apart = Math.abs(known - unknown) / Math.max(known, unknown);
      console.log(
        `${name}: known ${known.toFixed(2)} ms, unknown ${unknown.toFixed(2)} ms, ${(100 * apart).toFixed(1)} % apart (less than ${100 * most} %)`,
      );
      if (!(apart < most)) process.exitCode = 1;
    }
  } finally {
    await pool.end();
    await database.stop();
  }
}

if (require.main === module) {
  run().catch((error: unknown) => {
    console.error(error);
    process.exit(1);
  });
}
