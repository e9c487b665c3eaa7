import { chromium } from 'playwright-core';
import { atEnd } from '../../server/launch/lifetime.mjs';

/** @typedef {{ email: string, password: string }} Person */
/** @typedef {{ width: number, height: number, theme?: 'light' | 'dark' }} Look */
/** @typedef {{ get: (path: string) => Promise<any>, shoot: (path: string, how: Shot) => Promise<Buffer> }} Camera */
/** @typedef {{ look: Look, whole?: boolean, before?: (page: import('playwright-core').Page) => Promise<unknown> }} Shot */

/**
 * Takes pictures of the product as people see it when they are signed in.
 * @param {string} url
 * @param {string} program
 */
export async function openCamera(url, program) {
  const browser = await chromium.launch({
    executablePath: program,
    args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
  });
  atEnd(() => browser.close());
  return {
    /**
     * @param {Person} person
     * @returns {Promise<Camera>}
     */
    async as(person) {
      const context = await browser.newContext({
        baseURL: url,
        locale: 'en-GB',
        timezoneId: 'Europe/Copenhagen',
        reducedMotion: 'reduce',
      });
      await signIn(context.request, person);
      const page = await context.newPage();
      return {
        get: async (path) => (await context.request.get(`/api${path}`)).json(),
        shoot: (path, how) => shoot(page, path, how),
      };
    },
  };
}

/**
 * @param {import('playwright-core').APIRequestContext} request
 * @param {Person} person
 */
async function signIn(request, { email, password }) {
  const { csrfToken } = await (await request.get('/api/session')).json();
  const headers = { 'x-csrf-token': csrfToken };
  const answer = await request.post('/api/session', { headers, data: { email, password } });
  if (!answer.ok()) throw new Error(`${email} was not signed in: ${await answer.text()}`);
}

/**
 * @param {import('playwright-core').Page} page
 * @param {string} path
 * @param {Shot} how
 */
async function shoot(page, path, { look: { width, height, theme = 'light' }, whole = false, before }) {
  await page.emulateMedia({ colorScheme: theme, reducedMotion: 'reduce' });
  await page.setViewportSize({ width, height });
  await page.goto(path);
  await page.waitForLoadState('networkidle');
  await page.evaluate('document.fonts.ready');
  await before?.(page);
  if (whole) {
    // As tall as the page, so that bars that stay in place do not cover its middle.
    const tall = await page.evaluate('document.documentElement.scrollHeight');
    await page.setViewportSize({ width, height: Math.max(height, Math.min(Number(tall), 6000)) });
  }
  return page.screenshot({ type: 'png' });
}
