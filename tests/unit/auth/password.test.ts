import { beforeEach, describe, expect, it, vi } from 'vitest';
import { ARGON2, hashPassword, passwordMatches } from '@/lib/auth/password';
import { Unavailable } from '@/lib/errors';

const work = vi.hoisted(() => ({ running: 0, most: 0, verified: 0, release: [] as (() => void)[] }));

async function held<T>(value: T): Promise<T> {
  work.running += 1;
  work.most = Math.max(work.most, work.running);
  await new Promise<void>((resolve) => work.release.push(resolve));
  work.running -= 1;
  return value;
}

vi.mock('@node-rs/argon2', () => ({
  hash: (password: string) => held(`hash of ${password}`),
  verify: (stored: string, password: string) => {
    work.verified += 1;
    return held(stored === `hash of ${password}`);
  },
}));

/** Lets whatever runs finish, turn by turn, until all of it is done. */
async function finish<T>(all: Promise<T>): Promise<T> {
  let done = false;
  void all.finally(() => {
    done = true;
  });
  while (!done) {
    for (const release of work.release.splice(0)) release();
    await new Promise((resolve) => setImmediate(resolve));
  }
  return all;
}

beforeEach(() => {
  work.most = 0;
  work.verified = 0;
});

describe('the hashing of passwords', () => {
  it('is at or above the floor of the OWASP Password Storage Cheat Sheet: 19 MiB, two passes', () => {
    expect(ARGON2.memoryCost).toBeGreaterThanOrEqual(19_456);
    expect(ARGON2.timeCost).toBeGreaterThanOrEqual(2);
    expect(ARGON2.parallelism).toBe(1);
  });

  it('runs two at a time, however many sign in at once, and serves all of them', async () => {
    const all = Promise.all(Array.from({ length: 30 }, (_, index) => hashPassword(`word ${index}`)));
    const hashes = await finish(all);
    expect(work.most).toBe(2);
    expect(hashes).toEqual(Array.from({ length: 30 }, (_, index) => `hash of word ${index}`));
  });

  it('turns away what would wait too long, and works on afterwards', async () => {
    const all = Promise.allSettled(Array.from({ length: 260 }, () => hashPassword('word')));
    const outcomes = await finish(all);
    const refused = outcomes.filter((one) => one.status === 'rejected');
    expect(refused).toHaveLength(58);
    expect(refused[0]).toMatchObject({ reason: expect.any(Unavailable) });
    expect(await finish(hashPassword('after'))).toBe('hash of after');
  });

  it('does the same work for an address without an account, and lets nobody in', async () => {
    expect(await finish(passwordMatches(undefined, 'anything'))).toBe(false);
    expect(work.verified).toBe(1);
    expect(await finish(passwordMatches('hash of right', 'right'))).toBe(true);
    expect(await finish(passwordMatches('hash of right', 'wrong'))).toBe(false);
    expect(work.verified).toBe(3);
  });
});
