import type { Metadata } from 'next';
import { AccountSheet } from '@/components/account/account-sheet';
import { SpentLink } from '@/components/account/spent-link';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { NewPasswordField } from '@/components/forms/text-field';
import { goodLink } from '@/lib/auth/links';
import { type Asked, readToken } from '@/lib/http/page';
import { resetPasswordAction } from './actions';

export const metadata: Metadata = { title: 'A new password' };

export default async function ResetPasswordPage({ searchParams }: { searchParams: Asked }) {
  const link = await readToken(searchParams, (token) => goodLink(token, ['reset-password']));
  if (!link) return <SpentLink kind="reset" />;
  return (
    <AccountSheet title="A new password" lead={<p>Every sign-in of your account ends, on every device.</p>}>
      <ActionForm action={resetPasswordAction} label="A new password">
        <NewPasswordField />
        <input type="hidden" name="token" value={link.token} />
        <SubmitButton>Set this password</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
