/** The first page as a coach uses it: by typing, dragging, tapping and with keys alone. */
import { expect, test } from '@playwright/test';
import { ReadingScreen } from './screens/reading-screen';

const CARLSBAD = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15';
const LAYERS = ['Position', 'Control', 'Command', 'Weak squares', 'Outposts', 'Files', 'Mobility'];

test('every layer in both themes: axe finds nothing, nothing overflows', async ({ page }) => {
  test.setTimeout(240_000);
  const screen = new ReadingScreen(page);
  await screen.open();
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    for (const layer of LAYERS) {
      await screen.layer(layer);
      await screen.expectAccessible();
    }
  }
  await screen.expectNoSidewaysScroll();
  expect(screen.complaints).toEqual([]);
});

test('the page reads without scripts: plate, sentences, faults, layers by link', async ({ browser }) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await expect(page.getByText('Carlsbad structure').first()).toBeVisible();
  await expect(page.getByRole('img', { name: /Chess plate, command/ }).first()).toBeVisible();
  await screen.layer('Weak squares');
  await expect(page).toHaveURL(/layer=weak/);
  await screen.open('?fen=rnbqkbnr/ppppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR+w+KQkq+-+0+1');
  await expect(page.getByText('The seventh rank adds up to nine squares; it needs eight.')).toBeVisible();
  await context.close();
});

test('a fault is told in place and nothing typed is lost', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open();
  const typed = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K w - - 0 15';
  await screen.read(typed);
  await expect(page.getByRole('alert').filter({ hasText: 'first rank adds up to seven squares' })).toBeVisible();
  await expect(screen.field).toHaveValue(typed);
  await expect(screen.square('g1')).toHaveAttribute('aria-label', /white king/);
  await screen.read('8/pp3ppp/2p5/3p4/3P4/4P3/PP3PPP/8 w - - 0 1');
  await expect(page.getByText('White has no king.')).toBeVisible();
  await expect(screen.square('d4')).toHaveAttribute('aria-label', /white pawn/);
});

test('the moves of a game lead to its last position; a wrong move is told', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open();
  await screen.read('1. d4 d5 2. c4 e6 3. Nc3 Nf6');
  await expect(screen.square('f6')).toHaveAttribute('aria-label', /black knight/);
  await screen.read('1. d4 d5 2. Ke5');
  await expect(page.getByRole('alert').filter({ hasText: 'is no legal move for White at move 2' })).toBeVisible();
});

test('dragging a man changes the reading, undo takes it back, the address follows', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await screen.drag('f3', 'e5');
  await expect(screen.square('e5')).toHaveAttribute('aria-label', /white knight/);
  await expect(screen.square('f3')).toHaveAttribute('aria-label', /empty/);
  await expect(page).toHaveURL(/4N3|2p2n1p%2F3pN3/);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(screen.square('f3')).toHaveAttribute('aria-label', /white knight/);
  await screen.drag('g4', 'e2');
  await expect(screen.square('e2')).toHaveAttribute('aria-label', /black bishop/);
});

test('the board works with keys alone', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await screen.square('a1').focus();
  await page.keyboard.press('ArrowRight');
  await expect(screen.square('b1')).toBeFocused();
  await page.keyboard.press('Enter');
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  await expect(screen.square('a1')).toHaveAttribute('aria-label', /white rook/);
  await expect(screen.square('b1')).toHaveAttribute('aria-label', /empty/);
  await page.keyboard.press('n');
  await expect(screen.square('a1')).toHaveAttribute('aria-label', /black knight/);
  await page.keyboard.press('Delete');
  await expect(screen.square('a1')).toHaveAttribute('aria-label', /empty/);
  await page.keyboard.press('4');
  await expect(page).toHaveURL(/layer=weak/);
  await page.keyboard.press('t');
  await expect(page).toHaveURL(/side=black/);
  await page.keyboard.press('?');
  await expect(page.getByRole('dialog', { name: 'Keys' })).toBeVisible();
});

test('taps move a man, and men come from the box', async ({ browser }) => {
  const context = await browser.newContext({ hasTouch: true, viewport: { width: 390, height: 844 } });
  const page = await context.newPage();
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  await expect(screen.board).toBeVisible();
  await screen.square('f3').tap();
  await screen.square('h4').tap();
  await expect(screen.square('h4')).toHaveAttribute('aria-label', /white knight/);
  await page.getByText('Edit the position').tap();
  await page.getByRole('button', { name: 'Put a black rook' }).tap();
  await screen.square('a4').tap();
  await expect(screen.square('a4')).toHaveAttribute('aria-label', /black rook/);
  await screen.expectNoSidewaysScroll();
  await screen.expectAccessible();
  await context.close();
});

test('a sentence lights its squares, and a square its sentences', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}`);
  const sentence = page.getByRole('link', { name: /half-open for White and bites on nothing/ });
  await sentence.click();
  await expect(sentence).toHaveAttribute('aria-current', 'true');
  await expect(page).toHaveURL(/statement=/);
  await page.reload();
  await expect(page.getByRole('link', { name: /half-open for White and bites on nothing/ })).toHaveAttribute(
    'aria-current',
    'true',
  );
});

test('the figure is the plate: SVG and PNG of the position shown', async ({ page, request }) => {
  const screen = new ReadingScreen(page);
  await screen.open(`?fen=${encodeURIComponent(CARLSBAD)}&layer=files`);
  const href = await page.getByRole('link', { name: 'SVG' }).getAttribute('href');
  const svg = await (await request.get(href ?? '')).text();
  const onPage = await page.locator('svg[role=img] path').first().getAttribute('d');
  expect(onPage).toBeTruthy();
  expect(svg).toContain(onPage ?? '-');
  const png = await request.get((href ?? '').replace('plates.svg', 'plates.png'));
  expect((await png.body()).subarray(1, 4).toString()).toBe('PNG');
});

test('every pattern that the plate uses is there, before and after the page comes alive', async ({ page }) => {
  const screen = new ReadingScreen(page);
  await screen.open();
  await expect(screen.board).toBeVisible();
  const missing = await page.evaluate(() =>
    [...document.querySelectorAll('svg[role=img] [fill^="url(#"]')]
      .map((element) => /#([^)]+)/.exec(element.getAttribute('fill') ?? '')?.[1] ?? '')
      .filter((id) => document.getElementById(id) === null),
  );
  expect(missing).toEqual([]);
});
