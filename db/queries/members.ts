import { and, asc, count, eq, isNull, like, max, ne, or, sql } from 'drizzle-orm';
import type { Db } from '../client';
import { type Role, sessions, userRoles, users } from '../schema/members';

export interface NewUser {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly passwordHash: string;
  readonly emailVerifiedAt: Date | null;
  readonly createdAt: Date;
}

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

export const findUser = (db: Db, id: string) => db.select().from(users).where(eq(users.id, id)).get();

export function addUser(db: Db, user: NewUser, roles: readonly Role[]): void {
  db.insert(users).values(user).run();
  setRoles(db, user.id, roles);
}

export function setRoles(db: Db, userId: string, roles: readonly Role[]): void {
  db.delete(userRoles).where(eq(userRoles.userId, userId)).run();
  const rows = [...new Set<Role>(['member', ...roles])].map((role) => ({ userId, role }));
  db.insert(userRoles).values(rows).run();
}

type Change = Partial<
  Pick<typeof users.$inferInsert, 'name' | 'email' | 'emailVerifiedAt' | 'passwordHash' | 'suspendedAt'>
>;

export const changeUser = (db: Db, id: string, change: Change): void => {
  db.update(users).set(change).where(eq(users.id, id)).run();
};

export const deleteUser = (db: Db, id: string): void => {
  db.delete(users).where(eq(users.id, id)).run();
};

/** Admins who can sign in, besides the one named. */
export const countOtherAdmins = (db: Db, id: string): number =>
  db
    .select({ found: count() })
    .from(userRoles)
    .innerJoin(users, eq(users.id, userRoles.userId))
    .where(and(eq(userRoles.role, 'admin'), ne(users.id, id), isNull(users.suspendedAt)))
    .get()?.found ?? 0;

const columns = {
  id: users.id,
  name: users.name,
  email: users.email,
  emailVerifiedAt: users.emailVerifiedAt,
  suspendedAt: users.suspendedAt,
  createdAt: users.createdAt,
  roles: sql<string>`(select group_concat(role, ' ') from ${userRoles} where user_id = ${sql.raw('users.id')})`,
  seenAt: sql<
    number | null
  >`(select ${max(sessions.seenAt)} from ${sessions} where user_id = ${sql.raw('users.id')})`,
};

const literal = (text: string) => `%${text.replaceAll(/[\\%_]/g, (sign) => `\\${sign}`)}%`;

const matching = (search: string) =>
  search === ''
    ? undefined
    : or(
        sql`${like(users.name, literal(search))} escape '\\'`,
        sql`${like(users.email, literal(search))} escape '\\'`,
      );

export const listUsers = (
  db: Db,
  search: string,
  page: { readonly limit: number; readonly offset: number },
) =>
  db
    .select(columns)
    .from(users)
    .where(matching(search))
    .orderBy(asc(sql`lower(${users.name})`), asc(users.id))
    .limit(page.limit)
    .offset(page.offset)
    .all();

export const countUsers = (db: Db, search: string): number =>
  db.select({ found: count() }).from(users).where(matching(search)).get()?.found ?? 0;

export const findListedUser = (db: Db, id: string) =>
  db.select(columns).from(users).where(eq(users.id, id)).get();
