import 'server-only';
import { startMailWorker } from '@/lib/mail/worker';

const report = (error: unknown) => console.error('mail worker:', error);

/** What runs beside the answering of requests. */
export function startBackground(): void {
  startMailWorker(report);
}
