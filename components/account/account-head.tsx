import { ShieldCheck } from 'lucide-react';
import Link from 'next/link';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { buttonClass } from '@/components/ui/button';
import type { Member } from '@/lib/access/policy';
import type { FormAction } from '@/lib/forms/state';
import { RoleList } from './role-list';

export function AccountHead({
  member,
  admin,
  signOut,
  verify,
}: {
  member: Member;
  admin: boolean;
  signOut: FormAction;
  verify: FormAction;
}) {
  return (
    <div className="grid gap-4">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div className="min-w-0">
          <h1 className="break-words font-bold text-4xl tracking-tight">{member.name}</h1>
          <div className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-2 text-muted">
            <span className="break-all">{member.email}</span>
            <RoleList roles={member.roles} />
          </div>
        </div>
        <div className="flex flex-wrap gap-3">
          {admin && (
            <Link href="/admin" className={buttonClass('line')}>
              <ShieldCheck aria-hidden="true" size={18} />
              Run the club
            </Link>
          )}
          <ActionForm action={signOut} label="Sign out">
            <SubmitButton look="ink">Sign out</SubmitButton>
          </ActionForm>
        </div>
      </div>
      {!member.emailVerified && (
        <ActionForm
          action={verify}
          label="Confirm the address"
          className="max-w-2xl rounded-sheet border border-near bg-near-soft p-4 text-near"
        >
          <p>Your address is not confirmed yet. Open the link that was mailed to you.</p>
          <div>
            <SubmitButton look="line" small>
              Mail the link again
            </SubmitButton>
          </div>
        </ActionForm>
      )}
    </div>
  );
}
