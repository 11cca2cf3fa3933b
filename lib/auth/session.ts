import 'server-only';
import { cookies } from 'next/headers';
import { cache } from 'react';
import { database } from '@/db/client';
import { rolesOf } from '@/db/queries/members';
import { touchSession } from '@/db/queries/sessions';
import { ABSOLUTE_LIMIT, lucia } from './lucia';
import { digest } from './secret';
import type { Member, Viewer } from './viewer';

const SEEN_GRAIN = 10 * 60_000;
const USER_AGENT_LENGTH = 300;

export interface CurrentSession {
  /** as stored */
  readonly id: string;
  readonly viewer: Member;
}

/** The member a cookie stands for; null for a sign-in that is unknown, over, or of a suspended member. */
export async function readSession(secret: string): Promise<CurrentSession | null> {
  const { session, user } = await lucia().validateSession(secret);
  if (!session) return null;
  const tooOld = Date.now() - session.createdAt.getTime() > ABSOLUTE_LIMIT.milliseconds();
  if (tooOld || user.suspendedAt) {
    await lucia().invalidateSession(secret);
    return null;
  }
  const id = digest(secret);
  touchSession(database(), id, new Date(), SEEN_GRAIN);
  const { email, name, emailVerifiedAt } = user;
  const roles = rolesOf(database(), user.id);
  return { id, viewer: { id: user.id, name, email, emailVerified: emailVerifiedAt !== null, roles } };
}

const sentSecret = async (): Promise<string | undefined> => {
  const value = (await cookies()).get(lucia().sessionCookieName)?.value;
  return value && value.length <= 100 ? value : undefined;
};

export const currentSession = cache(async (): Promise<CurrentSession | null> => {
  const secret = await sentSecret();
  return secret === undefined ? null : readSession(secret);
});

/** Whoever asks for this page, runs this action or calls this route. */
export const currentViewer = cache(async (): Promise<Viewer> => (await currentSession())?.viewer ?? null);

/** Ends whatever sign-in the browser had and begins a new one, so that an id planted beforehand is worth nothing. */
export async function beginSession(userId: string, userAgent: string): Promise<void> {
  await endSession();
  const now = new Date();
  const session = await lucia().createSession(userId, {
    createdAt: now,
    seenAt: now,
    userAgent: userAgent.slice(0, USER_AGENT_LENGTH),
  });
  const cookie = lucia().createSessionCookie(session.id);
  const maxAge = ABSOLUTE_LIMIT.seconds();
  (await cookies()).set(cookie.name, cookie.value, { ...cookie.attributes, maxAge });
}

export async function endSession(): Promise<void> {
  const secret = await sentSecret();
  if (secret !== undefined) await lucia().invalidateSession(secret);
  const blank = lucia().createBlankSessionCookie();
  (await cookies()).set(blank.name, blank.value, blank.attributes);
}
