import AxeBuilder from '@axe-core/playwright';
import { expect, type Locator, type Page, test } from '@playwright/test';
import sharp from 'sharp';

const HOOK = '/design/cantilever-hook';

test.beforeEach(async ({ page }) => {
  page.on('console', (message) => {
    expect(message.type() === 'error' ? message.text() : '', 'console error').toBe('');
  });
});

async function open(page: Page, path = HOOK): Promise<Locator> {
  await page.goto(path);
  const stage = page.locator('[data-viewport="ready"][data-frames]');
  await expect(stage).toBeVisible({ timeout: 40_000 });
  await solved(page);
  await settled(stage);
  return stage;
}

/** The finite elements have answered, so the picture has its last shape. */
const solved = (page: Page) =>
  expect(page.getByRole('region', { name: 'Verdict' })).toHaveAttribute('data-basis', /^(computed|formula)$/);

const frames = async (stage: Locator): Promise<number> => Number(await stage.getAttribute('data-frames'));

/** Waits until no frame has been drawn for a while. */
async function settled(stage: Locator): Promise<void> {
  let last = -1;
  await expect
    .poll(
      async () => {
        const now = await frames(stage);
        const still = now === last;
        last = now;
        return still;
      },
      { intervals: [700] },
    )
    .toBe(true);
}

/** Spread of the brightness of what is drawn, 0 for a plain surface. */
async function contrast(picture: Locator): Promise<number> {
  const { channels } = await sharp(await picture.screenshot()).stats();
  return Math.max(...channels.slice(0, 3).map(({ stdev }) => stdev));
}

test('draws the part, not a blank canvas', async ({ page }) => {
  const stage = await open(page);
  const canvas = stage.locator('canvas');
  await expect(canvas).toHaveAttribute('role', 'img');
  await expect(canvas).toHaveAccessibleName(/hook/);
  expect(await contrast(canvas)).toBeGreaterThan(8);
});

test('says at once that the picture is being made, and no more once it is drawn', async ({
  page,
  request,
}) => {
  expect(await (await request.get(HOOK)).text()).toContain('Setting up the view…');
  await open(page);
  await expect(page.locator('[data-waiting]')).toHaveCount(0);
});

test('draws nothing while nothing changes', async ({ page }) => {
  const stage = await open(page);
  const before = await frames(stage);
  await page.mouse.move(300, 500);
  await page.mouse.move(500, 600);
  await page.waitForTimeout(1500);
  expect(await frames(stage)).toBe(before);
});

test('tells the part, its sizes and its largest strain in words', async ({ page }) => {
  const stage = await open(page);
  await expect(stage).toHaveAccessibleDescription(/2 bodies: hook, [\d.]+ by [\d.]+ by [\d.]+ mm, volume/);
  await expect(stage).toHaveAccessibleDescription(/Largest strain [\d.]+\s?% in (tension|compression)/);
});

test('turns by the arrow keys and looks from above by a number key', async ({ page }) => {
  const stage = await open(page);
  await stage.focus();
  const before = await frames(stage);
  await page.keyboard.press('ArrowRight');
  await expect.poll(() => frames(stage)).toBeGreaterThan(before);
  await page.keyboard.press('1');
  await expect(stage.locator('[data-dimension="armLength"]')).toHaveCount(1);
  await page.keyboard.press('5');
  await expect(stage.locator('[data-dimension="armLength"]')).toHaveCount(0);
});

test('has buttons for fitting and the standard views', async ({ page }) => {
  const stage = await open(page);
  for (const name of ['Front', 'Right', 'Top', 'Corner', 'Fit']) {
    await page.getByRole('button', { name, exact: true }).click();
  }
  await page.getByRole('button', { name: 'Top', exact: true }).click();
  await expect(stage.locator('[data-dimension="armLength"]')).toHaveCount(0);
});

test('leaves the wheel to the page until the picture has the focus or Ctrl is held', async ({ page }) => {
  const stage = await open(page);
  await stage.hover();
  const before = await frames(stage);
  await page.mouse.wheel(0, 160);
  await expect.poll(() => page.evaluate(() => scrollY)).toBeGreaterThan(100);
  expect(await frames(stage)).toBe(before);

  await stage.hover();
  await page.keyboard.down('Control');
  await page.mouse.wheel(0, -120);
  await page.keyboard.up('Control');
  await expect.poll(() => frames(stage)).toBeGreaterThan(before);
});

test('lets one finger scroll the page up and down', async ({ page }) => {
  const stage = await open(page);
  const action = await stage.locator('canvas').evaluate((canvas) => {
    const actions: string[] = [];
    for (let at: Element = canvas; !at.hasAttribute('data-viewport'); at = at.parentElement!) {
      actions.push(getComputedStyle(at).touchAction);
    }
    return actions;
  });
  expect(action[0]).toBe('pan-y');
  expect(action.filter((allowed) => allowed !== 'pan-y' && allowed !== 'auto')).toEqual([]);
});

test('gives back what it holds on the graphics card over many rebuilds', async ({ page }) => {
  const stage = await open(page);
  const held = async () =>
    [await stage.getAttribute('data-geometries'), await stage.getAttribute('data-textures')].join();
  await page.getByRole('button', { name: 'Corner', exact: true }).click();
  await settled(stage);
  const before = await held();
  const length = page.getByLabel('Arm length', { exact: true });
  await length.focus();
  for (let k = 0; k < 50; k += 1) {
    const picture = await stage.getAttribute('data-picture-ms');
    await page.keyboard.press(k % 2 === 0 ? 'ArrowUp' : 'ArrowDown');
    await expect(stage).not.toHaveAttribute('data-picture-ms', picture!);
  }
  await solved(page);
  await settled(stage);
  await page.getByRole('button', { name: 'Corner', exact: true }).click();
  await settled(stage);
  expect(await held()).toBe(before);
});

test('shows the part flat, with a word about it, where there is no WebGL', async ({ page }) => {
  await page.addInitScript(() => {
    const original = HTMLCanvasElement.prototype.getContext;
    Object.assign(HTMLCanvasElement.prototype, {
      getContext(this: HTMLCanvasElement, kind: string, ...rest: unknown[]) {
        return kind.startsWith('webgl') ? null : Reflect.apply(original, this, [kind, ...rest]);
      },
    });
  });
  await page.goto(HOOK);
  const picture = page.getByRole('img', { name: /hook/ });
  await expect(picture.locator('path').first()).toBeVisible({ timeout: 40_000 });
  await expect(page.getByText('This browser draws no 3-D here')).toBeVisible();
  expect(await contrast(picture)).toBeGreaterThan(8);
  await page.getByRole('button', { name: 'Top', exact: true }).click();
  await expect(page.locator('[data-dimension="armLength"]')).toHaveCount(0);
});

test('goes on flat when the graphics card lets go of the picture', async ({ page }) => {
  const stage = await open(page);
  await stage.locator('canvas').evaluate((canvas: HTMLCanvasElement) => {
    canvas.getContext('webgl2')!.getExtension('WEBGL_lose_context')!.loseContext();
  });
  await expect(page.getByText('The graphics card let go of the picture')).toBeVisible();
  await expect(page.getByRole('img', { name: /hook/ }).locator('path').first()).toBeVisible();
});

test('has no faults that axe finds in the view', async ({ page }) => {
  await open(page);
  const { violations } = await new AxeBuilder({ page }).include('[aria-label="Part in 3-D"]').analyze();
  expect(violations).toEqual([]);
});
