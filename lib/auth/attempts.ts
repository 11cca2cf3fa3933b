import 'server-only';
import { RateLimiterRes, RateLimiterSQLite } from 'rate-limiter-flexible';
import { database } from '@/db/client';
import { TooMany } from '@/lib/errors';
import { digest } from './secret';

const MINUTE = 60;

/** Attempts in a time, by what is tried and by whose. Kept in the database, so that a restart forgives nothing. */
const ALLOWED = {
  'sign-in-account': { points: 10, duration: 15 * MINUTE },
  'sign-in-address': { points: 60, duration: 15 * MINUTE },
  'mail-account': { points: 4, duration: 60 * MINUTE },
  'mail-address': { points: 20, duration: 60 * MINUTE },
  'link-address': { points: 60, duration: 15 * MINUTE },
  'invite-account': { points: 100, duration: 60 * MINUTE },
  'password-account': { points: 10, duration: 15 * MINUTE },
} as const;

export type AttemptKind = keyof typeof ALLOWED;

const made = new Map<AttemptKind, RateLimiterSQLite>();

function limiter(kind: AttemptKind): RateLimiterSQLite {
  const limit =
    made.get(kind) ??
    new RateLimiterSQLite({
      storeClient: database().$client,
      storeType: 'better-sqlite3',
      tableName: 'rate_limits',
      tableCreated: true,
      clearExpiredByTimeout: true,
      keyPrefix: kind,
      ...ALLOWED[kind],
    });
  made.set(kind, limit);
  return limit;
}

/** Counts one attempt; throws TooMany once there were more than allowed. */
export async function countAttempt(kind: AttemptKind, whose: string): Promise<void> {
  try {
    await limiter(kind).consume(digest(whose));
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    throw new TooMany(Math.max(1, Math.ceil(refusal.msBeforeNext / 1000)));
  }
}

export async function forgiveAttempts(kind: AttemptKind, whose: string): Promise<void> {
  await limiter(kind).delete(digest(whose));
}
