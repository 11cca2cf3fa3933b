import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { FormAction } from '@/lib/forms/state';
import { RoleBoxes } from './role-boxes';

export function InviteForm({ action }: { action: FormAction }) {
  return (
    <Sheet labelledBy="invite" className="grid gap-4 p-5">
      <SheetTitle id="invite">Invite someone</SheetTitle>
      <ActionForm action={action} label="Invite someone">
        <TextField name="email" label="E-mail address" type="email" autoComplete="off" maxLength={254} />
        <RoleBoxes chosen={[]} />
        <SubmitButton>Send the invitation</SubmitButton>
      </ActionForm>
    </Sheet>
  );
}
