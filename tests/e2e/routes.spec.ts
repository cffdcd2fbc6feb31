/** The routes page as a coach uses it: by link, taps, keys alone, without scripts, and with what it gives to take along. */
import { readFile } from 'node:fs/promises';
import { expect, test } from '@playwright/test';
import { RoutesScreen } from './screens/routes-screen';

const CARLSBAD = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15';
const KNIGHT = `?fen=${encodeURIComponent(CARLSBAD)}&man=f3`;

for (const width of [1440, 820, 390]) {
  test(`at ${width} px in both themes: axe finds nothing, nothing overflows`, async ({ page }) => {
    test.setTimeout(120_000);
    await page.setViewportSize({ width, height: 900 });
    const screen = new RoutesScreen(page);
    await screen.open(`${KNIGHT}&route=d2,b3,c5`);
    await expect(screen.board).toBeVisible();
    for (const colorScheme of ['light', 'dark'] as const) {
      await page.emulateMedia({ colorScheme });
      await screen.expectAccessible();
      await screen.expectNoSidewaysScroll();
    }
    await page.getByText('Show as a table').click();
    await screen.expectAccessible();
    await screen.expectNoSidewaysScroll();
    expect(screen.complaints).toEqual([]);
  });
}

test('a link opens man, post and route, and the address follows every act', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await screen.open(`${KNIGHT}&post=f3-g3`);
  await expect(page.getByRole('heading', { name: 'The way: knight f3 to g3' })).toBeVisible();
  await expect(screen.posts('Posts of the knight on f3')).toBeVisible();
  await screen.posts('Posts of the knight on f3').getByRole('link', { name: /^2\. / }).click();
  await expect(page.getByRole('heading', { name: 'The way: knight f3 to f5' })).toBeVisible();
  await expect(page).toHaveURL(/post=f3-f5/);
  await screen.man('Rook b1');
  await expect(page).toHaveURL(/man=b1/);
  await page.reload();
  await expect(screen.posts('Posts of the rook on b1')).toBeVisible();
});

test('the engine works in a thread of its own', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await screen.open();
  const thread = page.waitForEvent('worker');
  await screen.man('Knight f3');
  await thread;
  await expect(screen.posts('Posts of the knight on f3')).toBeVisible();
  expect(screen.complaints).toEqual([]);
});

test('the page answers without a thread, too', async ({ page }) => {
  await page.addInitScript(() => {
    Object.defineProperty(window, 'Worker', {
      value: class {
        constructor() {
          throw new Error('No threads here.');
        }
      },
    });
  });
  const screen = new RoutesScreen(page);
  await screen.open();
  await screen.man('Knight f3');
  await expect(screen.posts('Posts of the knight on f3')).toBeVisible();
});

test('taps draw a route, and each step has its verdict', async ({ browser }) => {
  const context = await browser.newContext({ hasTouch: true, viewport: { width: 390, height: 844 } });
  const page = await context.newPage();
  const screen = new RoutesScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await expect(screen.board).toBeVisible();
  await screen.square('f3').tap();
  for (const square of ['d2', 'b3', 'c5']) {
    await screen.square(square).tap();
    await expect(screen.square(square)).toHaveAttribute('aria-label', /stop/);
  }
  await expect(screen.own.getByText('The step to c5 fails.')).toBeVisible();
  await expect(screen.own.getByText(/Black gains one pawn’s worth there/)).toBeVisible();
  await screen.square('c5').tap();
  await expect(screen.own.getByText(/every step is fine/)).toBeVisible();
  await expect(page).toHaveURL(/route=d2%2Cb3/);
  await context.close();
});

