import AxeBuilder from '@axe-core/playwright';
import { type Browser, expect, type Page, test } from '@playwright/test';

import { DEMO_PASSWORD } from '../../db/seed/demo-members';

const VISITED = [
  '/sign-in',
  '/forgot-password',
  '/accept-invite?token=none',
  '/reset-password',
  '/verify-email',
];
const ADMIN = [
  '/account',
  '/admin',
  '/admin/members/demo-ines',
  '/admin/invitations',
  '/admin/mail',
  '/admin/audit',
];

const main = (page: Page) => page.getByRole('main');

function failOnErrors(page: Page) {
  page.on('console', (message) => {
    expect(message.type() === 'error' ? message.text() : '', 'console error').toBe('');
  });
}

async function signIn(page: Page, email: string, password = DEMO_PASSWORD) {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await main(page).getByRole('button', { name: 'Sign in' }).click();
}

async function signedIn(browser: Browser, name: string, options = {}): Promise<Page> {
  const page = await (await browser.newContext(options)).newPage();
  failOnErrors(page);
  await signIn(page, `${name}@millrace.example`);
  await expect(page).toHaveURL(/\/account$/);
  return page;
}

async function looksSound(page: Page, path: string) {
  await page.goto(path);
  await expect(page.locator('h1')).toHaveCount(1);
  const sideways = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(sideways, `${path} scrolls sideways`).toBeLessThanOrEqual(1);
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations, path).toEqual([]);
}

test('invites, accepts, suspends: from the mail to the closed door', async ({ browser }) => {
  const admin = await signedIn(browser, 'orla');
  const email = `mira${Date.now()}@millrace.example`;
  await admin.getByRole('link', { name: 'Run the club' }).click();
  await admin.getByRole('link', { name: 'Invitations' }).click();
  await admin.getByLabel('E-mail address').fill(email);
  await admin.getByRole('button', { name: 'Send the invitation' }).click();
  const notice = main(admin).locator('[data-notice]');
  await expect(notice).toHaveText(`An invitation to ${email} is on its way.`);
  await expect(notice).toBeFocused();

  await admin.getByRole('link', { name: 'Outgoing mail' }).click();
  const mailBox = await admin.getByRole('link', { name: 'Read what was sent' }).getAttribute('href');
  const guest = await (await browser.newContext()).newPage();
  failOnErrors(guest);
  const letter = guest.locator('article').filter({ hasText: email });
  await expect(async () => {
    await guest.goto(mailBox!);
    await expect(letter).toBeVisible({ timeout: 1000 });
  }).toPass();
  await letter.getByRole('link').first().click();

  await expect(guest.getByRole('heading', { name: 'Welcome to Millrace Model Club' })).toBeVisible();
  await guest.getByRole('button', { name: 'Join' }).click();
  await expect(guest.getByLabel('Your name')).toBeFocused();
  await guest.getByLabel('Your name').fill('Mira Sand');
  await guest.getByLabel('New password').fill('short');
  await guest.getByRole('button', { name: 'Join' }).click();
  await expect(guest.getByLabel('New password')).toBeFocused();
  await expect(guest.getByLabel('New password')).toHaveValue('');
  await expect(guest.getByLabel('Your name')).toHaveValue('Mira Sand');
  await guest.getByLabel('New password').fill('kettle anvil heron');
  await guest.getByRole('button', { name: 'Join' }).click();
  await expect(guest.getByRole('heading', { name: 'Mira Sand' })).toBeVisible();
  await expect(guest.getByRole('banner').getByRole('link', { name: 'Mira S.' })).toBeVisible();

  await admin.getByRole('link', { name: 'Members', exact: true }).click();
  await admin.getByLabel('Name or address').fill(email);
  await admin.getByRole('button', { name: 'Find' }).click();
  await admin.getByRole('link', { name: 'Mira Sand' }).click();
  await admin.getByLabel('Reason').fill('Left the club');
  await admin.getByRole('button', { name: 'Suspend Mira Sand' }).click();
  await expect(main(admin).getByText('suspended', { exact: true })).toBeVisible();

  await guest.goto('/account');
  await expect(guest).toHaveURL(/\/sign-in\?next=%2Faccount$/);
  await signIn(guest, email, 'kettle anvil heron');
  await expect(main(guest).getByText(/This account is suspended/)).toBeVisible();
  await admin.goto('/admin/audit?action=member.suspend');
  await expect(main(admin).getByText(email).first()).toBeVisible();
});

