import { readFileSync } from 'node:fs';
import { expect, type Page, test } from '@playwright/test';

/** Every test fails on what the browser complains of. */
const complaints: string[] = [];

test.beforeEach(({ page }) => {
  complaints.length = 0;
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
});

test.afterEach(() => {
  expect(complaints).toEqual([]);
});

const field = (page: Page, name: string) => page.getByRole('spinbutton', { name, exact: true });
const verdict = (page: Page) => page.getByRole('region', { name: 'Verdict' }).getByRole('status');

/** Waits until the finite elements have answered for the part as it stands, or have said why not. */
const solved = (page: Page) =>
  expect(page.getByRole('region', { name: 'Verdict' })).toHaveAttribute('data-basis', /^(computed|formula)$/);

/** The picture is only put in by a page that is alive. */
const alive = (page: Page) => expect(page.locator('[data-viewport]')).toBeVisible({ timeout: 45_000 });

async function openHook(page: Page, query = ''): Promise<void> {
  await page.goto(`/design/cantilever-hook${query}`);
  await alive(page);
}

test('goes from choosing a part to its file, and back by its link', async ({ page, browser }) => {
  await page.goto('/design');
  await page.getByRole('link', { name: 'Cantilever hook' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Cantilever hook' })).toBeVisible();
  await alive(page);
  await solved(page);
  const before = await verdict(page).textContent();

  await field(page, 'Arm length').fill('24,5');
  await expect(verdict(page)).not.toHaveText(before!);
  await expect(page).toHaveURL(/armLength=24\.5/);
  await solved(page);
  const after = await verdict(page).textContent();

  await page.keyboard.press('Control+z');
  await expect(verdict(page)).toHaveText(before!);
  await page.keyboard.press('Control+Shift+z');
  await expect(verdict(page)).toHaveText(after!);
  await expect(page).toHaveURL(/armLength=24\.5/);

  const stranger = await browser.newContext();
  const other = await stranger.newPage();
  await other.goto(page.url());
  await expect(field(other, 'Arm length')).toHaveValue('24.5');
  await expect(verdict(other)).toHaveText(after!);
  await stranger.close();

  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: 'Download STL' }).click(),
  ]);
  expect(download.suggestedFilename()).toMatch(/\.stl$/);
  const bytes = readFileSync((await download.path())!);
  expect(bytes.length).toBe(84 + 50 * bytes.readUInt32LE(80));
  expect(bytes.readUInt32LE(80)).toBeGreaterThan(20);
});

test('leads back to the page before with one press, however much was typed', async ({ page }) => {
  await page.goto('/design');
  await page.getByRole('link', { name: 'Cantilever hook' }).click();
  await alive(page);
  for (const text of ['20', '21', '22']) await field(page, 'Arm length').fill(text);
  await expect(page).toHaveURL(/armLength=22/);
  await page.goBack();
  await expect(page).toHaveURL(/\/design$/);
  await page.goForward();
  await expect(field(page, 'Arm length')).toHaveValue('22.0');
});

test('keeps a faulty entry, says what is wrong, and shows the last valid part', async ({ page }) => {
  await openHook(page);
  await solved(page);
  const before = await verdict(page).textContent();
  await field(page, 'Undercut').fill('99');
  const message = /Undercut must be at most [\d.]+ mm/;
  await expect(page.getByRole('alert').filter({ hasText: message })).toBeVisible();
  await expect(field(page, 'Undercut')).toHaveAttribute('aria-invalid', 'true');
  await expect(verdict(page)).toHaveText(before!);
  await page.getByRole('alert').getByRole('button', { name: 'to the field' }).click();
  await expect(field(page, 'Undercut')).toBeFocused();
  await field(page, 'Undercut').fill('1');
  await expect(page.getByText(message)).toHaveCount(0);
});

test('opens a link with a faulty value as far as it goes', async ({ page }) => {
  await openHook(page, '?armLength=9oo&undercut=1.2&colour=red');
  await expect(field(page, 'Arm length')).toHaveValue('9oo');
  await expect(field(page, 'Undercut')).toHaveValue('1.2');
  await expect(
    page.getByText('Arm length must be a number in mm').filter({ visible: true }).first(),
  ).toBeVisible();
  await expect(page.getByText('The link says colour')).toBeVisible();
});

test('applies a dimension that just meets the limit with one press', async ({ page }) => {
  await openHook(page, '?material=pla&armLength=12');
  await expect(verdict(page)).toHaveText(/over limit/);
  await solved(page);
  await page.getByRole('button', { name: /^Use Arm length/ }).click();
  await solved(page);
  await expect(verdict(page)).not.toHaveText(/over limit/);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(field(page, 'Arm length')).toHaveValue('12.0');
});

