import 'server-only';
import { database } from '@/db/client';
import { dropOldLinks } from '@/db/queries/links';
import { dropExpiredSessions } from '@/db/queries/sessions';
import { startMailWorker } from '@/lib/mail/worker';

const HOUR = 3_600_000;
const STARTED = Symbol.for('bendwell.background');

const report = (error: unknown) => console.error('beside the requests:', error);

function tidy(): void {
  const now = new Date();
  try {
    dropExpiredSessions(database(), now);
    dropOldLinks(database(), now);
  } catch (error) {
    report(error);
  }
}

/** What runs beside the answering of requests, once in a process. */
export function startBackground(): void {
  const here = globalThis as { [STARTED]?: boolean };
  if (here[STARTED]) return;
  here[STARTED] = true;
  startMailWorker(report);
  setInterval(tidy, HOUR).unref();
}
