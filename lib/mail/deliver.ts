import 'server-only';
import type { Db } from '@/db/client';
import { type ClaimedMail, claimMail, giveUp, markSent, putBack } from '@/db/queries/outbox';
import type { Sender } from './transport';

/** Longer than one sending can take with the time limits of the transport. */
export const LEASE = 5 * 60_000;
const FIRST_WAIT = 15_000;
const LONGEST_WAIT = 15 * 60_000;
/** A server that answers but does not take the mail is asked this often; one that is down, for ever. */
const MOST_REFUSALS = 40;
const ERROR_LENGTH = 500;

/** Doubles with each attempt up to a quarter of an hour, ms. */
export const waitAfter = (attempts: number): number =>
  Math.min(FIRST_WAIT * 2 ** Math.max(0, attempts - 1), LONGEST_WAIT);

const answerCode = (error: unknown): number | null => {
  const code = (error as { responseCode?: unknown })?.responseCode;
  return typeof code === 'number' ? code : null;
};

const textOf = (error: unknown): string =>
  (error instanceof Error ? error.message : String(error)).slice(0, ERROR_LENGTH);

/** True when the server took the mail or refused it for good: another mail may then be tried at once. */
function settle(db: Db, mail: ClaimedMail, error: unknown, now: Date): boolean {
  const code = answerCode(error);
  const refusedForGood = code !== null && code >= 500 && code !== 535;
  if (refusedForGood || (code !== null && mail.attempts >= MOST_REFUSALS)) {
    giveUp(db, mail, textOf(error));
    return true;
  }
  putBack(db, mail, textOf(error), new Date(now.getTime() + waitAfter(mail.attempts)));
  return code !== null;
}

/** Sends what is due, one mail after the other, until nothing is due or the server is not there. */
export async function deliverDue(
  db: Db,
  sender: Sender,
  clock: () => Date = () => new Date(),
): Promise<number> {
  let sent = 0;
  for (let mail = claimMail(db, clock(), LEASE); mail; mail = claimMail(db, clock(), LEASE)) {
    try {
      await sender.send(mail);
      markSent(db, mail, clock());
      sent += 1;
    } catch (error) {
      if (!settle(db, mail, error, clock())) break;
    }
  }
  return sent;
}
