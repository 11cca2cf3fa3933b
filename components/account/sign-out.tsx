import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import type { FormAction } from '@/lib/forms/state';

export const SignOut = ({ action }: { action: FormAction }) => (
  <ActionForm action={action} label="Sign out">
    <SubmitButton look="line">Sign out</SubmitButton>
  </ActionForm>
);
