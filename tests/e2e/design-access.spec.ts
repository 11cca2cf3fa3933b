import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';

const SIZES = [
  { name: 'wide', width: 1440, height: 1000 },
  { name: 'phone', width: 390, height: 844 },
];
const STANDARDS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

for (const colorScheme of ['light', 'dark'] as const) {
  for (const { name, ...viewport } of SIZES) {
    test.describe(`${colorScheme}, ${name}`, () => {
      test.use({ colorScheme, viewport });

      test('the list of parts has no fault of access', async ({ page }) => {
        await page.goto('/design');
        const { violations } = await new AxeBuilder({ page }).withTags(STANDARDS).analyze();
        expect(violations).toEqual([]);
      });

      test('the design page has none within limits, nor with a fault typed and the part over its limit', async ({
        page,
      }) => {
        await page.goto('/design/cantilever-hook');
        await expect(page.getByRole('heading', { name: /Room before the limit/ })).toBeVisible({
          timeout: 45_000,
        });
        const calm = await new AxeBuilder({ page }).withTags(STANDARDS).analyze();
        expect(calm.violations).toEqual([]);

        await page.goto('/design/cantilever-hook?material=pla&armLength=12');
        await expect(page.locator('[data-viewport]')).toBeVisible({ timeout: 45_000 });
        await page.getByRole('spinbutton', { name: 'Undercut' }).fill('99');
        await expect(page.getByRole('alert').filter({ hasText: 'Undercut' })).toBeVisible();
        await expect(page.getByRole('heading', { name: /To make it gentler/ })).toBeVisible();
        const troubled = await new AxeBuilder({ page }).withTags(STANDARDS).analyze();
        expect(troubled.violations).toEqual([]);
      });
    });
  }
}

test('a palette chosen is kept, and set before the page is drawn', async ({ page }) => {
  await page.goto('/design');
  await page.getByRole('radio', { name: 'Dark' }).check();
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
  await page.reload({ waitUntil: 'commit' });
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
  await expect(page.getByRole('radio', { name: 'Dark' })).toBeChecked();
  await page.getByRole('radio', { name: 'As the system' }).check();
  await expect(page.locator('html')).not.toHaveAttribute('data-theme', /./);
});
