import type { Metadata } from 'next';
import { AdminHead } from '@/components/club/admin-head';
import { InvitationTable } from '@/components/club/invitation-table';
import { InviteForm } from '@/components/club/invite-form';
import { listInvitations } from '@/lib/access/invitations';
import { readPage } from '@/lib/http/page';
import { inviteAction, withdrawAction } from './actions';

export const metadata: Metadata = { title: 'Invitations' };

export default async function InvitationsPage() {
  const invitations = await readPage('/admin/invitations', listInvitations);
  return (
    <main>
      <AdminHead
        title="Invitations"
        lead="The only way into the club: a link by mail, good for 7 days, once."
      />
      <div className="grid items-start gap-6 lg:grid-cols-[22rem_1fr]">
        <InviteForm action={inviteAction} />
        <InvitationTable invitations={invitations} withdraw={withdrawAction} />
      </div>
    </main>
  );
}
