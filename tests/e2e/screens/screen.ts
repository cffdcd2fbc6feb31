/** What every screen has: an address, a heading, the frame around it, and no fault that axe can find. */
import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** WCAG 2.2 AA, with what it takes over from before. */
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** One screen of the application; each screen extends it by its own parts and acts. */
export class Screen {
  /** What the browser complained about since the screen was made: errors of scripts, refusals by the content policy. */
  readonly complaints: string[] = [];

  constructor(
    readonly page: Page,
    readonly address: string,
  ) {
    page.on('pageerror', (error) => this.complaints.push(error.message));
    page.on('console', (message) => {
      if (message.type() === 'error') this.complaints.push(message.text());
    });
  }

  /** Opens the screen at its address and gives the status of the answer. */
  async open(search = ''): Promise<number | undefined> {
    const answer = await this.page.goto(`${this.address}${search}`);
    await expect(this.page.getByRole('heading', { level: 1 })).toBeVisible();
    return answer?.status();
  }

  /** Axe finds nothing on the screen as it stands now. */
  async expectAccessible(): Promise<void> {
    const { violations } = await new AxeBuilder({ page: this.page }).withTags(RULES).analyze();
    expect(
      violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`),
    ).toEqual([]);
  }

  /** Nothing of the screen stands out to the side, so that nobody has to scroll sideways. */
  async expectNoSidewaysScroll(): Promise<void> {
    const { scrollWidth, clientWidth } = await this.page.evaluate(() => ({
      scrollWidth: document.documentElement.scrollWidth,
      clientWidth: document.documentElement.clientWidth,
    }));
    expect(scrollWidth).toBeLessThanOrEqual(clientWidth);
  }
}
