import { execFileSync } from 'node:child_process';
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import compression from 'compression';
import express from 'express';
import { chromium } from 'playwright-core';

/** Issue bound: JavaScript and CSS that the sign-in page loads, compressed, over those of a blank Expo Router app. */
const most = 1.35;
const root = process.cwd();
const blankFolder = path.join(root, '.local/bench/blank');

/** The smallest Expo Router app, on this project's own installed packages. */
function writeBlankApp(): void {
  rmSync(blankFolder, { recursive: true, force: true });
  mkdirSync(path.join(blankFolder, 'app'), { recursive: true });
  const write = (file: string, text: string) => writeFileSync(path.join(blankFolder, file), text);
  write('package.json', JSON.stringify({ name: 'blank', main: 'expo-router/entry', version: '1.0.0' }));
  write(
    'app.json',
    JSON.stringify({
      expo: {
        name: 'blank',
        slug: 'blank',
        scheme: 'blank',
        web: { bundler: 'metro', output: 'single' },
        plugins: ['expo-router'],
      },
    }),
  );
  write(
    'babel.config.js',
    "module.exports = (api) => { api.cache(true); return { presets: ['babel-preset-expo'] }; };\n",
  );
  write(
    'metro.config.js',
    `const { getDefaultConfig } = require('expo/metro-config');
const config = getDefaultConfig(__dirname);
config.watchFolders = [${JSON.stringify(root)}];
config.resolver.nodeModulesPaths = [${JSON.stringify(path.join(root, 'node_modules'))}];
module.exports = config;
`,
  );
  write(
    'app/index.tsx',
    "import { Text } from 'react-native';\nexport default function Index() { return <Text>Blank</Text>; }\n",
  );
}

function exportWeb(folder: string, output: string): void {
  execFileSync(
    process.execPath,
    [path.join(root, 'node_modules/expo/bin/cli'), 'export', '-p', 'web', '--output-dir', output],
    {
      cwd: folder,
      env: { ...process.env, CI: '1', EXPO_NO_TELEMETRY: '1', EXPO_NO_TYPESCRIPT_SETUP: '1' },
      stdio: ['ignore', 'ignore', 'inherit'],
    },
  );
}

/** Serves a built client as the product does, compressed, with nobody signed in. */
function serve(folder: string): Promise<{ url: string; close: () => void }> {
  const app = express();
  app.use(compression());
  app.get('/api/session', (_request, response) => {
    response.json({ csrfToken: 'x', signedIn: null });
  });
  app.use('/fonts', express.static(path.join(root, 'assets/fonts')));
  app.use(express.static(folder));
  app.get('/{*rest}', (_request, response) => response.sendFile('index.html', { root: folder }));
  return new Promise((resolve) => {
    const server = app.listen(0, '127.0.0.1', () => {
      resolve({
        url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
        close: () => server.close(),
      });
    });
  });
}

/** Bytes over the wire of scripts and styles until the page is quiet. */
async function loadedBytes(folder: string, page: string): Promise<number> {
  const server = await serve(folder);
  const browser = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
    args: ['--no-sandbox'],
  });
  try {
    const tab = await browser.newPage();
    const sizes: Promise<number>[] = [];
    tab.on('response', (response) => {
      if (['script', 'stylesheet'].includes(response.request().resourceType())) {
        sizes.push(
          response
            .request()
            .sizes()
            .then((size) => size.responseBodySize),
        );
      }
    });
    await tab.goto(server.url + page, { waitUntil: 'networkidle' });
    return (await Promise.all(sizes)).reduce((sum, size) => sum + size, 0);
  } finally {
    await browser.close();
    server.close();
  }
}

export async function benchFirstLoad(): Promise<{ blank: number; signIn: number; ratio: number }> {
  writeBlankApp();
  exportWeb(blankFolder, path.join(blankFolder, 'dist'));
  exportWeb(root, path.join(root, '.local/bench/client'));
  const blank = await loadedBytes(path.join(blankFolder, 'dist'), '/');
  const signIn = await loadedBytes(path.join(root, '.local/bench/client'), '/sign-in');
  const ratio = signIn / blank;
  if (Math.min(blank, signIn) < 50_000 || ratio > most)
    throw new Error(
      `sign-in loads ${signIn} bytes, the blank app ${blank}: ratio ${ratio.toFixed(3)}, at most ${most}`,
    );
  return { blank, signIn, ratio };
}

if (require.main === module) {
  benchFirstLoad()
    .then(({ blank, signIn, ratio }) => {
      console.log(
        `blank ${(blank / 1000).toFixed(0)} kB, sign-in ${(signIn / 1000).toFixed(0)} kB, ratio ${ratio.toFixed(3)} (at most ${most})`,
      );
    })
    .catch((error: unknown) => {
      console.error(error);
      process.exit(1);
    });
}
