import { and, eq, lt } from 'drizzle-orm';
import type { Db } from '../client';
import { sessions } from '../schema/members';

/** Notes that a sign-in was used, at most once in `grain` milliseconds, so that reading seldom writes. */
export const touchSession = (db: Db, id: string, now: Date, grain: number): void => {
  db.update(sessions)
    .set({ seenAt: now })
    .where(and(eq(sessions.id, id), lt(sessions.seenAt, new Date(now.getTime() - grain))))
    .run();
};
