import 'server-only';
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import { database } from '@/db/client';
import { sessions, users } from '@/db/schema/members';
import { overHttps } from '@/lib/env';
import { hashedAdapter } from './hashed-adapter';

/** A sign-in ends when it was not used for this long, */
export const IDLE_LIMIT = new TimeSpan(14, 'd');
/** and in any case after this long. */
export const ABSOLUTE_LIMIT = new TimeSpan(90, 'd');

interface SessionRow {
  readonly createdAt: Date;
  readonly seenAt: Date;
  readonly userAgent: string;
}

interface UserRow {
  readonly email: string;
  readonly name: string;
  readonly emailVerifiedAt: Date | null;
  readonly suspendedAt: Date | null;
}

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof make>;
    DatabaseSessionAttributes: SessionRow;
    DatabaseUserAttributes: UserRow;
  }
}

function make() {
  const secure = overHttps();
  return new Lucia(hashedAdapter(new DrizzleSQLiteAdapter(database(), sessions, users)), {
    sessionExpiresIn: IDLE_LIMIT,
    sessionCookie: {
      // a browser takes a cookie of this prefix only from this very host, over https, for every path
      name: secure ? '__Host-bendwell' : 'bendwell',
      expires: false,
      attributes: { secure, sameSite: 'lax', path: '/' },
    },
    getSessionAttributes: ({ createdAt }) => ({ createdAt }),
    getUserAttributes: ({ email, name, emailVerifiedAt, suspendedAt }) => ({
      email,
      name,
      emailVerifiedAt,
      suspendedAt,
    }),
  });
}

let made: ReturnType<typeof make> | undefined;

export function lucia(): ReturnType<typeof make> {
  made ??= make();
  return made;
}
