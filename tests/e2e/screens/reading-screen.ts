/** The first page: field, layers, board, statements. */
import type { Locator, Page } from '@playwright/test';
import { Screen } from './screen';

export class ReadingScreen extends Screen {
  readonly field: Locator;
  readonly board: Locator;

  constructor(page: Page) {
    super(page, '/');
    this.field = page.getByRole('textbox', { name: /Position, as FEN/ });
    this.board = page.getByRole('grid', { name: /Board/ });
  }

  /** The cell of a square; its name says what stands on it. */
  square(name: string): Locator {
    return this.board.locator(`[data-square=${name}]`);
  }

  /** Types a position and reads it. */
  async read(text: string): Promise<void> {
    await this.field.fill(text);
    await this.page.getByRole('button', { name: 'Read', exact: true }).click();
  }

  /** Chooses a layer by its word. */
  async layer(name: string): Promise<void> {
    await this.page.getByRole('navigation', { name: 'Layer' }).getByRole('link', { name }).click();
  }

  /** Drags the man on one square to another. */
  async drag(from: string, to: string): Promise<void> {
    const start = await this.square(from).boundingBox();
    const end = await this.square(to).boundingBox();
    if (!start || !end) throw new Error(`no square ${from} or ${to}`);
    await this.page.mouse.move(start.x + start.width / 2, start.y + start.height / 2);
    await this.page.mouse.down();
    await this.page.mouse.move(end.x + end.width / 2, end.y + end.height / 2, { steps: 6 });
    await this.page.mouse.up();
  }
}