test('the board works with keys alone', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await expect(screen.board).toBeVisible();
  await screen.square('a1').focus();
  for (const key of ['ArrowUp', 'ArrowUp', ...Array<string>(5).fill('ArrowRight')]) await page.keyboard.press(key);
  await expect(screen.square('f3')).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(screen.posts('Posts of the knight on f3')).toBeVisible();
  for (const key of ['ArrowLeft', 'ArrowLeft', 'ArrowDown', 'Enter']) await page.keyboard.press(key);
  await expect(screen.square('d2')).toHaveAttribute('aria-label', 'd2, empty, stop 1');
  await page.keyboard.press('Delete');
  await expect(screen.own.getByText(/every step is fine/)).toBeHidden();
  await page.keyboard.press('Enter');
  await expect(screen.own.getByText(/every step is fine/)).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(page).not.toHaveURL(/route=/);
});

test('a route can be typed as squares or as moves; what cannot be read is told in place and kept', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await screen.check('Nh4 Nf5');
  await expect(screen.own.getByText('The knight gets from f3 to f5: every step is fine.')).toBeVisible();
  await screen.check('f3 d2 zz');
  await expect(screen.own.getByRole('alert')).toContainText('"zz" is no square');
  await expect(screen.route).toHaveValue('f3 d2 zz');
  await screen.field.fill('1. d4 d5 2. c4 e6 3. Nc3 Nf6');
  await page.getByRole('button', { name: 'Find', exact: true }).click();
  await expect(screen.square('f6')).toHaveAttribute('aria-label', /black knight/);
  await screen.field.fill('what?');
  await page.getByRole('button', { name: 'Find', exact: true }).click();
  await expect(page.getByText('This cannot be read. The plate shows the position before.')).toBeVisible();
  await expect(screen.field).toHaveValue('what?');
});

test('the page reads without scripts: posts, trail, verdicts, men by link', async ({ browser }) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  const screen = new RoutesScreen(page);
  await screen.open(`${KNIGHT}&post=f3-g3`);
  await expect(page.getByRole('img', { name: /The knight from f3 to g3 in 3 moves by d2, f1/ })).toBeVisible();
  await screen.check('d2 b3 c5');
  await expect(screen.own.getByText('The step to c5 fails.')).toBeVisible();
  await screen.man('Bishop d3');
  await expect(screen.posts('Posts of the bishop on d3')).toBeVisible();
  await page.getByRole('link', { name: 'Black’s men' }).click();
  await expect(screen.posts('Black’s posts, all men')).toBeVisible();
  await screen.open('?fen=4k3/pppp4/8/8/8/8/4PPPP/4K3+w+-+-+0+1');
  await expect(page.getByText('White has no knight, bishop, rook or queen here.')).toBeVisible();
  await context.close();
});

test('plate and chart come as SVG, the table as CSV', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await screen.open(`${KNIGHT}&post=f3-g3`);
  await expect(screen.board).toBeVisible();
  const saved = async (name: string, role: 'button' | 'link' = 'button'): Promise<string> => {
    const download = page.waitForEvent('download');
    await page.getByRole(role, { name }).click();
    return readFile(await (await download).path(), 'utf8');
  };
  expect(await saved('Save the plate as SVG', 'link')).toContain('The knight from f3 to g3 in 3 moves by d2, f1');
  expect(await saved('Save the chart as SVG')).toContain('Posts of the knight on f3');
  const csv = await saved('Save the chart as CSV');
  expect(csv.split('\r\n')[0]).toBe('Rank,Man,Post,Way,Count,Now,There,Difference,Weight,Adds,Sum');
  expect(csv).toContain('knight f3,g3,"3 moves by d2, f1"');
  await screen.check('d2 b3 c5');
  await expect(screen.own.getByText('The step to c5 fails.')).toBeVisible();
  expect(await saved('Save the plate as SVG')).toContain('A route of the knight: f3, d2, b3, c5, which fails');
});

test('the header leads here and says where one is', async ({ page }) => {
  const screen = new RoutesScreen(page);
  await page.goto('/');
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Routes' }).click();
  await expect(page).toHaveURL(/\/routes/);
  const here = page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Routes' });
  await expect(here).toHaveAttribute('aria-current', 'page');
  await expect(screen.board).toBeVisible();
});
