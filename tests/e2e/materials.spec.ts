import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';

function watchConsole(page: Page): string[] {
  const errors: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') errors.push(message.text());
  });
  page.on('pageerror', (error) => errors.push(String(error)));
  return errors;
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`a plastic can be read with all its sources (${colorScheme})`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    const errors = watchConsole(page);
    await page.goto('/materials');
    await expect(page.getByRole('heading', { level: 1, name: 'How far may it bend?' })).toBeVisible();
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);

    await page.getByRole('link', { name: 'PETG' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toContainText('PETG');
    const row = page.getByRole('row', { name: /^Yield strain/ });
    await expect(row).toContainText('5.1\u202f%');
    await expect(row).toContainText('as quoted in another text');
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    expect(errors).toEqual([]);
  });
}

test('a plastic leads to a design in it', async ({ page }) => {
  await page.goto('/materials/pp');
  await page.getByRole('link', { name: 'Living hinge' }).click();
  await expect(page).toHaveURL(/\/design\/living-hinge\?material=pp/);
});

test('the pages of the plastics fit a narrow screen', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  for (const path of ['/materials', '/materials/pa-conditioned', '/materials/pc-moulded']) {
    await page.goto(path);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow, path).toBeLessThanOrEqual(0);
  }
});

test('an unknown plastic is not found', async ({ page }) => {
  expect((await page.goto('/materials/wood'))?.status()).toBe(404);
});
