import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { type Browser, chromium, type Page } from '@playwright/test';
import { printTable } from './measure';

const PORT = 3219;
const BASE = `http://127.0.0.1:${PORT}`;
const WINDOWS = { large: [1440, 900], small: [420, 420] } as const;
const FIELDS = { 'cantilever-hook': 'Arm length', 'screw-cap': 'Cap height', 'living-hinge': 'Leaf length' };
const BUDGETS = { '/': 160, '/guide': 160, '/materials': 160, '/design/cantilever-hook': 220 } as const;
const EDITS = 12;

async function startServer(): Promise<ChildProcess> {
  const server = spawn(
    process.execPath,
    [
      path.join('node_modules', 'next', 'dist', 'bin', 'next'),
      'start',
      '-H',
      '127.0.0.1',
      '-p',
      String(PORT),
    ],
    { stdio: 'ignore' },
  );
  for (let tries = 0; tries < 100; tries += 1) {
    const up = await fetch(`${BASE}/api/health`).then(
      (answer) => answer.ok,
      () => false,
    );
    if (up) return server;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  server.kill();
  throw new Error('The server did not start: build the project first');
}

const openBrowser = (): Promise<Browser> =>
  chromium.launch({
    ...(existsSync('/usr/bin/chromium') && { executablePath: '/usr/bin/chromium' }),
    args: [
      '--headless',
      '--no-sandbox',
      '--disable-quic',
      '--use-angle=swiftshader',
      '--enable-unsafe-swiftshader',
    ],
  });

/** Median time in ms from a changed dimension to its picture, over edits by the arrow keys. */
async function changeToPicture(page: Page, family: string, label: string): Promise<number> {
  await page.goto(`${BASE}/design/${family}`);
  const stage = page.locator('[data-viewport="ready"]');
  await stage.waitFor({ timeout: 60_000 });
  await page.locator('[data-picture-ms]').waitFor();
  const field = page.getByLabel(label, { exact: true });
  await field.focus();
  const taken: number[] = [];
  for (let edit = 0; edit < EDITS; edit += 1) {
    const before = await stage.getAttribute('data-picture-ms');
    await page.keyboard.press(edit % 2 === 0 ? 'ArrowUp' : 'ArrowDown');
    await page.waitForFunction(
      (last) => document.querySelector('[data-picture-ms]')?.getAttribute('data-picture-ms') !== last,
      before,
    );
    taken.push(Number(await stage.getAttribute('data-picture-ms')));
    await page.waitForTimeout(300);
  }
  return taken.sort((a, b) => a - b)[EDITS / 2]!;
}

async function benchPictures(browser: Browser): Promise<void> {
  const rows = [['part', 'large window', 'small window', 'large against small']];
  for (const [family, label] of Object.entries(FIELDS)) {
    const taken: number[] = [];
    for (const [width, height] of Object.values(WINDOWS)) {
      const page = await browser.newPage({ viewport: { width, height } });
      taken.push(await changeToPicture(page, family, label));
      await page.close();
    }
    const [large, small] = taken as [number, number];
    rows.push([family, `${large} ms`, `${small} ms`, `${(large / small).toFixed(1)} x`]);
  }
  printTable('Changed dimension to its picture, drawn in software (the windows differ in pixels only)', rows);
}

/** Script that a page loads by itself, KB gzip. */
async function scriptOf(place: string): Promise<number> {
  const html = await (await fetch(BASE + place)).text();
  const modern = html.replace(/<script[^>]*noModule[^>]*>/gi, '');
  const named = new Set([...modern.matchAll(/\/_next\/static\/[^"\\]+\.js/g)].map(([url]) => url));
  const sizes = await Promise.all(
    [...named].map(async (url) => gzipSync(await (await fetch(BASE + url)).arrayBuffer()).byteLength),
  );
  return sizes.reduce((sum, size) => sum + size, 0) / 1024;
}

async function benchScripts(): Promise<void> {
  const rows = [['page', 'script', 'budget', 'of the budget']];
  for (const [place, budget] of Object.entries(BUDGETS)) {
    const size = await scriptOf(place);
    rows.push([place, `${size.toFixed(0)} KB`, `${budget} KB`, `${(size / budget).toFixed(2)} x`]);
  }
  printTable('Script named by a page, gzip', rows);
}

export async function run(): Promise<void> {
  if (!existsSync('.next/BUILD_ID')) {
    console.log('\nPictures and scripts are left out: build the project first.');
    return;
  }
  const server = await startServer();
  const browser = await openBrowser();
  try {
    await benchPictures(browser);
    await benchScripts();
  } finally {
    await browser.close();
    server.kill();
  }
}
