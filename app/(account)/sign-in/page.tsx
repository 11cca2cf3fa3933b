import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { AccountSheet } from '@/components/account/account-sheet';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { currentViewer } from '@/lib/auth/session';
import { signInAction } from './actions';

export const metadata: Metadata = { title: 'Sign in' };

interface Props {
  readonly searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function SignInPage({ searchParams }: Props) {
  if (await currentViewer()) redirect('/account');
  const { next } = await searchParams;
  return (
    <AccountSheet
      title="Sign in"
      lead={
        <p>Designing and taking files needs no account. Sign in to keep designs and work with the club.</p>
      }
    >
      <ActionForm action={signInAction} label="Sign in">
        <TextField name="email" label="E-mail address" type="email" autoComplete="username" maxLength={254} />
        <TextField
          name="password"
          label="Password"
          type="password"
          autoComplete="current-password"
          maxLength={200}
        />
        <input type="hidden" name="next" value={typeof next === 'string' ? next : ''} />
        <SubmitButton>Sign in</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
