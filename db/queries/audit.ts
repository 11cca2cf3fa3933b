import { and, desc, eq, lt } from 'drizzle-orm';
import type { Db } from '../client';
import { auditEvents } from '../schema/club';

export interface NewEvent {
  readonly at: Date;
  readonly actor: { readonly id: string | null; readonly name: string };
  readonly action: string;
  readonly subject: string;
  readonly detail?: Readonly<Record<string, unknown>>;
}

/** Adds to the audit trail; called in the transaction of what it tells. */
export function recordEvent(db: Db, { at, actor, action, subject, detail = {} }: NewEvent): void {
  db.insert(auditEvents)
    .values({ at, actorId: actor.id, actorName: actor.name, action, subject, detail: { ...detail } })
    .run();
}

/** Newest first; `before` is the id the page begins under. */
export const listEvents = (
  db: Db,
  given: {
    readonly before?: number | undefined;
    readonly action?: string | undefined;
    readonly limit: number;
  },
) =>
  db
    .select()
    .from(auditEvents)
    .where(
      and(
        given.before === undefined ? undefined : lt(auditEvents.id, given.before),
        given.action === undefined ? undefined : eq(auditEvents.action, given.action),
      ),
    )
    .orderBy(desc(auditEvents.id))
    .limit(given.limit)
    .all();

export const listActions = (db: Db): string[] =>
  db
    .selectDistinct({ action: auditEvents.action })
    .from(auditEvents)
    .orderBy(auditEvents.action)
    .all()
    .map(({ action }) => action);
