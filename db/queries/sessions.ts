import { and, desc, eq, gt, lt, lte, ne } from 'drizzle-orm';
import type { Db } from '../client';
import { sessions } from '../schema/members';

/** Notes that a sign-in was used, at most once in `grain` milliseconds, so that reading seldom writes. */
export const touchSession = (db: Db, id: string, now: Date, grain: number): void => {
  db.update(sessions)
    .set({ seenAt: now })
    .where(and(eq(sessions.id, id), lt(sessions.seenAt, new Date(now.getTime() - grain))))
    .run();
};

const seconds = (moment: Date) => Math.floor(moment.getTime() / 1000);

/** The sign-ins of one member that are not over, last used first. */
export const listSessions = (db: Db, userId: string, now: Date) =>
  db
    .select({
      id: sessions.id,
      createdAt: sessions.createdAt,
      seenAt: sessions.seenAt,
      userAgent: sessions.userAgent,
    })
    .from(sessions)
    .where(and(eq(sessions.userId, userId), gt(sessions.expiresAt, seconds(now))))
    .orderBy(desc(sessions.seenAt))
    .all();

/** Ends one sign-in of this member; false when it is none of theirs. */
export const endSession = (db: Db, userId: string, id: string): boolean =>
  db
    .delete(sessions)
    .where(and(eq(sessions.userId, userId), eq(sessions.id, id)))
    .run().changes > 0;

export const endOtherSessions = (db: Db, userId: string, keep: string): void => {
  db.delete(sessions)
    .where(and(eq(sessions.userId, userId), ne(sessions.id, keep)))
    .run();
};

export const endAllSessions = (db: Db, userId: string): void => {
  db.delete(sessions).where(eq(sessions.userId, userId)).run();
};

export const dropExpiredSessions = (db: Db, now: Date): void => {
  db.delete(sessions)
    .where(lte(sessions.expiresAt, seconds(now)))
    .run();
};
