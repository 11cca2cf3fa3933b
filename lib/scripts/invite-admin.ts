/** Invites the first admin of a new club: prints a link instead of mailing it. */
import { connect } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { addInvitation } from '@/db/queries/invitations';
import { digest, newSecret } from '@/lib/auth/secret';
import { env, publicUrl } from '@/lib/env';

const DAY = 86_400_000;
const email = process.argv[2]?.trim().toLowerCase();
if (!email || !/^[^\s@,;<>]+@[^\s@,;<>]+$/.test(email)) {
  console.error('Name the address: npm run admin -- you@club.example');
  process.exit(1);
}

const db = connect(env().DATABASE_PATH);
migrateDatabase(db);
const secret = newSecret();
const createdAt = new Date();
addInvitation(db, {
  tokenHash: digest(secret),
  email,
  roles: ['member', 'admin'],
  invitedBy: null,
  createdAt,
  expiresAt: new Date(createdAt.getTime() + DAY),
});
db.$client.close();
console.log(`Open within a day, once: ${publicUrl()}/accept-invite?token=${secret}`);
