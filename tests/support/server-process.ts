import { type ChildProcess, spawn } from 'node:child_process';
import { createServer } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';

export type ServerProcess = { url: string; port: number; kill: (signal: NodeJS.Signals) => Promise<void> };

/** A port that nobody listens on. */
export function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

/** The real server as a process of its own, up when this resolves. */
export async function aServerProcess(
  environment: Record<string, string>,
  port?: number,
): Promise<ServerProcess> {
  const own = port ?? (await freePort());
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    env: {
      ...process.env,
      NODE_ENV: 'production',
      PORT: String(own),
      LOG_LEVEL: 'error',
      SESSION_SECRET: 'only for tests, at least thirty-two characters',
      ...environment,
    },
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  const url = `http://127.0.0.1:${own}`;
  await untilHealthy(url, child);
  return {
    url,
    port: own,
    kill: (signal) =>
      new Promise((resolve) => {
        child.once('exit', () => resolve());
        child.kill(signal);
      }),
  };
}

async function untilHealthy(url: string, child: ChildProcess): Promise<void> {
  for (let tries = 0; tries < 300; tries += 1) {
    if (child.exitCode !== null) throw new Error(`the server ended with ${child.exitCode}`);
    const answer = await fetch(`${url}/api/health`).catch(() => null);
    if (answer?.ok) return;
    await pause(100);
  }
  throw new Error('the server did not come up');
}
