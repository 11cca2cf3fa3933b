import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/invitations';
import { findUserByEmail } from '@/db/queries/members';
import { queueMail } from '@/db/queries/outbox';
import { countAttempt } from '@/lib/auth/attempts';
import { addressOf, clubForMail } from '@/lib/auth/links';
import { digest, newSecret } from '@/lib/auth/secret';
import { InvalidInput, NotFound } from '@/lib/errors';
import { composeMail } from '@/lib/mail/compose';
import { invitation } from '@/lib/mail/letters';
import { permit, type Role, type Viewer } from './policy';
import { audited } from './transact';

export type InvitationState = 'open' | 'accepted' | 'withdrawn' | 'run out';

export interface InvitationSummary {
  readonly id: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly invitedBy: string | null;
  /** ISO 8601 */
  readonly created: string;
  readonly expires: string;
  readonly state: InvitationState;
}

const DAYS = 7;
const DAY = 86_400_000;
const MOST_LISTED = 200;

type Row = ReturnType<typeof queries.listInvitations>[number];

function stateOf(row: Row, now: Date): InvitationState {
  if (row.acceptedAt) return 'accepted';
  if (row.revokedAt) return 'withdrawn';
  return row.expiresAt <= now ? 'run out' : 'open';
}

export function listInvitations(viewer: Viewer): InvitationSummary[] {
  permit(viewer, 'members.manage');
  const now = new Date();
  return queries.listInvitations(database(), MOST_LISTED).map((row) => ({
    id: row.id,
    email: row.email,
    roles: row.roles,
    invitedBy: row.invitedBy,
    created: row.createdAt.toISOString(),
    expires: row.expiresAt.toISOString(),
    state: stateOf(row, now),
  }));
}

/** Invites by mail; an open invitation to the same address stops working. */
export async function inviteMember(viewer: Viewer, email: string, roles: readonly Role[]): Promise<void> {
  const actor = permit(viewer, 'members.manage');
  await countAttempt('invite-account', actor.id);
  if (findUserByEmail(database(), email)) {
    throw new InvalidInput([{ field: 'email', message: 'A member has this address already' }]);
  }
  const secret = newSecret();
  const club = clubForMail();
  const mail = await composeMail(
    email,
    invitation(actor.name, club, addressOf('accept-invite', secret), DAYS),
    club,
  );
  const given: Role[] = [...new Set<Role>(['member', ...roles])];
  audited(actor, { action: 'member.invite', subject: email, detail: { roles: given } }, (tx, createdAt) => {
    const expiresAt = new Date(createdAt.getTime() + DAYS * DAY);
    queries.addInvitation(tx, {
      tokenHash: digest(secret),
      email,
      roles: given,
      invitedBy: actor.id,
      createdAt,
      expiresAt,
    });
    queueMail(tx, mail, createdAt);
  });
}

export function withdrawInvitation(viewer: Viewer, id: string): void {
  const actor = permit(viewer, 'members.manage');
  const event = { action: 'member.invitation-withdraw', subject: id };
  audited(actor, event, (tx, now) => {
    if (queries.revokeInvitation(tx, id, now) === undefined) throw new NotFound('An open invitation');
  });
}
