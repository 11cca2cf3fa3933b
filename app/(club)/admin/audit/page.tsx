import type { Metadata } from 'next';
import { AdminHead } from '@/components/club/admin-head';
import { AuditFilter } from '@/components/club/audit-filter';
import { AuditTable } from '@/components/club/audit-table';
import { readAudit } from '@/lib/access/audit';
import { type Asked, askedFor, readPage } from '@/lib/http/page';

export const metadata: Metadata = { title: 'Audit trail' };

export default async function AuditPage({ searchParams }: { searchParams: Asked }) {
  const action = await askedFor(searchParams, 'action', 100);
  const before = Number(await askedFor(searchParams, 'before', 12)) || undefined;
  const page = await readPage('/admin/audit', (viewer) => readAudit(viewer, { action, before }));
  return (
    <main>
      <AdminHead title="Audit trail" lead="Who did what. Entries are only ever added.">
        <AuditFilter actions={page.actions} value={action ?? ''} />
      </AdminHead>
      <AuditTable events={page.events} older={page.older} action={action} />
    </main>
  );
}
