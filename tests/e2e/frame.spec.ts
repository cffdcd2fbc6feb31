/** The frame of every page: it renders, reads without scripts, keeps the theme, and its policy holds. */
import { expect, test } from '@playwright/test';
import { Screen } from './screens/screen';

const WIDTHS = [1440, 820, 390] as const;
const PAPER = { light: 'rgb(251, 248, 241)', dark: 'rgb(20, 26, 38)' } as const;

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of WIDTHS) {
    test(`the first page at ${width} px, ${colorScheme}: axe finds nothing, nothing overflows`, async ({ browser }) => {
      const context = await browser.newContext({ colorScheme, viewport: { width, height: 900 } });
      const screen = new Screen(await context.newPage(), '/');
      expect(await screen.open()).toBe(200);
      await expect(screen.page.locator('html')).toHaveCSS('background-color', PAPER[colorScheme]);
      await screen.expectNoSidewaysScroll();
      await screen.expectAccessible();
      expect(screen.complaints).toEqual([]);
      await context.close();
    });
  }
}

test('a chosen theme is kept, and given up when it is the system’s again', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'light' });
  const html = page.locator('html');
  await new Screen(page, '/').open();
  await page.getByRole('button', { name: 'Dark theme' }).click();
  await expect(html).toHaveCSS('background-color', PAPER.dark);
  await page.reload();
  await expect(html).toHaveCSS('background-color', PAPER.dark);
  await page.getByRole('button', { name: 'Light theme' }).click();
  await page.emulateMedia({ colorScheme: 'dark' });
  await expect(html).toHaveCSS('background-color', PAPER.dark);
});

test('the first Tab leads past the header', async ({ page }) => {
  await new Screen(page, '/').open();
  await page.keyboard.press('Tab');
  const skip = page.getByRole('link', { name: 'Skip to the page' });
  await expect(skip).toBeFocused();
  await expect(skip).toBeInViewport();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('main')).toBeFocused();
});

test('an address where nothing is says so with 404', async ({ page }) => {
  const screen = new Screen(page, '/no-such-page');
  expect(await screen.open()).toBe(404);
  await screen.expectAccessible();
  await page.getByRole('link', { name: 'Read a position' }).click();
  // The first page writes its position into the address as soon as it is alive.
  await expect(page).toHaveURL(({ pathname }) => pathname === '/');
});

test('each answer has its own nonce, and a script without it does not run', async ({ page, request }) => {
  const policies = await Promise.all([request.get('/'), request.get('/')]);
  const nonces = policies.map(
    (answer) => /'nonce-([^']+)'/.exec(answer.headers()['content-security-policy'] ?? '')?.[1],
  );
  expect(nonces[0]).toBeTruthy();
  expect(nonces[0]).not.toBe(nonces[1]);

  await new Screen(page, '/').open();
  const ran = await page.evaluate(() => {
    const script = document.createElement('div');
    script.innerHTML = '<img src="data:," onerror="window.ranInline = true">';
    document.body.append(script);
    return new Promise((resolve) => setTimeout(() => resolve('ranInline' in window), 200));
  });
  expect(ran).toBe(false);
});

test('pages and static files carry the usual headers, and nobody may frame a page', async ({ request }) => {
  for (const address of ['/', '/icon.svg']) {
    const headers = (await request.get(address)).headers();
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['referrer-policy']).toBe('strict-origin-when-cross-origin');
    expect(headers['permissions-policy']).toContain('camera=()');
    expect(headers['x-powered-by']).toBeUndefined();
  }
  expect((await request.get('/')).headers()['content-security-policy']).toContain("frame-ancestors 'none'");
  const api = (await request.get('/api/health')).headers();
  expect(api['x-content-type-options']).toBe('nosniff');
  expect(api['content-security-policy']).toContain("default-src 'none'");
});
