import { mkdirSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { testPassword } from '../../support/builders';
import { aBrowser } from './chromium';
import { aScene, type Scene } from './scene';
import { aStage, type Stage } from './stage';
import { Visit } from './visit';

/** A phone and a desk (LOOK.md). */
export const devices = { phone: { width: 390, height: 844 }, desk: { width: 1440, height: 900 } } as const;
export type Device = keyof typeof devices;
export const bothDevices: readonly Device[] = ['phone', 'desk'];

type Who = { name: string; email: string };

export type Theatre = {
  stage: Stage;
  scene: Scene;
  /** A browser of its own at this device; signed in when a person is named. */
  at: (device: Device, who?: Who) => Promise<Visit>;
};

const inCase = '.local/browser-failures';

/**
 * Sets the stage for the journeys of one file. A journey fails when a step fails, and also when the browser
 * complained on the way; how it looked then is kept as a picture.
 */
export function theatre(label: string) {
  let stage: Stage;
  let scene: Scene;
  let browser: Browser;

  beforeAll(async () => {
    [stage, browser] = await Promise.all([aStage(label), aBrowser()]);
    scene = await aScene(stage);
  }, 120_000);

  afterAll(async () => {
    await browser?.close();
    await stage?.close();
  }, 30_000);

  const journey = (name: string, play: (theatre: Theatre) => Promise<void>, limit = 120_000) =>
    it(
      name,
      async () => {
        const visits: Visit[] = [];
        const at = async (device: Device, who?: Who): Promise<Visit> => {
          const visit = await aVisit({ browser, stage, device, ...(who ? { who } : {}) });
          visits.push(visit);
          return visit;
        };
        try {
          await play({ stage, scene, at });
          expect(visits.flatMap((visit) => visit.troubles())).toEqual([]);
        } catch (error) {
          await keepPictures(name, visits);
          throw error;
        } finally {
          await Promise.all(visits.map((visit) => visit.context.close()));
        }
      },
      limit,
    );
  return { journey };
}

type Asked = { browser: Browser; stage: Stage; device: Device; who?: Who };

async function aVisit({ browser, stage, device, who }: Asked): Promise<Visit> {
  const context = await browser.newContext({
    baseURL: stage.url,
    viewport: devices[device],
    hasTouch: device === 'phone',
    locale: 'en-GB',
    timezoneId: 'Europe/Copenhagen',
    reducedMotion: 'reduce',
    acceptDownloads: true,
  });
  context.setDefaultTimeout(20_000);
  if (who) {
    const { csrfToken } = (await (await context.request.get('/api/session')).json()) as { csrfToken: string };
    const answer = await context.request.post('/api/session', {
      headers: { 'x-csrf-token': csrfToken },
      data: { email: who.email, password: testPassword },
    });
    if (!answer.ok()) throw new Error(`${who.name} was not signed in: ${await answer.text()}`);
  }
  return new Visit(context, await context.newPage(), `${who?.name ?? 'someone'}, ${device}`);
}

async function keepPictures(name: string, visits: readonly Visit[]): Promise<void> {
  mkdirSync(inCase, { recursive: true });
  for (const [at, { page }] of visits.entries()) {
    const file = `${inCase}/${name.replace(/[^a-z0-9]+/gi, '-').slice(0, 80)}-${at + 1}.png`;
    await page.screenshot({ path: file, fullPage: true }).catch(() => undefined);
  }
}
