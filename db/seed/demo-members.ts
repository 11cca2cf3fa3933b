import { hash } from '@node-rs/argon2';
import { count } from 'drizzle-orm';
import type { Db } from '../client';
import { clubSettings } from '../schema/club';
import { type Role, userRoles, users } from '../schema/members';

/** The one password of every demo sign-in; also in the README. */
export const DEMO_PASSWORD = 'millrace-demo-2026';

interface DemoMember {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly suspended?: true;
}

/** Invented people of an invented club, one for each role and one who is suspended. */
export const DEMO_MEMBERS: readonly DemoMember[] = [
  { id: 'demo-ines', name: 'Ines Marlow', email: 'ines@millrace.example', roles: ['member'] },
  { id: 'demo-bram', name: 'Bram Okafor', email: 'bram@millrace.example', roles: ['member'] },
  { id: 'demo-priya', name: 'Priya Nolan', email: 'priya@millrace.example', roles: ['member', 'host'] },
  { id: 'demo-tomas', name: 'Tomas Reed', email: 'tomas@millrace.example', roles: ['member', 'librarian'] },
  { id: 'demo-orla', name: 'Orla Finch', email: 'orla@millrace.example', roles: ['member', 'admin'] },
  {
    id: 'demo-wendel',
    name: 'Wendel Hask',
    email: 'wendel@millrace.example',
    roles: ['member'],
    suspended: true,
  },
];

const JOINED = new Date('2026-03-01T18:00:00Z');
const SUSPENDED = new Date('2026-10-04T09:30:00Z');

export const DEMO_CLUB = 'Millrace Model Club';

/** Adds the demo club to a database nobody has joined yet; leaves every other database as it is. */
export async function seedDemoMembers(db: Db): Promise<boolean> {
  if ((db.select({ found: count() }).from(users).get()?.found ?? 0) > 0) return false;
  const hashes = await Promise.all(DEMO_MEMBERS.map(() => hash(DEMO_PASSWORD, { memoryCost: 24 * 1024 })));
  db.transaction((tx) => {
    tx.insert(clubSettings)
      .values({ id: 1, name: DEMO_CLUB, contactEmail: 'orla@millrace.example', changedAt: JOINED })
      .onConflictDoNothing()
      .run();
    DEMO_MEMBERS.forEach(({ id, name, email, roles, suspended }, index) => {
      const passwordHash = hashes[index]!;
      const suspendedAt = suspended ? SUSPENDED : null;
      tx.insert(users)
        .values({ id, name, email, passwordHash, emailVerifiedAt: JOINED, suspendedAt, createdAt: JOINED })
        .run();
      tx.insert(userRoles)
        .values(roles.map((role) => ({ userId: id, role })))
        .run();
    });
  });
  return true;
}
