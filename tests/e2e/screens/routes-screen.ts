/** The routes page: field, men, board, ranking, a route of one's own. */
import type { Locator, Page } from '@playwright/test';
import { Screen } from './screen';

export class RoutesScreen extends Screen {
  readonly field: Locator;
  readonly board: Locator;
  readonly own: Locator;
  readonly route: Locator;

  constructor(page: Page) {
    super(page, '/routes');
    this.field = page.getByRole('textbox', { name: /Position, as FEN/ });
    this.board = page.getByRole('grid', { name: /Board/ });
    this.own = page.getByRole('region', { name: 'A route of your own' });
    this.route = this.own.getByRole('textbox');
  }

  /** The cell of a square; its name says what stands there and which stop it is. */
  square(name: string): Locator {
    return this.board.locator(`[data-square=${name}]`);
  }

  /** Chooses a man from the list, 'Knight f3'. */
  async man(name: string): Promise<void> {
    await this.page.getByRole('navigation', { name: 'Man' }).getByRole('link', { name }).click();
  }

  /** The ranking's section, by its title. */
  posts(title: string): Locator {
    return this.page.getByRole('region', { name: title, exact: true });
  }

  /** Types a route and has it checked. */
  async check(text: string): Promise<void> {
    await this.route.fill(text);
    await this.own.getByRole('button', { name: 'Check' }).click();
  }
}
