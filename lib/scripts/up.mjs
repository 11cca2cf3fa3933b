/** From a fresh clone to a running site: installs, migrates, seeds, builds, serves. */
import { hostname } from 'node:os';
import {
  build,
  install,
  isTaken,
  prepareDatabase,
  startServer,
  untilAnswers,
  whenOrphaned,
} from './steps.mjs';

/** Some shells and containers export HOSTNAME as the name of the machine; that is nobody's choice of address. */
const given = process.env.HOSTNAME;
const host = given && given !== hostname() ? given : '127.0.0.1';
const port = process.env.PORT || '3000';

if (await isTaken(host, Number(port))) {
  console.error(`✗ Something else listens on ${host}, port ${port}: stop it, or choose another by PORT=3001`);
  process.exit(1);
}

install();
prepareDatabase();
build();

/** Without a mail server the demo gets one of its own, which keeps every mail on this machine. */
async function demoMail() {
  const real =
    process.env.SMTP_URL || process.env.SEED === 'plain' || process.env.PUBLIC_URL?.startsWith('https');
  if (real) return null;
  const { startMailBox } = await import('./mail-box.mjs');
  return startMailBox();
}

const box = await demoMail();
const env = box ? { SMTP_URL: box.smtpUrl, MAIL_BOX_URL: box.pageUrl } : {};

console.log(`\n▸ Starting the server on ${host}, port ${port}`);
const server = startServer({ host, port, env: { PORT: port, ...env } });
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
if (process.env.npm_lifecycle_event) whenOrphaned(() => server.kill('SIGTERM'));
server.on('exit', (code) => process.exit(code ?? 0));

const open = host === '0.0.0.0' || host === '::' ? 'localhost' : host;
try {
  await untilAnswers(`http://${open}:${port}/api/health`);
  console.log(`\n✓ Bendwell answers at http://${open}:${port}`);
  if (box) console.log(`  Mail stays on this machine and can be read at ${box.pageUrl}`);
  console.log('');
} catch (error) {
  console.error(`✗ ${error.message}`);
  server.kill('SIGTERM');
}
