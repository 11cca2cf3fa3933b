import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { AccountSheet } from '@/components/account/account-sheet';
import { BelowSignIn } from '@/components/account/below-sign-in';
import { DoneNote } from '@/components/account/done-note';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { clubFacts } from '@/lib/access/club';
import { currentViewer } from '@/lib/auth/session';
import { type Asked, askedFor } from '@/lib/http/page';
import { signInAction } from './actions';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({ searchParams }: { searchParams: Asked }) {
  if (await currentViewer()) redirect('/account');
  return (
    <AccountSheet
      title="Sign in"
      lead={
        <>
          <DoneNote done={await askedFor(searchParams, 'done')} />
          <p>Designing and taking files needs no account. Sign in to keep designs and work with the club.</p>
        </>
      }
      below={<BelowSignIn contact={clubFacts()?.contactEmail ?? null} />}
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
        <input type="hidden" name="next" value={(await askedFor(searchParams, 'next', 2000)) ?? ''} />
        <SubmitButton>Sign in</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
