/** From a fresh clone to a running site: installs, migrates, seeds, builds, serves. */
import { hostname } from 'node:os';
import { build, install, prepareDatabase, startServer, untilAnswers } from './steps.mjs';

/** Some shells and containers export HOSTNAME as the name of the machine; that is nobody's choice of address. */
const given = process.env.HOSTNAME;
const host = given && given !== hostname() ? given : '127.0.0.1';
const port = process.env.PORT || '3000';

install();
prepareDatabase();
build();

console.log(`\n▸ Starting the server on ${host}, port ${port}`);
const server = startServer({ host, port });
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 0));

const open = host === '0.0.0.0' || host === '::' ? 'localhost' : host;
try {
  await untilAnswers(`http://${open}:${port}/api/health`);
  console.log(`\n✓ Bendwell answers at http://${open}:${port}\n`);
} catch (error) {
  console.error(`✗ ${error.message}`);
  server.kill('SIGTERM');
}
