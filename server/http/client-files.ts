import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import express, { Router } from 'express';

/** Files whose name holds the hash of their content may be kept for good. */
const hashed = /-[0-9a-f]{32}\.[a-z0-9]+$/;

/** The built web client: its files, the fonts, and the page for every address that is not a file. */
export function clientFiles(folder: string): Router {
  const router = Router();
  const page = path.resolve(folder, 'index.html');
  router.use(
    '/fonts',
    express.static(path.resolve('assets/fonts'), { maxAge: '365d', immutable: true, index: false }),
  );
  router.use(
    express.static(path.resolve(folder), {
      index: false,
      setHeaders: (response, file) => {
        response.setHeader(
          'cache-control',
          hashed.test(file) ? 'public, max-age=31536000, immutable' : 'no-cache',
        );
      },
    }),
  );
  router.get('/{*rest}', (request, response, next) => {
    if (request.path.startsWith('/api/') || path.extname(request.path) !== '' || !existsSync(page))
      return next();
    response.setHeader('cache-control', 'no-cache');
    response.sendFile('index.html', { root: path.resolve(folder) });
  });
  return router;
}

/** SHA-256 sources of the inline styles that the built page carries, for the content security policy. */
export function inlineStyleHashes(folder: string): string[] {
  const page = path.resolve(folder, 'index.html');
  const html = existsSync(page) ? readFileSync(page, 'utf8') : '';
  const blocks = [...html.matchAll(/<style[^>]*>([\s\S]*?)<\/style>/g)].map((match) => match[1] ?? '');
  // React Native for Web begins with an empty style element and fills it by script.
  return ['', ...blocks].map((text) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`);
}
