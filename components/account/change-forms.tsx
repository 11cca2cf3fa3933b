import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { NewPasswordField, TextField } from '@/components/forms/text-field';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { Member } from '@/lib/access/policy';
import type { FormAction } from '@/lib/forms/state';

const PresentPassword = () => (
  <TextField
    name="password"
    label="Your present password"
    type="password"
    autoComplete="current-password"
    maxLength={200}
  />
);

export function ChangeForms({
  member,
  rename,
  changeEmail,
  changePassword,
}: {
  member: Member;
  rename: FormAction;
  changeEmail: FormAction;
  changePassword: FormAction;
}) {
  return (
    <div className="grid items-start gap-6 lg:grid-cols-3">
      <Sheet labelledBy="name" className="grid gap-4 p-5">
        <SheetTitle id="name">Name</SheetTitle>
        <ActionForm action={rename} label="Change your name">
          <TextField
            name="name"
            label="Your name"
            hint="Stands beside what you publish."
            autoComplete="name"
            defaultValue={member.name}
            maxLength={80}
          />
          <SubmitButton look="line">Change the name</SubmitButton>
        </ActionForm>
      </Sheet>
      <Sheet labelledBy="address" className="grid gap-4 p-5">
        <SheetTitle id="address">E-mail address</SheetTitle>
        <ActionForm action={changeEmail} label="Change your address">
          <TextField name="email" label="New address" type="email" autoComplete="email" maxLength={254} />
          <PresentPassword />
          <SubmitButton look="line">Mail a link to it</SubmitButton>
        </ActionForm>
      </Sheet>
      <Sheet labelledBy="password" className="grid gap-4 p-5">
        <SheetTitle id="password">Password</SheetTitle>
        <ActionForm action={changePassword} label="Change your password">
          <PresentPassword />
          <NewPasswordField name="next" />
          <SubmitButton look="line">Change the password</SubmitButton>
        </ActionForm>
      </Sheet>
    </div>
  );
}
