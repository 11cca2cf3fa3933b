import type { Metadata } from 'next';
import { AccountSheet } from '@/components/account/account-sheet';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { askResetAction } from './actions';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgotPasswordPage() {
  return (
    <AccountSheet
      title="Forgotten password"
      lead={<p>We mail you a link with which you choose a new one. It works for half an hour.</p>}
    >
      <ActionForm action={askResetAction} label="Forgotten password">
        <TextField name="email" label="E-mail address" type="email" autoComplete="username" maxLength={254} />
        <SubmitButton>Mail me a link</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
