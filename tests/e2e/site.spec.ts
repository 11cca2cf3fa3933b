import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';

const PAGES = ['/', '/guide', '/guide/cantilever-hook', '/guide/screw-cap', '/about'];

test.beforeEach(async ({ page }) => {
  page.on('console', (message) => {
    expect(message.type() === 'error' ? message.text() : '', 'console error').toBe('');
  });
});

const bands = (page: Page) => page.getByRole('region', { name: 'One bend, five plastics' });
const verdict = (page: Page, plastic: string) =>
  bands(page)
    .getByRole('listitem')
    .filter({ hasText: new RegExp(`^${plastic}`) });

for (const path of PAGES) {
  test(`${path} has one heading, no faults that axe finds and does not scroll sideways`, async ({ page }) => {
    await page.goto(path);
    await expect(page.locator('h1')).toHaveCount(1);
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(sideways).toBeLessThanOrEqual(1);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations).toEqual([]);
  });
}

test.describe('the part on the first page', () => {
  test.use({ contextOptions: { reducedMotion: 'reduce' } });

  test('breaks one plastic after the other as it is pulled', async ({ page }) => {
    await page.goto('/');
    await expect(verdict(page, 'PLA')).toContainText('over limit');
    await expect(verdict(page, 'PP')).toContainText('within limit');
    const pull = page.getByRole('slider', { name: 'Pull' });
    await pull.fill('1');
    await expect(verdict(page, 'PLA')).toContainText('within limit');
    await pull.fill('6');
    await expect(verdict(page, 'PP')).toContainText('over limit');
    await expect(verdict(page, 'TPU 95A')).toContainText('within limit');
  });

  test('bends by pulling on its catch', async ({ page }) => {
    await page.goto('/');
    await expect(page.getByRole('slider', { name: 'Pull' })).toHaveValue('2.4');
    const before = await page.getByRole('img', { name: /snap hook/ }).innerHTML();
    const grip = page.locator('[data-grip]');
    const box = (await grip.boundingBox())!;
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x - 30, y + 5, { steps: 4 });
    await page.mouse.up();
    const value = Number(await page.getByRole('slider', { name: 'Pull' }).inputValue());
    expect(value).toBeGreaterThan(3);
    expect(await page.getByRole('img', { name: /snap hook/ }).innerHTML()).not.toBe(before);
  });

  test('opens on the design page as it is', async ({ page }) => {
    await page.goto('/');
    await page.getByRole('link', { name: 'Change this hook' }).click();
    await expect(page).toHaveURL(/\/design\/cantilever-hook\?.*armLength=32/);
  });
});

test('shows the part and its figures before any script has run', async ({ browser, baseURL }) => {
  const context = await browser.newContext({ javaScriptEnabled: false, ...(baseURL && { baseURL }) });
  const page = await context.newPage();
  await page.goto('/');
  await expect(
    page
      .getByRole('img', { name: /snap hook/ })
      .locator('path')
      .first(),
  ).toBeVisible();
  await expect(verdict(page, 'PETG')).toContainText('allowed 1');
  await context.close();
});

test('leads nowhere that is not there', async ({ page, request }) => {
  const seen = new Set<string>();
  for (const path of PAGES) {
    await page.goto(path);
    const links = await page
      .locator('a[href^="/"]')
      .evaluateAll((all) => all.map((link) => new URL((link as HTMLAnchorElement).href).pathname));
    for (const link of links) seen.add(link);
  }
  expect(seen.size).toBeGreaterThan(12);
  for (const link of seen) expect((await request.get(link)).status(), link).toBe(200);
});

test('answers 404 for the guide of a part that is not there', async ({ request }) => {
  expect((await request.get('/guide/no-such-part')).status()).toBe(404);
  expect((await request.get('/guide/no-such-part/part.svg')).status()).toBe(404);
});

test('writes the picture of every part as an SVG file', async ({ page, request }) => {
  await page.goto('/');
  const pictures = await page
    .locator('img[src$=".svg"]')
    .evaluateAll((all) => all.map((image) => image.getAttribute('src')!));
  expect(pictures.length).toBeGreaterThan(3);
  for (const picture of pictures) {
    const answer = await request.get(picture);
    expect(answer.headers()['content-type']).toContain('image/svg+xml');
    expect(await answer.text()).toMatch(/^<svg .*<path .*<\/svg>$/s);
  }
});
