import type { Metadata } from 'next';
import { AdminHead } from '@/components/club/admin-head';
import { MailState } from '@/components/club/mail-state';
import { MailTable } from '@/components/club/mail-table';
import { Pager } from '@/components/club/pager';
import { MAILS_PER_PAGE, readOutgoingMail } from '@/lib/access/outgoing-mail';
import { type Asked, pageAsked, readPage } from '@/lib/http/page';
import { sendAgainAction } from './actions';

export const metadata: Metadata = { title: 'Outgoing mail' };

export default async function MailPage({ searchParams }: { searchParams: Asked }) {
  const page = await pageAsked(searchParams);
  const outgoing = await readPage('/admin/mail', (viewer) => readOutgoingMail(viewer, page));
  const all = Object.values(outgoing.counts).reduce((sum, one) => sum + one, 0);
  return (
    <main>
      <AdminHead title="Outgoing mail" lead="What a mail said is erased once it is sent." />
      <MailState outgoing={outgoing} />
      <MailTable mails={outgoing.mails} sendAgain={sendAgainAction} />
      <Pager page={page} pages={Math.ceil(all / MAILS_PER_PAGE)} query={{}} />
    </main>
  );
}
