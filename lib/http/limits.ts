import { env } from '@/lib/env';
import { type RateLimit, rateLimit } from './rate-limit';

export type RateName = 'reads' | 'checks' | 'exports' | 'writes' | 'pictures' | 'uploads';

const perMinute = (name: RateName): number => {
  const given = env();
  return {
    reads: given.RATE_READS_PER_MINUTE,
    checks: given.RATE_CHECKS_PER_MINUTE,
    exports: given.RATE_EXPORTS_PER_MINUTE,
    writes: given.RATE_WRITES_PER_MINUTE,
    pictures: given.RATE_PICTURES_PER_MINUTE,
    uploads: given.RATE_UPLOADS_PER_MINUTE,
  }[name];
};

const made = new Map<RateName, RateLimit>();

/** The limiter of a group of routes, made on first use with the rate from the environment. */
export function limiter(name: RateName): RateLimit {
  const limit = made.get(name) ?? rateLimit(name, perMinute(name));
  made.set(name, limit);
  return limit;
}

/** Characters of a whole address. */
export const URL_LIMIT = 4000;
/** Bytes of a JSON body. */
export const BODY_LIMIT = 64 * 1024;
