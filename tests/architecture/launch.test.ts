import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { accountsSql, newAccounts } from '@/db/local/accounts.mjs';
import { freePort, isPortFree } from '@/db/local/free-port.mjs';
import { isRunning, isRunningWith } from '@/db/local/running-process.mjs';
import { closedFolderAbove, mayPass } from '@/db/local/traversable.mjs';
import { hashOfSources } from '@/server/launch/sources-hash.mjs';

let folder = '';
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'tarekeep-launch-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('the hash of the client’s sources', () => {
  const entries = ['app', 'app.json', 'metro.config.js'];
  const hash = () => hashOfSources(folder, entries);
  beforeEach(() => {
    mkdirSync(path.join(folder, 'app/deep'), { recursive: true });
    writeFileSync(path.join(folder, 'app/deep/a.tsx'), 'one');
    writeFileSync(path.join(folder, 'app.json'), '{}');
  });

  it('stays while nothing changes, and when a file outside the sources does', () => {
    const before = hash();
    writeFileSync(path.join(folder, 'README.md'), 'words');
    expect(hash()).toBe(before);
  });

  it.each<[string, () => void]>([
    ['a file deep inside changes', () => writeFileSync(path.join(folder, 'app/deep/a.tsx'), 'two')],
    ['a file is added', () => writeFileSync(path.join(folder, 'app/b.tsx'), '')],
    ['a file is removed', () => rmSync(path.join(folder, 'app/deep/a.tsx'))],
    [
      'a file is renamed',
      () => renameSync(path.join(folder, 'app/deep/a.tsx'), path.join(folder, 'app/deep/b.tsx')),
    ],
    ['a setting that was not there appears', () => writeFileSync(path.join(folder, 'metro.config.js'), '')],
  ])('changes when %s', (_, change) => {
    const before = hash();
    change();
    expect(hash()).not.toBe(before);
  });
});

describe('a free port', () => {
  let server: Server | undefined;
  afterEach(() => new Promise((resolve) => (server ? server.close(resolve) : resolve(undefined))));

  it('can be listened on, and is not free once something does', async () => {
    const port = await freePort();
    expect(await isPortFree(port, '127.0.0.1')).toBe(true);
    server = createServer();
    await new Promise<void>((resolve) => server?.listen(port, '127.0.0.1', resolve));
    expect(await isPortFree(port, '127.0.0.1')).toBe(false);
  });
});

describe('whether the database’s account may pass through a folder', () => {
  const user = { uid: 990, gid: 980 };
  it.each([
    ['others may pass', { mode: 0o755, uid: 0, gid: 0 }, true],
    ['only root may pass', { mode: 0o700, uid: 0, gid: 0 }, false],
    ['others may read but not pass', { mode: 0o744, uid: 0, gid: 0 }, false],
    ['it is the account’s own', { mode: 0o700, uid: 990, gid: 0 }, true],
    ['its group may pass', { mode: 0o710, uid: 0, gid: 980 }, true],
    ['others may, but its group may not', { mode: 0o701, uid: 0, gid: 980 }, false],
  ])('%s', (_, stat, expected) => expect(mayPass(stat, user)).toBe(expected));

  it('names the first closed folder on the way down', () => {
    // Made for its owner alone, as mkdtemp does; nobody owns it under this number.
    const place = path.join(folder, 'inner', 'db');
    mkdirSync(path.dirname(place));
    expect(closedFolderAbove(place, { uid: 4_000_000, gid: 4_000_000 })).toBe(folder);
  });
});

describe('a process id kept in a file', () => {
  it('counts only with the command line that belongs to it', () => {
    expect(isRunning(process.pid)).toBe(true);
    expect(isRunningWith(process.pid, 'node')).toBe(true);
    expect(isRunningWith(process.pid, 'mariadbd --no-defaults')).toBe(process.platform !== 'linux');
  });
});

describe('the accounts of the local database', () => {
  it('differ from one making to the next', () => {
    const [one, other] = [newAccounts(), newAccounts()];
    const passwords = [...Object.values(one), ...Object.values(other)];
    expect(new Set(passwords).size).toBe(6);
  });

  it('give the server’s user no right at all, and the owner those on this product’s databases alone, and drop nothing', () => {
    const grants = accountsSql(newAccounts(), { manyDatabases: true }).match(/GRANT .*/g) ?? [];
    expect(grants).toHaveLength(2);
    expect(accountsSql(newAccounts())).not.toContain('DROP');
    for (const grant of grants) expect(grant).toMatch(/ON `tarekeep(\\_%)?`\.\* TO 'tarekeep_owner'/);
  });
});
