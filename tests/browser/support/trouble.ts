import type { Page } from 'playwright-core';

/** A refusal that the product answers by design shows in the console of the browser; the page says it in words. */
const refusal = /status of (4\d\d|503)/;

/** Collects errors of the console (broken content policy included) and of scripts. */
export function watchTrouble(page: Page, device: string): string[] {
  const found: string[] = [];
  const note = (what: string) => found.push(`${device} at ${page.url()}: ${what}`);
  page.on('console', (message) => {
    const said = message.text();
    const byDesign = message.location().url.includes('/api/') && refusal.test(said);
    if (message.type() === 'error' && !byDesign) note(said);
  });
  page.on('pageerror', (error) => note(error.stack ?? error.message));
  return found;
}
