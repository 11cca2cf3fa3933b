import { and, desc, eq, gt, isNull } from 'drizzle-orm';
import type { Db } from '../client';
import { invitations, type Role, users } from '../schema/members';

export interface NewInvitation {
  readonly tokenHash: string;
  readonly email: string;
  readonly roles: Role[];
  readonly invitedBy: string | null;
  readonly createdAt: Date;
  readonly expiresAt: Date;
}

const open = (now: Date) =>
  and(isNull(invitations.acceptedAt), isNull(invitations.revokedAt), gt(invitations.expiresAt, now));

/** Adds an invitation; earlier ones to the same address stop working. */
export function addInvitation(db: Db, invitation: NewInvitation): void {
  db.update(invitations)
    .set({ revokedAt: invitation.createdAt })
    .where(and(eq(invitations.email, invitation.email), open(invitation.createdAt)))
    .run();
  db.insert(invitations).values(invitation).run();
}

export const findOpenInvitation = (db: Db, tokenHash: string, now: Date) =>
  db
    .select()
    .from(invitations)
    .where(and(eq(invitations.tokenHash, tokenHash), open(now)))
    .get();

export const markAccepted = (db: Db, id: string, now: Date): boolean =>
  db
    .update(invitations)
    .set({ acceptedAt: now })
    .where(and(eq(invitations.id, id), open(now)))
    .run().changes > 0;

/** The address it went to, when it was still open. */
export const revokeInvitation = (db: Db, id: string, now: Date): string | undefined =>
  db
    .update(invitations)
    .set({ revokedAt: now })
    .where(and(eq(invitations.id, id), open(now)))
    .returning({ email: invitations.email })
    .get()?.email;

export const listInvitations = (db: Db, limit: number) =>
  db
    .select({
      id: invitations.id,
      email: invitations.email,
      roles: invitations.roles,
      invitedBy: users.name,
      createdAt: invitations.createdAt,
      expiresAt: invitations.expiresAt,
      acceptedAt: invitations.acceptedAt,
      revokedAt: invitations.revokedAt,
    })
    .from(invitations)
    .leftJoin(users, eq(users.id, invitations.invitedBy))
    .orderBy(desc(invitations.createdAt), desc(invitations.id))
    .limit(limit)
    .all();
