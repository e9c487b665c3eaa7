import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
const grave = ['serious', 'critical'];

/** Fails with the findings in words. Both themes, since colours differ. */
export async function auditPage(page: Page, device: string): Promise<void> {
  const found: string[] = [];
  for (const colorScheme of ['dark', 'light'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    const { violations } = await new AxeBuilder({ page }).withTags(tags).setLegacyMode().analyze();
    for (const { id, impact, help, nodes } of violations) {
      if (!grave.includes(impact ?? '')) continue;
      const where = nodes.slice(0, 3).map((node) => `${node.html}\n    ${node.failureSummary ?? ''}`);
      found.push(`${colorScheme}, ${impact} ${id}: ${help}\n    ${where.join('\n    ')}`);
    }
  }
  const sideways = await page.evaluate<number>('document.documentElement.scrollWidth - window.innerWidth');
  if (sideways > 0) found.push(`the page is ${sideways} px wider than the window`);
  if (found.length > 0) throw new Error(`${device} at ${page.url()}\n  ${found.join('\n  ')}`);
}
