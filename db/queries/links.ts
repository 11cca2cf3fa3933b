import { and, eq, gt, isNull, lte } from 'drizzle-orm';
import type { Db } from '../client';
import { mailTokens } from '../schema/members';

export type LinkPurpose = 'verify-email' | 'reset-password' | 'change-email';

export interface NewLink {
  /** SHA-256 of what the link holds */
  readonly id: string;
  readonly purpose: LinkPurpose;
  readonly userId: string;
  readonly email: string;
  readonly expiresAt: Date;
  readonly createdAt: Date;
}

/** Adds a link; earlier ones of the same purpose stop working. */
export function addLink(db: Db, link: NewLink): void {
  db.delete(mailTokens)
    .where(and(eq(mailTokens.userId, link.userId), eq(mailTokens.purpose, link.purpose)))
    .run();
  db.insert(mailTokens).values(link).run();
}

const good = (id: string, now: Date) =>
  and(eq(mailTokens.id, id), isNull(mailTokens.usedAt), gt(mailTokens.expiresAt, now));

export const findLink = (db: Db, id: string, now: Date) =>
  db.select().from(mailTokens).where(good(id, now)).get();

/** Uses a link up; false when it was used or is too old. */
export const spendLink = (db: Db, id: string, now: Date): boolean =>
  db.update(mailTokens).set({ usedAt: now }).where(good(id, now)).run().changes > 0;

export const dropOldLinks = (db: Db, now: Date): void => {
  db.delete(mailTokens).where(lte(mailTokens.expiresAt, now)).run();
};
