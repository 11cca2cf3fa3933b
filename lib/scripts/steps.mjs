/**
 * Shared steps of `npm run up` and `npm run check`. Node built-ins only: on a fresh clone nothing is installed yet.
 */
import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import path from 'node:path';

const bin = (name, file) => path.join('node_modules', name, file);
export const NEXT = bin('next', 'dist/bin/next');
export const TSX = bin('tsx', 'dist/cli.mjs');
export const TSC = bin('typescript', 'bin/tsc');

const quiet = { NEXT_TELEMETRY_DISABLED: '1' };

/** Says what is done, does it, and stops the script with the step's name when it fails. */
export function step(title, command, args, env = {}) {
  const started = Date.now();
  console.log(`\n▸ ${title}`);
  const run = spawnSync(command, args, { stdio: 'inherit', env: { ...process.env, ...quiet, ...env } });
  if (run.status !== 0) {
    console.error(`\n✗ ${title}: failed (${run.error?.message ?? `exit ${run.status ?? run.signal}`})`);
    process.exit(run.status || 1);
  }
  console.log(`  done in ${((Date.now() - started) / 1000).toFixed(1)} s`);
}

const node = (title, file, args, env) => step(title, process.execPath, [file, ...args], env);

/** Runs a TypeScript file of the server rooms. */
const script = (title, file, env = {}) =>
  step(title, process.execPath, [TSX, '--conditions=react-server', file], env);

function hashOf(files) {
  const hash = createHash('sha256');
  for (const file of files) hash.update(file).update(readFileSync(file));
  return hash.digest('hex');
}

const unchanged = (stamp, hash) => existsSync(stamp) && readFileSync(stamp, 'utf8') === hash;

function remember(stamp, hash) {
  mkdirSync(path.dirname(stamp), { recursive: true });
  writeFileSync(stamp, hash);
}

/** Installs the locked packages, unless the lock file is the one already installed. */
export function install() {
  const stamp = path.join('node_modules', '.installed-lock');
  const hash = hashOf(['package.json', 'package-lock.json']);
  if (unchanged(stamp, hash)) {
    console.log('▸ Packages are up to date');
    return;
  }
  const title = 'Installing packages (better-sqlite3 is compiled, which takes a minute or two)';
  step(title, 'npm', ['ci', '--no-audit', '--no-fund']);
  remember(stamp, hash);
}

const SOURCE_ROOTS = ['app', 'components', 'lib', 'generators', 'db', 'public'];
const SOURCE_FILES = [
  'package-lock.json',
  'next.config.mjs',
  'tailwind.config.ts',
  'postcss.config.mjs',
  'tsconfig.json',
];

function walk(folder) {
  return readdirSync(folder, { withFileTypes: true })
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => {
      const file = path.join(folder, entry.name);
      return entry.isDirectory() ? walk(file) : [file];
    });
}

/** Builds the site, unless the build that is there was made from these sources. */
export function build() {
  const stamp = path.join('.next', 'built-from');
  const sources = [...SOURCE_FILES, ...SOURCE_ROOTS.filter((root) => existsSync(root)).flatMap(walk)];
  const hash = hashOf(sources);
  if (unchanged(stamp, hash)) {
    console.log('▸ The build is up to date');
    return;
  }
  node('Building the site', NEXT, ['build']);
  remember(stamp, hash);
}

/** Brings the database file up to date and fills in what is missing. */
export function prepareDatabase(env = {}) {
  script('Migrating the database', 'db/migrate.ts', env);
  script('Seeding the database', 'db/seed/run.ts', env);
}

/** Generated route types first, without which the pages do not type-check. */
export function checkTypes() {
  node('Generating route types', NEXT, ['typegen']);
  node('Checking types', TSC, ['--noEmit']);
  node('Checking types of the part families without DOM or Node', TSC, [
    '--noEmit',
    '-p',
    'generators/tsconfig.json',
  ]);
}

/** Starts the server itself, never through npm or npx, which would leave it alive when killed. */
export function startServer({ host, port, env = {} }) {
  return spawn(process.execPath, [NEXT, 'start', '-H', host, '-p', String(port)], {
    stdio: 'inherit',
    env: { ...process.env, ...quiet, ...env },
  });
}

/** Whether something else already listens there. */
export function isTaken(host, port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', (error) => resolve(error.code === 'EADDRINUSE'));
    probe.listen({ host, port }, () => probe.close(() => resolve(false)));
  });
}

/** npm does not hand on every signal: stop when it has gone and left this script behind. */
export function whenOrphaned(stop) {
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && stop(), 1000).unref();
}

/** Resolves when the address answers with success; rejects after the time given. */
export async function untilAnswers(url, seconds = 60) {
  const end = Date.now() + seconds * 1000;
  while (Date.now() < end) {
    const answer = await fetch(url).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error(`${url} did not answer within ${seconds} s`);
}
