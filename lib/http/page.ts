import 'server-only';
import { notFound, redirect } from 'next/navigation';
import { currentViewer } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { Conflict, NotAllowed, NotFound, SignInNeeded } from '@/lib/errors';

export const signInAddress = (next: string): string => `/sign-in?next=${encodeURIComponent(next)}`;

/**
 * What a page shows to whoever asks. A visitor is led to the sign-in and back to `path`; a member who may not see the
 * page is told that there is none.
 */
export async function readPage<T>(path: string, read: (viewer: Viewer) => T | Promise<T>): Promise<T> {
  const viewer = await currentViewer();
  try {
    return await read(viewer);
  } catch (error) {
    if (error instanceof SignInNeeded) redirect(signInAddress(path));
    if (error instanceof NotAllowed || error instanceof NotFound) notFound();
    throw error;
  }
}

export type Asked = Promise<Readonly<Record<string, string | string[] | undefined>>>;

/** One value of the query of a page, at most `max` characters of it. */
export async function askedFor(asked: Asked, name: string, max = 200): Promise<string | undefined> {
  const value = (await asked)[name];
  return typeof value === 'string' && value !== '' ? value.slice(0, max) : undefined;
}

/** A whole number from 1 in the query of a page; 1 where there is none. */
export async function pageAsked(asked: Asked): Promise<number> {
  const value = await askedFor(asked, 'page', 6);
  return value && /^[1-9]\d{0,4}$/.test(value) ? Number(value) : 1;
}

/** The token of a mailed link and what it stands for; null when the link is no longer good. */
export async function readToken<T>(
  asked: Asked,
  read: (token: string) => T,
): Promise<{ readonly token: string; readonly found: T } | null> {
  const token = await askedFor(asked, 'token');
  if (token === undefined) return null;
  try {
    return { token, found: read(token) };
  } catch (error) {
    if (error instanceof Conflict) return null;
    throw error;
  }
}
