import 'server-only';
import { database } from '@/db/client';
import { findUserByEmail } from '@/db/queries/members';
import { countAttempt, forgiveAttempts } from './attempts';
import { passwordMatches } from './password';
import { beginSession } from './session';

/** Who is at the other end, as far as that can be known. */
export interface Client {
  readonly address: string;
  readonly userAgent: string;
}

export type SignInAnswer = 'signed-in' | 'refused' | 'suspended';

/** The answer and its time are the same for a wrong password and for an address without an account. */
export async function signIn(email: string, password: string, client: Client): Promise<SignInAnswer> {
  await countAttempt('sign-in-address', client.address);
  await countAttempt('sign-in-account', email);
  const user = findUserByEmail(database(), email);
  if (!(await passwordMatches(user?.passwordHash, password)) || !user) return 'refused';
  if (user.suspendedAt) return 'suspended';
  await forgiveAttempts('sign-in-account', email);
  await beginSession(user.id, client.userAgent);
  return 'signed-in';
}
