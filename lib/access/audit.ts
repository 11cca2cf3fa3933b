import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/audit';
import { permit, type Viewer } from './policy';

export interface AuditEvent {
  readonly id: number;
  /** ISO 8601 */
  readonly at: string;
  readonly actor: string;
  readonly action: string;
  readonly subject: string;
  readonly detail: Readonly<Record<string, unknown>>;
}

export interface AuditPage {
  readonly events: readonly AuditEvent[];
  /** id to go on from; null at the end */
  readonly older: number | null;
  /** every kind of action there is */
  readonly actions: readonly string[];
}

const PER_PAGE = 60;

export function readAudit(
  viewer: Viewer,
  given: { readonly before?: number | undefined; readonly action?: string | undefined },
): AuditPage {
  permit(viewer, 'audit.read');
  const rows = queries.listEvents(database(), { ...given, limit: PER_PAGE + 1 });
  const events = rows.slice(0, PER_PAGE).map(({ id, at, actorName, action, subject, detail }) => ({
    id,
    at: at.toISOString(),
    actor: actorName,
    action,
    subject,
    detail,
  }));
  const older = rows.length > PER_PAGE ? (events.at(-1)?.id ?? null) : null;
  return { events, older, actions: queries.listActions(database()) };
}
