import type { Connection } from '@/db/client';
import { userRoles, users } from '@/db/schema/members';
import type { Member, Role } from '@/lib/access/policy';

/** A member of the club, in the database and as the one who asks. */
export function memberOf(db: Connection, name: string, ...extra: Role[]): Member {
  const email = `${name.toLowerCase().replaceAll(' ', '.')}@millrace.example`;
  const roles: Role[] = ['member', ...extra];
  const at = new Date('2026-01-10T10:00:00Z');
  const { id } = db
    .insert(users)
    .values({ email, name, passwordHash: 'no password opens it', emailVerifiedAt: at, createdAt: at })
    .returning({ id: users.id })
    .get();
  for (const role of roles) db.insert(userRoles).values({ userId: id, role }).run();
  return { id, name, email, emailVerified: true, roles };
}
