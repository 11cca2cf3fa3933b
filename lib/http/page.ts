import 'server-only';
import { notFound, redirect } from 'next/navigation';
import { currentViewer } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { NotAllowed, NotFound, SignInNeeded } from '@/lib/errors';

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
