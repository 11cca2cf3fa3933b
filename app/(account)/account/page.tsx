import type { Metadata } from 'next';
import { AccountHead } from '@/components/account/account-head';
import { ChangeForms } from '@/components/account/change-forms';
import { DeleteAccount } from '@/components/account/delete-account';
import { SessionList } from '@/components/account/session-list';
import { listOwnSessions } from '@/lib/access/account';
import { may, permit } from '@/lib/access/policy';
import { currentSession } from '@/lib/auth/session';
import { readPage } from '@/lib/http/page';
import * as actions from './actions';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const { member, sessions } = await readPage('/account', (viewer) => ({
    member: permit(viewer, 'account.own'),
    sessions: listOwnSessions(viewer),
  }));
  const present = (await currentSession())?.id ?? null;
  return (
    <main className="frame grid gap-6 pt-8 pb-16">
      <AccountHead
        member={member}
        admin={may(member, 'members.manage')}
        signOut={actions.signOutAction}
        verify={actions.verifyAction}
      />
      <ChangeForms
        member={member}
        rename={actions.renameAction}
        changeEmail={actions.changeEmailAction}
        changePassword={actions.changePasswordAction}
      />
      <SessionList
        sessions={sessions}
        present={present}
        end={actions.endSessionAction}
        endOthers={actions.endOtherSessionsAction}
      />
      <DeleteAccount action={actions.deleteAccountAction} name={member.name} />
    </main>
  );
}
