import type { Metadata } from 'next';
import { MemberSheet } from '@/components/club/member-sheet';
import { getMember } from '@/lib/access/members';
import { readPage } from '@/lib/http/page';
import * as actions from './actions';

export const metadata: Metadata = { title: 'Member' };

export default async function MemberPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { member, own } = await readPage(`/admin/members/${id}`, (viewer) => ({
    member: getMember(viewer, id),
    own: viewer?.id === id,
  }));
  return (
    <main>
      <MemberSheet
        member={member}
        own={own}
        giveRoles={actions.giveRolesAction}
        suspend={actions.suspendAction}
        restore={actions.restoreAction}
      />
    </main>
  );
}
