import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import { RequestProblem } from './problem';

const WINDOW = 60;
/** All clients together may do this many times what one may: a forged address gains little. */
const EVERYBODY = 20;

export interface RateLimit {
  take(client: string): Promise<void>;
}

/** At most `perMinute` requests a minute from one client, and a ceiling for all. Counts live in this process. */
export function rateLimit(name: string, perMinute: number): RateLimit {
  const each = new RateLimiterMemory({ keyPrefix: name, points: perMinute, duration: WINDOW });
  const all = new RateLimiterMemory({
    keyPrefix: `${name}-all`,
    points: perMinute * EVERYBODY,
    duration: WINDOW,
  });
  return {
    async take(client) {
      try {
        await all.consume('all');
        await each.consume(client);
      } catch (refusal) {
        if (!(refusal instanceof RateLimiterRes)) throw refusal;
        const seconds = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
        const detail = `Wait ${seconds} s, then try again.`;
        throw new RequestProblem('too-many-requests', detail, { 'Retry-After': String(seconds) });
      }
    },
  };
}

/** The address nearest to us: the server's own entry, or the one our proxy added last. */
export function clientOf(request: { readonly headers: Pick<Headers, 'get'> }): string {
  const forwarded = request.headers.get('x-forwarded-for') ?? '';
  return (forwarded.split(',').at(-1) ?? '').trim().slice(0, 64) || 'unknown';
}