test('signs out, and the way back leads through the sign-in to where one was', async ({ browser }) => {
  const page = await signedIn(browser, 'bram');
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('banner').getByRole('link', { name: 'Sign in' })).toBeVisible();
  expect((await page.context().cookies()).map(({ name }) => name)).toEqual([]);
  await page.goto('/account');
  await page.getByLabel('E-mail address').fill('bram@millrace.example');
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await main(page).getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Bram Okafor' })).toBeVisible();
});

for (const [look, options] of [
  ['on a wide screen', { viewport: { width: 1440, height: 1000 } }],
  ['on a narrow dark one', { viewport: { width: 390, height: 844 }, colorScheme: 'dark' }],
] as const) {
  test(`the pages of accounts and of the club are sound ${look}`, async ({ browser }) => {
    const visitor = await (await browser.newContext(options)).newPage();
    for (const path of VISITED) await looksSound(visitor, path);
    const admin = await signedIn(browser, 'orla', options);
    for (const path of [...ADMIN, '/admin/club']) await looksSound(admin, path);
  });
}

test('works without scripts: signs in, and comes back with the fault and what was typed', async ({
  browser,
}) => {
  const page = await (await browser.newContext({ javaScriptEnabled: false })).newPage();
  await signIn(page, 'bram@millrace.example', 'not the password');
  await expect(page.getByText('Address and password do not fit together')).toBeVisible();
  await expect(page.getByLabel('E-mail address')).toHaveValue('bram@millrace.example');
  await signIn(page, 'bram@millrace.example');
  await expect(page.getByRole('heading', { name: 'Bram Okafor' })).toBeVisible();
});

test('every answer carries the security headers, and no page allows a script without the nonce', async ({
  page,
  request,
}) => {
  for (const path of [
    '/',
    '/nowhere',
    '/theme.js',
    '/api/health',
    '/icon.svg',
    '/guide/screw-cap/part.svg',
  ]) {
    const headers = (await request.get(path)).headers();
    expect(headers['x-content-type-options'], path).toBe('nosniff');
    expect(headers['content-security-policy'], path).toContain("frame-ancestors 'none'");
    expect(headers['x-frame-options'], path).toBe('DENY');
    expect(headers['referrer-policy'], path).toBeDefined();
    expect(headers['x-powered-by'], path).toBeUndefined();
  }
  expect((await request.get('/api/health')).headers()['content-security-policy']).toContain(
    "default-src 'none'",
  );
  const policy = (await page.goto('/'))!.headers()['content-security-policy']!;
  const scripts = policy.split('; ').find((rule) => rule.startsWith('script-src '))!;
  expect(scripts).toMatch(/^script-src 'self' 'nonce-[\da-f]{32}' 'wasm-unsafe-eval'$/);
  const blocked = await page.evaluate(async () => {
    const heard = new Promise<string>((resolve) => {
      document.addEventListener('securitypolicyviolation', (event) => resolve(event.violatedDirective), {
        once: true,
      });
    });
    const script = document.createElement('script');
    script.textContent = 'window.broken = true';
    document.head.append(script);
    return { rule: await heard, ran: 'broken' in window };
  });
  expect(blocked).toEqual({ rule: 'script-src-elem', ran: false });
});

test('a form posted from another site changes nothing', async ({ browser, request, baseURL }) => {
  const admin = await signedIn(browser, 'orla');
  const cookie = (await admin.context().cookies()).map(({ name, value }) => `${name}=${value}`).join('; ');
  const post = (headers: Record<string, string>) =>
    request.post('/admin/club/backup', { headers: { cookie, ...headers } });
  expect((await post({ origin: 'https://evil.example' })).status()).toBe(403);
  expect((await post({ origin: baseURL!, 'sec-fetch-site': 'cross-site' })).status()).toBe(403);
  expect((await post({})).status()).toBe(403);
  const own = await post({ origin: baseURL!, 'sec-fetch-site': 'same-origin' });
  expect(own.status()).toBe(200);
  expect((await own.body()).subarray(0, 15).toString()).toBe('SQLite format 3');
});
