/** Installs what the tests need and runs all of them: types, lint, unit, reference, integration, browser. */
import { mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureTestTools } from './browser.mjs';
import { build, checkTypes, install, prepareDatabase, step } from './steps.mjs';

const started = Date.now();
const tool = (title, name, file, args, env) =>
  step(title, process.execPath, [path.join('node_modules', name, file), ...args], env);

install();
const browser = await ensureTestTools();
checkTypes();
tool('Linting', '@biomejs/biome', 'bin/biome', ['check', '--error-on-warnings', '.']);
tool('Unit, reference and integration tests', 'vitest', 'vitest.mjs', ['run']);

const cache = path.resolve('tests', '.cache');
const database = path.join(cache, 'browser-tests.sqlite');
mkdirSync(cache, { recursive: true });
for (const tail of ['', '-wal', '-shm']) rmSync(database + tail, { force: true });
const env = { DATABASE_PATH: database, CHROME_PATH: browser };
prepareDatabase(env);
build();
tool('Browser tests', '@playwright/test', 'cli.js', ['test', ...process.argv.slice(2)], env);

console.log(`\n✓ Everything passed in ${((Date.now() - started) / 60000).toFixed(1)} min`);
