import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { ClubSettings } from '@/lib/access/club';
import type { FormAction } from '@/lib/forms/state';

export function ClubForm({ club, action }: { club: ClubSettings | null; action: FormAction }) {
  return (
    <Sheet labelledBy="club" className="grid gap-4 p-5">
      <SheetTitle id="club">The club</SheetTitle>
      <ActionForm action={action} label="The club">
        <TextField
          name="name"
          label="Name"
          hint="At the top of every page and in every mail."
          defaultValue={club?.name ?? ''}
          maxLength={80}
        />
        <TextField
          name="contactEmail"
          label="Address for questions"
          hint="May stay empty."
          type="email"
          defaultValue={club?.contactEmail ?? ''}
          maxLength={254}
        />
        <div>
          <SubmitButton>Keep</SubmitButton>
        </div>
      </ActionForm>
    </Sheet>
  );
}
