import { existsSync } from 'node:fs';
import { defineConfig } from '@playwright/test';

const port = Number(process.env.E2E_PORT ?? 3210);
const mail = { smtp: port + 1, page: port + 2 };
const chromium = [process.env.CHROME_PATH, '/usr/bin/chromium'].find((place) => place && existsSync(place));

export default defineConfig({
  testDir: './tests/e2e',
  outputDir: './test-results',
  fullyParallel: true,
  workers: 2,
  retries: 1,
  // a picture drawn without a graphics card takes its time on a small machine
  timeout: 240_000,
  expect: { timeout: 60_000 },
  reporter: [['list']],
  use: {
    baseURL: `http://127.0.0.1:${port}`,
    trace: 'off',
    launchOptions: {
      ...(chromium && { executablePath: chromium }),
      args: [
        '--headless',
        '--no-sandbox',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--use-angle=swiftshader',
        '--enable-unsafe-swiftshader',
      ],
    },
  },
  webServer: [
    {
      name: 'mail',
      command: `node lib/scripts/mail-box.mjs ${mail.smtp} ${mail.page}`,
      url: `http://127.0.0.1:${mail.page}`,
      reuseExistingServer: false,
    },
    {
      name: 'site',
      command: `node node_modules/next/dist/bin/next start -H 127.0.0.1 -p ${port}`,
      url: `http://127.0.0.1:${port}/api/health`,
      env: {
        PORT: String(port),
        SMTP_URL: `smtp://127.0.0.1:${mail.smtp}`,
        MAIL_BOX_URL: `http://127.0.0.1:${mail.page}`,
      },
      reuseExistingServer: false,
      timeout: 60_000,
    },
  ],
});
