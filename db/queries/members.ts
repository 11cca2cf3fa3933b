import { asc, eq } from 'drizzle-orm';
import type { Db } from '../client';
import { type Role, userRoles, users } from '../schema/members';

export const rolesOf = (db: Db, userId: string): Role[] =>
  db
    .select({ role: userRoles.role })
    .from(userRoles)
    .where(eq(userRoles.userId, userId))
    .orderBy(asc(userRoles.role))
    .all()
    .map(({ role }) => role);

export const findUserByEmail = (db: Db, email: string) =>
  db.select().from(users).where(eq(users.email, email.toLowerCase())).get();
