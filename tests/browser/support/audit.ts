import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
const grave = ['serious', 'critical'];

/**
 * Fails with the findings in words: all rules in the light theme; in the dark one those of colour, since nothing else
 * differs between the themes.
 */
export async function auditPage(page: Page, device: string): Promise<void> {
  const found = [
    ...(await findings(page, { theme: 'dark', colourOnly: true })),
    ...(await findings(page, { theme: 'light', colourOnly: false })),
  ];
  const sideways = await page.evaluate<number>('document.documentElement.scrollWidth - window.innerWidth');
  if (sideways > 0) found.push(`the page is ${sideways} px wider than the window`);
  if (found.length > 0) throw new Error(`${device} at ${page.url()}\n  ${found.join('\n  ')}`);
}

type Look = { theme: 'light' | 'dark'; colourOnly: boolean };

async function findings(page: Page, { theme, colourOnly }: Look): Promise<string[]> {
  await page.emulateMedia({ colorScheme: theme, reducedMotion: 'reduce' });
  const axe = new AxeBuilder({ page }).setLegacyMode().options({ resultTypes: ['violations'] });
  const { violations } = await (
    colourOnly ? axe.withRules(['color-contrast']) : axe.withTags(tags)
  ).analyze();
  return violations
    .filter(({ impact }) => grave.includes(impact ?? ''))
    .map(({ id, impact, help, nodes }) => {
      const where = nodes.slice(0, 3).map((node) => `${node.html}\n    ${node.failureSummary ?? ''}`);
      return `${theme}, ${impact} ${id}: ${help}\n    ${where.join('\n    ')}`;
    });
}
