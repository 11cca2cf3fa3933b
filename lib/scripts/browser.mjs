/** Finds or installs what the tests need beside npm packages: a Chromium and the mesh checker admesh. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { step } from './steps.mjs';

const PLACES = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
const answers = (command, args) => spawnSync(command, args, { stdio: 'ignore' }).status === 0;
const installed = () => [process.env.CHROME_PATH, ...PLACES].find((place) => place && existsSync(place));

/** Debian packages, where this is Debian and we may install. */
function aptInstall(packages) {
  if (process.getuid?.() !== 0 || !answers('apt-get', ['--version'])) return false;
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  step('Updating the package list', 'apt-get', ['update', '-qq'], env);
  step(
    `Installing ${packages.join(' and ')}`,
    'apt-get',
    ['install', '-y', '-qq', '--no-install-recommends', ...packages],
    env,
  );
  return true;
}

/** The Chromium that ships inside an npm package, unpacked into the project's own cache. */
async function packagedChromium() {
  const cache = path.resolve('tests', '.cache', 'chromium');
  mkdirSync(cache, { recursive: true });
  process.env.TMPDIR = cache;
  const { default: chromium } = await import('@sparticuz/chromium');
  return chromium.executablePath();
}

/** Path of a Chromium that can draw WebGL, and whether admesh is there. */
export async function ensureTestTools() {
  const missing = [];
  if (!installed()) missing.push('chromium');
  if (!answers('admesh', ['--version'])) missing.push('admesh');
  if (missing.length > 0) aptInstall(missing);
  const browser = installed() ?? (await packagedChromium());
  console.log(`▸ Browser for the tests: ${browser}`);
  if (!answers('admesh', ['--version'])) {
    console.error(
      '✗ The mesh tests need admesh: install the package "admesh" of your system, then run again.',
    );
    process.exit(1);
  }
  return browser;
}
