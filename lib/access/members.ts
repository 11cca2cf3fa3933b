import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/members';
import { endAllSessions } from '@/db/queries/sessions';
import { Conflict, NotFound } from '@/lib/errors';
import { permit, type Role, type Viewer } from './policy';
import { audited } from './transact';

export interface MemberSummary {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly emailConfirmed: boolean;
  readonly suspended: boolean;
  readonly roles: readonly Role[];
  /** ISO 8601 */
  readonly joined: string;
  /** last use of a sign-in that is still open; null where there is none */
  readonly seen: string | null;
}

type Row = NonNullable<ReturnType<typeof queries.findListedUser>>;

const summaryOf = (row: Row): MemberSummary => ({
  id: row.id,
  name: row.name,
  email: row.email,
  emailConfirmed: row.emailVerifiedAt !== null,
  suspended: row.suspendedAt !== null,
  roles: (row.roles ?? '').split(' ').sort() as Role[],
  joined: row.createdAt.toISOString(),
  seen: row.seenAt === null ? null : new Date(row.seenAt).toISOString(),
});

export const MEMBERS_PER_PAGE = 40;

export interface MemberList {
  readonly members: readonly MemberSummary[];
  readonly found: number;
}

/** One page of the members whose name or address has `search` in it; pages from 1. */
export function listMembers(viewer: Viewer, search: string, page: number): MemberList {
  permit(viewer, 'members.manage');
  const limit = MEMBERS_PER_PAGE;
  const rows = queries.listUsers(database(), search, { limit, offset: (page - 1) * limit });
  return { members: rows.map(summaryOf), found: queries.countUsers(database(), search) };
}

export function getMember(viewer: Viewer, id: string): MemberSummary {
  permit(viewer, 'members.manage');
  const row = queries.findListedUser(database(), id);
  if (!row) throw new NotFound('The member');
  return summaryOf(row);
}

function refuseLastAdmin(tx: Parameters<typeof queries.countOtherAdmins>[0], id: string): void {
  if (queries.countOtherAdmins(tx, id) === 0) {
    throw new Conflict('There must be an admin who can sign in: make another member admin first');
  }
}

export function giveRoles(viewer: Viewer, id: string, roles: readonly Role[]): void {
  const actor = permit(viewer, 'members.manage');
  const { email, roles: before } = getMember(viewer, id);
  audited(actor, { action: 'member.roles', subject: email, detail: { before, after: roles } }, (tx) => {
    if (!roles.includes('admin')) refuseLastAdmin(tx, id);
    queries.setRoles(tx, id, roles);
  });
}

/** Keeps a member out and ends every sign-in; what they made stays. */
export function suspendMember(viewer: Viewer, id: string, reason: string): void {
  const actor = permit(viewer, 'members.manage');
  if (id === actor.id) throw new Conflict('You cannot suspend yourself');
  const { email } = getMember(viewer, id);
  audited(actor, { action: 'member.suspend', subject: email, detail: { reason } }, (tx, now) => {
    queries.changeUser(tx, id, { suspendedAt: now });
    endAllSessions(tx, id);
  });
}

export function restoreMember(viewer: Viewer, id: string): void {
  const actor = permit(viewer, 'members.manage');
  const { email } = getMember(viewer, id);
  audited(actor, { action: 'member.restore', subject: email }, (tx) =>
    queries.changeUser(tx, id, { suspendedAt: null }),
  );
}
