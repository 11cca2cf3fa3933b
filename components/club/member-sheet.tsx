import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { Moment } from '@/components/ui/moment';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { MemberSummary } from '@/lib/access/members';
import type { FormAction } from '@/lib/forms/state';
import { AdminHead } from './admin-head';
import { RoleBoxes } from './role-boxes';
import { Standing } from './standing';

interface Actions {
  readonly giveRoles: FormAction;
  readonly suspend: FormAction;
  readonly restore: FormAction;
}

function SuspendForm({ member, suspend }: { member: MemberSummary; suspend: FormAction }) {
  return (
    <ActionForm action={suspend} label="Suspend">
      <p>Ends every sign-in at once and keeps the member out. What they made stays.</p>
      <input type="hidden" name="id" value={member.id} />
      <TextField name="reason" label="Reason" hint="Kept in the audit trail." maxLength={300} />
      <div>
        <SubmitButton look="line">Suspend {member.name}</SubmitButton>
      </div>
    </ActionForm>
  );
}

function RestoreForm({ member, restore }: { member: MemberSummary; restore: FormAction }) {
  return (
    <ActionForm action={restore} label="Restore">
      <p>{member.name} cannot sign in. Restored, everything is as it was.</p>
      <input type="hidden" name="id" value={member.id} />
      <div>
        <SubmitButton look="line">Restore {member.name}</SubmitButton>
      </div>
    </ActionForm>
  );
}

export function MemberSheet({
  member,
  own,
  giveRoles,
  suspend,
  restore,
}: Actions & { member: MemberSummary; own: boolean }) {
  return (
    <>
      <AdminHead title={member.name} lead={member.email}>
        <Standing member={member} />
      </AdminHead>
      <p className="mb-5 text-muted text-sm">
        joined <Moment at={member.joined} /> · last seen{' '}
        {member.seen ? <Moment at={member.seen} /> : 'not known: not signed in anywhere'}
      </p>
      <div className="grid items-start gap-6 lg:grid-cols-2">
        <Sheet labelledBy="roles" className="grid gap-4 p-5">
          <SheetTitle id="roles">Roles</SheetTitle>
          <ActionForm action={giveRoles} label="Roles">
            <input type="hidden" name="id" value={member.id} />
            <RoleBoxes chosen={member.roles} />
            <div>
              <SubmitButton look="line">Set the roles</SubmitButton>
            </div>
          </ActionForm>
        </Sheet>
        <Sheet labelledBy="standing" className="grid gap-4 p-5">
          <SheetTitle id="standing">Standing</SheetTitle>
          {own && <p>This is you. Nobody can suspend themselves.</p>}
          {!own && member.suspended && <RestoreForm member={member} restore={restore} />}
          {!own && !member.suspended && <SuspendForm member={member} suspend={suspend} />}
        </Sheet>
      </div>
    </>
  );
}
