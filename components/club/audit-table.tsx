import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import { Moment } from '@/components/ui/moment';
import type { AuditEvent } from '@/lib/access/audit';
import { Cell, EmptyRow, Row, Table } from './table';

const HEADS = ['When', 'Who', 'What', 'To what'];

const shown = (value: unknown): string => {
  if (Array.isArray(value)) return value.map(String).join(', ');
  return typeof value === 'object' && value !== null ? JSON.stringify(value) : String(value ?? 'none');
};

function Detail({ detail }: { detail: AuditEvent['detail'] }) {
  const entries = Object.entries(detail);
  if (entries.length === 0) return null;
  return (
    <dl className="text-muted text-sm">
      {entries.map(([name, value]) => (
        <div key={name} className="flex flex-wrap gap-x-1.5">
          <dt>{name}:</dt>
          <dd className="break-words">{shown(value)}</dd>
        </div>
      ))}
    </dl>
  );
}

export function AuditTable({
  events,
  older,
  action,
}: {
  events: readonly AuditEvent[];
  older: number | null;
  action: string | undefined;
}) {
  const query = new URLSearchParams({ ...(action && { action }), before: String(older) });
  return (
    <>
      <Table label="Audit trail" heads={HEADS}>
        {events.length === 0 && <EmptyRow columns={HEADS.length}>Nothing was done yet.</EmptyRow>}
        {events.map((event) => (
          <Row key={event.id}>
            <Cell className="text-sm">
              <Moment at={event.at} />
            </Cell>
            <Cell className="font-semibold">{event.actor}</Cell>
            <Cell className="font-mono text-sm">{event.action}</Cell>
            <Cell>
              <div>
                <span className="break-all">{event.subject}</span>
                <Detail detail={event.detail} />
              </div>
            </Cell>
          </Row>
        ))}
      </Table>
      {older !== null && (
        <Link href={`?${query}`} className={`mt-4 ${buttonClass('line')}`}>
          Older
        </Link>
      )}
    </>
  );
}
