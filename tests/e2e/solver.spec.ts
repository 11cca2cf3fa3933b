import AxeBuilder from '@axe-core/playwright';
import { expect, type Locator, type Page, test } from '@playwright/test';
import sharp from 'sharp';

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

const STANDARDS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

const band = (page: Page) => page.getByRole('region', { name: 'Verdict' });
const solved = (page: Page) =>
  expect(band(page)).toHaveAttribute('data-basis', 'computed', { timeout: 90_000 });
const how = (page: Page) => page.locator('#how-computed');

async function percentOf(text: Locator): Promise<number> {
  return Number(/([\d.]+)\s*%/.exec((await text.textContent())!)![1]);
}

/** Pixels of a picture and how much its brightness spreads; 0 is a plain surface. */
async function look(picture: Locator): Promise<{ pixels: Buffer; contrast: number }> {
  const image = sharp(await picture.screenshot());
  const { channels } = await image.stats();
  const pixels = await image.raw().toBuffer();
  return { pixels, contrast: Math.max(...channels.slice(0, 3).map(({ stdev }) => stdev)) };
}

test('bears the verdict by finite elements, bends the picture to them and prints the mesh', async ({
  page,
}) => {
  await page.goto('/design/cantilever-hook');
  await solved(page);

  await test.step('the three figures stand side by side, the computed one bears the verdict', async () => {
    const [handbook, corrected, computed] = ['handbook', 'corrected', 'computed'].map((name) =>
      band(page).locator(`[data-figure="${name}"] dd`),
    ) as [Locator, Locator, Locator];
    await expect(computed).toContainText('bears the verdict');
    expect(await percentOf(handbook)).toBeLessThan(await percentOf(corrected));
    const shown = await percentOf(band(page).getByRole('status'));
    expect(await percentOf(computed)).toBe(shown);
    expect(Math.abs((await percentOf(corrected)) / shown - 1)).toBeLessThan(0.1);
    await expect(band(page)).toContainText('Stands on finite elements');
  });

  await test.step('its times are told to whoever watches', async () => {
    for (const name of ['data-solve-ms', 'data-solve-small-ms', 'data-first-answer-ms']) {
      expect(Number(await band(page).getAttribute(name))).toBeGreaterThan(0);
    }
  });

  await test.step('the slide moves the solved shape and reads it off', async () => {
    const stage = page.locator('[data-viewport="ready"][data-frames]');
    await expect(stage).toBeVisible();
    const slide = page.getByRole('slider', { name: 'Flex' });
    await slide.focus();
    await page.keyboard.press('End');
    await expect(page.locator('[data-solved-line]')).toContainText(
      /deflected 1\s?mm, force [\d.]+\s?N, strain/,
    );
    await expect(slide).toHaveAttribute('aria-valuetext', /deflected 1\s?mm/);
    await expect(stage).toHaveAccessibleDescription(/Bent shape by finite elements, at true scale/);
    await page.waitForTimeout(500);
    const bent = await look(stage.locator('canvas'));
    await slide.focus();
    await page.keyboard.press('Home');
    await expect(page.locator('[data-solved-line]')).toContainText(/deflected 0\s?mm/);
    await page.waitForTimeout(500);
    const rest = await look(stage.locator('canvas'));
    expect(bent.contrast).toBeGreaterThan(8);
    expect(rest.contrast).toBeGreaterThan(8);
    expect(bent.pixels.equals(rest.pixels)).toBe(false);
  });

  await test.step('a change is answered by the formula at once and by finite elements after', async () => {
    const before = await percentOf(band(page).getByRole('status'));
    await page.getByRole('spinbutton', { name: 'Arm length', exact: true }).fill('30');
    await solved(page);
    await expect.poll(() => percentOf(band(page).getByRole('status'))).toBeLessThan(0.6 * before);
  });

  await test.step('the mesh is printed, and solved once more on a finer one', async () => {
    await page.getByRole('button', { name: 'How this was computed' }).click();
    await expect(how(page).locator('summary')).toBeFocused();
    for (const term of ['Elements', 'Degrees of freedom', 'Solve time', 'Estimated error', 'Peak strain']) {
      await expect(how(page).getByRole('term').filter({ hasText: term })).toBeVisible();
    }
    const picture = how(page).getByRole('img', { name: /^Mesh of \d+ triangles, bent/ });
    expect((await look(picture)).contrast).toBeGreaterThan(8);
    await how(page).getByText('At rest', { exact: true }).click();
    await expect(how(page).getByRole('img', { name: /at rest$/ })).toBeVisible();
    await how(page).getByRole('button', { name: 'Solve on a finer mesh' }).click();
    await expect(how(page).getByRole('status')).toHaveText(/^Edges half as long: [\d.]+\s?%, [\d.]+ % from/, {
      timeout: 90_000,
    });
    await how(page).getByRole('button', { name: 'Show the finer mesh' }).click();
    await expect(how(page).getByRole('button', { name: 'Show the mesh in use' })).toBeVisible();
  });

  await test.step('nothing of it is a fault of access', async () => {
    const { violations } = await new AxeBuilder({ page }).withTags(STANDARDS).analyze();
    expect(violations).toEqual([]);
  });

  await test.step('force over deflection is drawn from the load steps', async () => {
    await page.getByText('Force over deflection', { exact: true }).first().click();
    await expect(page.getByText('by the load steps of the finite elements')).toBeVisible();
  });
});

test('says why the verdict stands on the formula for a part that is not plane', async ({ page }) => {
  await page.goto('/design/torsion-latch');
  await expect(band(page)).toHaveAttribute('data-basis', 'formula');
  await expect(band(page)).toContainText(
    'Stands on the corrected formula. The part does not bend as a plane shape',
  );
  await expect(band(page).locator('[data-figure="computed"]')).toHaveCount(0);
});

test('does not solve again for what does not change the outline', async ({ page }) => {
  await page.goto('/design/cantilever-hook');
  await solved(page);
  const times = async () => [
    await band(page).getAttribute('data-solve-small-ms'),
    await band(page).getAttribute('data-solve-ms'),
  ];
  const before = await times();
  await page.getByRole('combobox', { name: 'Opened' }).selectOption({ label: 'once' });
  await page.getByRole('spinbutton', { name: 'Clearance', exact: true }).fill('0.4');
  await expect(page).toHaveURL(/clearance=0\.4/);
  await solved(page);
  expect(await times()).toEqual(before);
});

for (const colorScheme of ['light', 'dark'] as const) {
  for (const viewport of [
    { width: 1440, height: 1000 },
    { width: 390, height: 844 },
  ]) {
    test.describe(`verification, ${colorScheme}, ${viewport.width} px`, () => {
      test.use({ colorScheme, viewport });

      test('shows references, convergence and tables without a fault of access', async ({ page }) => {
        await page.goto('/guide');
        await page.getByRole('link', { name: 'How far the computed strain can be trusted' }).click();
        await expect(page.getByRole('heading', { level: 1 })).toHaveText(/computed strain can be trusted/);
        const group = page.locator('details').filter({ hasText: 'Open ring' }).last();
        await group.locator('summary').click();
        await expect(group.getByRole('columnheader', { name: 'computed' })).toHaveCount(2);
        expect(await group.getByRole('row').count()).toBeGreaterThan(10);
        const wide = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        );
        expect(wide).toBeLessThanOrEqual(0);
        const { violations } = await new AxeBuilder({ page }).withTags(STANDARDS).analyze();
        expect(violations).toEqual([]);
      });
    });
  }
}
