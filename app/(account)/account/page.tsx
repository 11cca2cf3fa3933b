import type { Metadata } from 'next';
import { SignOut } from '@/components/account/sign-out';
import { permit } from '@/lib/access/policy';
import { readPage } from '@/lib/http/page';
import { signOutAction } from './actions';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const member = await readPage('/account', (viewer) => permit(viewer, 'account.own'));
  return (
    <main className="frame pt-8 pb-16">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <h1 className="font-bold text-4xl tracking-tight">{member.name}</h1>
          <p className="mt-1 text-muted">
            {member.email} · {member.roles.join(', ')}
          </p>
        </div>
        <SignOut action={signOutAction} />
      </div>
    </main>
  );
}
