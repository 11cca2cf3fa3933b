/// <reference types="vite/client" />
import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';

import { eq } from 'drizzle-orm';
import { afterAll, describe, expect, it, vi } from 'vitest';
import { users } from '@/db/schema/members';
import type { Member } from '@/lib/access/policy';
import { lucia } from '@/lib/auth/lucia';
import { readSession } from '@/lib/auth/session';
import type { FormAction } from '@/lib/forms/state';
import { closePicturePool } from '@/lib/jobs/picture-pool';
import { Browser, isNotFound, OWN_PAGE, redirectOf, SITE } from '../../support/browser';
import { demoClub } from '../../support/demo-club';
import { ACTIONS, type Admission, type Entry, HANDLERS, PAGES } from './admissions';

vi.mock('next/server', () => ({
  after: (work: () => Promise<unknown>) => work(),
  connection: () => Promise.resolve(),
}));

const db = await demoClub();
afterAll(() => closePicturePool());

type Outcome = 'in' | 'sign-in' | 'refused' | 'not-found';
type Handler = (request: Request, context: { params: Promise<unknown> }) => Promise<Response>;
type Page = (props: { params: Promise<unknown>; searchParams: Promise<unknown> }) => Promise<unknown>;

/** Who tries each door; null is a visitor. The thing that belongs to somebody belongs to "member". */
const VIEWERS = {
  visitor: null,
  member: 'demo-ines',
  'other member': 'demo-bram',
  host: 'demo-priya',
  librarian: 'demo-tomas',
  admin: 'demo-orla',
  suspended: 'demo-wendel',
} as const;
type ViewerName = keyof typeof VIEWERS;
const NAMES = Object.keys(VIEWERS) as ViewerName[];

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
const pages = import.meta.glob<{ default: Page }>('/app/**/page.tsx');
const routes = import.meta.glob<Record<string, unknown>>('/app/**/route.ts');
const actions = import.meta.glob<Record<string, unknown>>('/app/**/actions.ts');

