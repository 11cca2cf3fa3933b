import 'server-only';
import type { Member, Role, Viewer } from '@/lib/auth/viewer';
import { NotAllowed, SignInNeeded } from '@/lib/errors';

export type { Member, Role, Viewer };

/** Who may do what; where a rule says `own`, the query asks for the owner as well. */
const POLICY = {
  'materials.read': 'anyone',
  'materials.edit': 'librarian',
  'library.read': 'anyone',
  'design.own': 'member',
  'preset.hand-in': 'member',
  'preset.report': 'member',
  'preset.favourite': 'member',
  'preset.review': 'librarian',
  'account.own': 'member',
  'members.manage': 'admin',
  'club.manage': 'admin',
  'audit.read': 'admin',
  'mail.read': 'admin',
} as const satisfies Readonly<Record<string, Role | 'anyone'>>;

export type Action = keyof typeof POLICY;

export const ACTIONS = Object.keys(POLICY) as readonly Action[];

export function may(viewer: Viewer, action: Action): boolean {
  const needed = POLICY[action];
  return needed === 'anyone' || (viewer?.roles.includes(needed) ?? false);
}

/** The member who may do it; throws SignInNeeded for a visitor and NotAllowed for a member without the role. */
export function permit(viewer: Viewer, action: Action): Member {
  if (viewer === null) throw new SignInNeeded();
  if (!may(viewer, action)) throw new NotAllowed();
  return viewer;
}
