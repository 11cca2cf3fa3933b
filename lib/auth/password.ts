import 'server-only';
import { hash, verify } from '@node-rs/argon2';
import { Unavailable } from '@/lib/errors';

/** argon2id, above the floor of the OWASP Password Storage Cheat Sheet (19 MiB, two passes). Memory in KiB. */
export const ARGON2 = { memoryCost: 24 * 1024, timeCost: 2, parallelism: 1 } as const;

const AT_ONCE = 2;
const MOST_WAITING = 200;

let running = 0;
const waiting: (() => void)[] = [];

/** Two at a time: each takes a core and 24 MiB, and a burst of sign-ins must leave the server to everyone else. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (waiting.length >= MOST_WAITING) throw new Unavailable('Too many sign-ins at once');
  if (running >= AT_ONCE) await new Promise<void>((go) => waiting.push(go));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}

export const hashPassword = (password: string): Promise<string> => inTurn(() => hash(password, ARGON2));

let decoy: Promise<string> | undefined;

/** Whether the password is the one of the hash. Without a hash it takes as long and answers no. */
export async function passwordMatches(stored: string | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword(crypto.randomUUID());
  const against = stored ?? (await decoy);
  const same = await inTurn(() => verify(against, password));
  return same && stored !== undefined;
}