const nameOf = (file: string) =>
  file.replace(/^\/app\//, '').replace(/\/?(page\.tsx|route\.ts|actions\.ts)$/, '');

async function secretOf(userId: string): Promise<string> {
  const now = new Date();
  const { id } = await lucia().createSession(userId, { createdAt: now, seenAt: now, userAgent: '' });
  return id;
}

async function browserOf(viewer: ViewerName): Promise<Browser> {
  const browser = new Browser();
  const userId = VIEWERS[viewer];
  if (userId !== null) browser.jar.set(lucia().sessionCookieName, await secretOf(userId));
  return browser;
}

const owner: Member = (await readSession(await secretOf(VIEWERS.member)))!.viewer;

function mayEnter(admission: Admission, viewer: ViewerName): boolean {
  if (admission === 'anyone') return true;
  if (viewer === 'visitor' || viewer === 'suspended') return false;
  if (admission === 'member') return true;
  return viewer === (admission === 'owner' ? 'member' : admission);
}

function expected(admission: Admission, viewer: ViewerName, refusal: Outcome): Outcome {
  if (mayEnter(admission, viewer)) return 'in';
  if (viewer === 'visitor' || viewer === 'suspended') return 'sign-in';
  return admission === 'owner' ? 'not-found' : refusal;
}

async function throughPage(page: Page, entry: Entry, browser: Browser): Promise<Outcome> {
  const params = Promise.resolve((await entry.params?.(owner)) ?? {});
  try {
    await browser.within(() => page({ params, searchParams: Promise.resolve({}) }));
    return 'in';
  } catch (error) {
    if (isNotFound(error)) return 'not-found';
    const goesTo = redirectOf(error);
    if (goesTo === undefined) throw error;
    return goesTo.startsWith('/sign-in?next=') ? 'sign-in' : 'in';
  }
}

function requestOf(method: string, { body }: Entry, browser: Browser): Request {
  const cookie = [...browser.jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const headers = { ...OWN_PAGE, 'content-type': 'application/json', ...(cookie && { cookie }) };
  const sent = body === undefined ? {} : { body: JSON.stringify(body) };
  return new Request(`${SITE}/anywhere`, { method, headers, ...sent });
}

async function throughHandler(
  handler: Handler,
  method: string,
  entry: Entry,
  browser: Browser,
): Promise<Outcome> {
  const params = Promise.resolve((await entry.params?.(owner)) ?? {});
  const { status } = await browser.within(() => handler(requestOf(method, entry, browser), { params }));
  expect(status, `${method} answers`).toBeLessThan(500);
  if (status === 401) return 'sign-in';
  if (status === 403) return 'refused';
  return status === 404 && entry.admission === 'owner' ? 'not-found' : 'in';
}

async function throughAction(action: FormAction, entry: Entry, browser: Browser): Promise<Outcome> {
  const { notice } = await browser.submit(action, entry.fields ?? {});
  if (notice?.text === 'Sign in to do this.') return 'sign-in';
  return notice?.text === 'Your account may not do this.' ? 'refused' : 'in';
}

async function outcomes(go: (browser: Browser) => Promise<Outcome>): Promise<Record<string, Outcome>> {
  const seen: Record<string, Outcome> = {};
  for (const viewer of NAMES) seen[viewer] = await go(await browserOf(viewer));
  return seen;
}

const wanted = ({ admission }: Entry, refusal: Outcome): Record<string, Outcome> =>
  Object.fromEntries(NAMES.map((viewer) => [viewer, expected(admission, viewer, refusal)]));

/** Handlers that only say which methods the address takes are closed to everyone alike. */
async function openMethods(file: string): Promise<string[]> {
  const exported = await routes[file]!();
  const open: string[] = [];
  for (const method of METHODS) {
    const handler = exported[method] as Handler | undefined;
    if (!handler) continue;
    const request = requestOf(method, { admission: 'anyone' }, new Browser());
    const answer = await new Browser().within(() => handler(request, { params: Promise.resolve({}) }));
    if (answer.status !== 405) open.push(method);
  }
  return open;
}

const METHODS_OF = await Promise.all(
  Object.keys(routes).map(async (file) => [file, await openMethods(file)] as const),
);
const ACTIONS_OF = await Promise.all(
  Object.entries(actions).map(async ([file, load]) => [file, Object.keys(await load())] as const),
);

describe('the list of doors', () => {
  it('names every page, and none that is gone', () => {
    expect(Object.keys(pages).map(nameOf).sort()).toEqual(Object.keys(PAGES).sort());
  });

  it('names every route handler, and none that is gone', () => {
    const found = METHODS_OF.flatMap(([file, methods]) =>
      methods.map((method) => `${method} ${nameOf(file)}`),
    );
    expect(found.sort()).toEqual(Object.keys(HANDLERS).sort());
  });

  it('names every server action, and none that is gone', () => {
    const found = ACTIONS_OF.flatMap(([file, names]) => names.map((name) => `${nameOf(file)}#${name}`));
    expect(found.sort()).toEqual(Object.keys(ACTIONS).sort());
  });

  it('has server actions in files named actions.ts only', () => {
    const listed = execFileSync(
      'git',
      ['ls-files', '-co', '--exclude-standard', 'app', 'components', 'lib'],
      {
        encoding: 'utf8',
      },
    );
    const sources = listed.split('\n').filter((file) => /\.tsx?$/.test(file) && existsSync(file));
    const strays = sources.filter(
      (file) => !file.endsWith('/actions.ts') && /['"]use server['"]/.test(readFileSync(file, 'utf8')),
    );
    expect(strays).toEqual([]);
  });
});

describe('who gets in', () => {
  it.each(Object.entries(PAGES))('page %s', async (name, entry) => {
    const file = Object.keys(pages).find((one) => nameOf(one) === name)!;
    const { default: page } = await pages[file]!();
    expect(await outcomes((browser) => throughPage(page, entry, browser))).toEqual(
      wanted(entry, 'not-found'),
    );
  });

  it.each(Object.entries(HANDLERS))('%s', async (name, entry) => {
    const [method = '', place] = name.split(' ');
    const file = Object.keys(routes).find((one) => nameOf(one) === place)!;
    const handler = (await routes[file]!())[method] as Handler;
    const seen = await outcomes((browser) => throughHandler(handler, method, entry, browser));
    expect(seen).toEqual(wanted(entry, 'refused'));
  });

  it.each(Object.entries(ACTIONS))('action %s', async (name, entry) => {
    const [place, action = ''] = name.split('#');
    const file = Object.keys(actions).find((one) => nameOf(one) === place)!;
    const run = (await actions[file]!())[action] as FormAction;
    const seen = await outcomes((browser) => throughAction(run, entry, browser));
    expect(seen).toEqual(wanted(entry, 'refused'));
  });

  it('has tried every door with a member who is in fact suspended', () => {
    const row = db.select().from(users).where(eq(users.id, VIEWERS.suspended)).get();
    expect(row?.suspendedAt).toBeInstanceOf(Date);
  });
});
