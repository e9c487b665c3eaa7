import type { BrowserContext, Locator, Page } from 'playwright-core';
import { auditPage } from './audit';
import { watchTrouble } from './trouble';

type Role = Parameters<Page['getByRole']>[0];
type Name = string | RegExp;

/** One person at one device: everything is reached as a person would, by role, name and label. */
export class Visit {
  private readonly trouble: string[];

  constructor(
    readonly context: BrowserContext,
    readonly page: Page,
    readonly device: string,
  ) {
    this.trouble = watchTrouble(page, device);
  }

  async open(path: string): Promise<void> {
    await this.page.goto(path);
  }

  /** Exact unless a pattern is given. */
  one(role: Role, name: Name): Locator {
    return this.page.getByRole(role, { name, exact: typeof name === 'string' });
  }

  async press(name: Name): Promise<void> {
    await this.one('button', name).first().click();
  }

  async follow(name: Name): Promise<void> {
    await this.one('link', name).first().click();
  }

  field(label: Name): Locator {
    return this.page
      .getByLabel(label, { exact: typeof label === 'string' })
      .and(this.page.locator('input, textarea, select'))
      .first();
  }

  async write(label: Name, value: string): Promise<void> {
    await this.field(label).fill(value);
  }

  async pick(label: Name, option: string): Promise<void> {
    await this.field(label).selectOption({ label: option });
  }

  /** Waits until the words stand on the page. */
  async sees(words: Name): Promise<void> {
    await this.page
      .getByText(words, { exact: false })
      .filter({ visible: true })
      .first()
      .waitFor({ state: 'visible' });
  }

  /** Waits until the page with this head is there. */
  async arrives(head: Name): Promise<void> {
    await this.page.getByRole('heading', { level: 1, name: head }).waitFor({ state: 'visible' });
  }

  /** The main screens: no serious failing of accessibility in either theme, nothing to scroll sideways. */
  async isInOrder(): Promise<void> {
    await auditPage(this.page, this.device);
  }

  /** Takes back what the browser complained of where the journey means it to happen. */
  forgive(expected: RegExp): void {
    const left = this.trouble.splice(0).filter((each) => !expected.test(each));
    this.trouble.push(...left);
  }

  /** What the browser complained of since the last call. */
  troubles(): string[] {
    return this.trouble.splice(0);
  }
}
