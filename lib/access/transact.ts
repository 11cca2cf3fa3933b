import 'server-only';
import { type Db, database } from '@/db/client';
import { type NewEvent, recordEvent } from '@/db/queries/audit';
import type { Member } from './policy';

type Event = Pick<NewEvent, 'action' | 'subject' | 'detail'>;

/** Does something and writes it to the audit trail: both or neither. */
export function audited<T>(actor: Member, event: Event, work: (tx: Db, now: Date) => T): T {
  const at = new Date();
  return database().transaction(
    (tx) => {
      recordEvent(tx, { at, actor, ...event });
      return work(tx, at);
    },
    { behavior: 'immediate' },
  );
}
