import 'server-only';
import { database } from '@/db/client';
import { env } from '@/lib/env';
import { deliverDue } from './deliver';
import { smtpSender } from './transport';

const EVERY = 3000;

/**
 * Starts the sending of mail in this process. Without a mail server mail waits in the outbox. A fault is reported and the
 * worker goes on.
 */
export function startMailWorker(report: (error: unknown) => void): void {
  const { SMTP_URL } = env();
  if (SMTP_URL === undefined) return;
  const sender = smtpSender(SMTP_URL);
  const turn = async () => {
    await deliverDue(database(), sender).catch(report);
    setTimeout(turn, EVERY).unref();
  };
  void turn();
}
