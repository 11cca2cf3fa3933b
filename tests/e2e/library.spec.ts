import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';

const PASSWORD = 'millrace-demo-2026';

async function signIn(page: Page, name: string, next = '/designs'): Promise<void> {
  await page.goto(`/sign-in?next=${encodeURIComponent(next)}`);
  await page.getByLabel('E-mail address').fill(`${name}@millrace.example`);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(new RegExp(next));
}

const noFault = async (page: Page) =>
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);

test('a design is kept, published by a librarian, found by a visitor and started from', async ({
  browser,
}) => {
  const title = `Oar clip ${Date.now()}`;
  const member = await (await browser.newContext()).newPage();
  await signIn(member, 'bram', '/design/rod-clip');
  await member.getByRole('button', { name: 'Keep this design' }).click();
  await expect(member).toHaveURL(/\/designs\/[0-9a-f-]+$/);
  const design = new URL(member.url()).pathname;
  await expect(member.getByText(/^Saved/)).toBeVisible();

  const saved = member.waitForResponse((answer) => answer.request().method() === 'PUT' && answer.ok());
  await member.getByRole('spinbutton', { name: 'Rod diameter' }).fill('7.5');
  await saved;
  await member.reload();
  await expect(member.getByRole('spinbutton', { name: 'Rod diameter' })).toHaveValue('7.5');

  await member.getByRole('link', { name: 'Publish to the library' }).click();
  await member.getByLabel('Title').fill(title);
  await member.getByRole('button', { name: 'Hand in' }).click();
  await expect(member.getByText('Say what it is for')).toBeVisible();
  await expect(member.getByLabel('What for')).toBeFocused();
  await member.getByLabel('What for').fill('Holds an oar along the gunwale of the rowing model.');
  await member.getByLabel('Tags').fill('oar, rowing');
  await member.getByRole('button', { name: 'Hand in' }).click();
  await expect(member.getByText('Waiting for a librarian: version 1')).toBeVisible();
  await noFault(member);

  const librarian = await (await browser.newContext()).newPage();
  await signIn(librarian, 'tomas', '/review');
  await librarian.getByRole('link', { name: title }).click();
  await librarian.getByRole('button', { name: 'Run the check again' }).click();
  await expect(librarian.getByText(/as handed in; the shape has the same size/)).toBeVisible();
  await noFault(librarian);
  await librarian.getByRole('button', { name: 'Publish', exact: true }).click();
  await expect(librarian).toHaveURL(/\/review$/);

  const visitor = await (await browser.newContext()).newPage();
  await visitor.goto('/library');
  await visitor.getByRole('searchbox', { name: 'Search the library' }).fill(title);
  await visitor.getByRole('button', { name: 'Search' }).click();
  await expect(visitor).toHaveURL(/text=Oar/);
  await visitor.getByRole('link', { name: title }).click();
  await expect(visitor.getByRole('heading', { level: 1, name: title })).toBeVisible();
  await visitor.getByLabel('In your plastic').selectOption({ label: 'ASA' });
  await expect(visitor.getByText(/at most/)).toBeVisible();
  await visitor.getByRole('button', { name: 'Turn and bend it' }).click();
  await expect(visitor.locator('[data-viewport="ready"], [data-viewport="no-webgl"]')).toBeVisible();
  await visitor.getByRole('link', { name: 'Start from this' }).click();
  await expect(visitor.getByRole('spinbutton', { name: 'Rod diameter' })).toHaveValue('7.5');
  await expect(visitor.getByRole('link', { name: 'Sign in to keep it' })).toBeVisible();

  await member.goto(design);
  await member.getByRole('link', { name: 'History' }).click();
  await expect(member.getByRole('row', { name: /Rod diameter/ })).toContainText('7.5 mm');
  await noFault(member);
});

test('two tabs meet in a choice and not in a loss', async ({ context, page }) => {
  await signIn(page, 'ines', '/design/living-hinge');
  await page.getByRole('button', { name: 'Keep this design' }).click();
  await expect(page).toHaveURL(/\/designs\/[0-9a-f-]+$/);
  const other = await context.newPage();
  await other.goto(page.url());
  const width = (one: Page) => one.getByRole('spinbutton', { name: 'Width along the fold' });
  await expect(width(other)).toBeVisible();

  const saved = page.waitForResponse((answer) => answer.request().method() === 'PUT' && answer.ok());
  await width(page).fill('44');
  await saved;
  await width(other).fill('55');
  await expect(other.getByRole('alert').filter({ hasText: 'another tab' })).toBeVisible();
  await other.getByRole('button', { name: 'Take the other' }).click();
  await expect(width(other)).toHaveValue('44');
  await expect(other.getByText(/^Saved/)).toBeVisible();
});

test('a deleted design comes back', async ({ page }) => {
  await signIn(page, 'priya', '/designs');
  const first = page.getByRole('row').nth(1);
  const name = (await first.getByRole('link').first().textContent())!;
  await first.getByRole('button', { name: /^Delete/ }).click();
  await expect(page.getByRole('link', { name, exact: true })).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByRole('link', { name, exact: true })).toBeVisible();
});

for (const colorScheme of ['light', 'dark'] as const) {
  test(`the library and its pages have no fault of access and fit a narrow screen (${colorScheme})`, async ({
    page,
  }) => {
    await page.emulateMedia({ colorScheme });
    await page.setViewportSize({ width: 390, height: 844 });
    await signIn(page, 'tomas', '/designs');
    for (const path of [
      '/library',
      '/library?text=hatch',
      '/library/rigging-rod-clip',
      '/designs',
      '/review',
    ]) {
      await page.goto(path);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow, path).toBeLessThanOrEqual(0);
      await noFault(page);
    }
  });
}

test('what is not published is not found', async ({ page }) => {
  expect((await page.goto('/library/nothing-of-that-name'))?.status()).toBe(404);
  await page.goto('/review');
  await expect(page).toHaveURL(/\/sign-in/);
});