test('restores what was worked on, and starts fresh when asked', async ({ page }) => {
  await openHook(page);
  await field(page, 'Arm length').fill('31');
  await expect(page).toHaveURL(/armLength=31/);
  await openHook(page);
  await expect(page.getByText('Restored')).toBeVisible();
  await expect(field(page, 'Arm length')).toHaveValue(/^31/);
  await page.getByRole('button', { name: 'Start fresh' }).click();
  await expect(field(page, 'Arm length')).not.toHaveValue(/^31/);
});

test('lets two tabs of one part go their own ways', async ({ page, context }) => {
  await openHook(page);
  await field(page, 'Arm length').fill('25');
  await expect(page).toHaveURL(/armLength=25/);
  const other = await context.newPage();
  await openHook(other, '?armLength=35');
  await field(other, 'Undercut').fill('1.1');
  await expect(other).toHaveURL(/undercut=1\.1/);
  await expect(field(page, 'Arm length')).toHaveValue(/^25/);
  await page.reload();
  await expect(field(page, 'Arm length')).toHaveValue('25.0');
});

test('can be worked by keys alone', async ({ page }) => {
  await openHook(page);
  const arm = field(page, 'Arm length');
  const start = Number(await arm.inputValue());
  await arm.focus();
  await page.keyboard.press('ArrowUp');
  await expect(arm).not.toHaveValue(start.toFixed(1));
  await page.keyboard.press('Shift+ArrowDown');
  expect(Number(await arm.inputValue())).toBeLessThan(start);
  await page.keyboard.press('?');
  await expect(page.locator('#help-armLength')).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(page.locator('#help-armLength')).toBeHidden();
  await page.getByRole('slider', { name: 'Flex' }).focus();
  await page.keyboard.press('Home');
  await expect(page.getByRole('slider', { name: 'Flex' })).toHaveValue('0');
});

test('shows how the part lies on the bed and takes the layers from there', async ({ page }) => {
  await openHook(page);
  await page.getByRole('button', { name: 'On the bed' }).click();
  const lies = page.getByLabel('Lies');
  const options = await lies.locator('option').allTextContents();
  expect(options.length).toBeGreaterThan(1);
  await lies.selectOption({ index: 1 });
  await page.getByRole('button', { name: /Check it with layers across/ }).click();
  await expect(page.getByRole('combobox', { name: 'Printed layers' })).toHaveValue('across');
  await expect(page.getByRole('link', { name: 'Download STL' })).toHaveAttribute('href', /stance=/);
});

test('keeps the verdict in sight while the sheet is scrolled on a phone', async ({ browser, baseURL }) => {
  const phone = await browser.newContext({
    baseURL: baseURL!,
    viewport: { width: 390, height: 844 },
    hasTouch: true,
  });
  const page = await phone.newPage();
  await openHook(page);
  const top = async (selector: string) => (await page.locator(selector).boundingBox())!.y;
  expect(await top('[data-viewport]')).toBeLessThan(await top('#field-material'));
  const plastic = await page.locator('#field-material').boundingBox();
  expect(plastic!.width).toBeGreaterThan(290);
  await field(page, 'Clearance').scrollIntoViewIfNeeded();
  await expect(page.locator('[data-strip]')).toBeInViewport();
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(overflow).toBeLessThanOrEqual(0);
  await phone.close();
});

test('prints one clean sheet: nothing to press, no bar twice', async ({ page }) => {
  await openHook(page);
  await page.emulateMedia({ media: 'print', colorScheme: 'dark' });
  await expect(page.locator('[data-print]')).toBeVisible();
  await expect(page.getByText(/\/design\/cantilever-hook\?material=/)).toBeVisible();
  for (const control of await page.locator('button, select, input, [data-strip], nav').all()) {
    await expect(control).toBeHidden();
  }
  const ink = await page.locator('body').evaluate((body) => getComputedStyle(body).color);
  expect(ink).toBe('rgb(0, 0, 0)');
});

test('answers a part there is none of with a page that says so', async ({ page }) => {
  const answer = await page.goto('/design/no-such-part');
  expect(answer!.status()).toBe(404);
  await expect(page).toHaveTitle('Not found · Bendwell');
  await expect(page.getByRole('heading', { name: 'No such page' })).toBeVisible();
  complaints.length = 0;
});
