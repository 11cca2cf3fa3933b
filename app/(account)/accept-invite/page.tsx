import type { Metadata } from 'next';
import { AccountSheet } from '@/components/account/account-sheet';
import { SpentLink } from '@/components/account/spent-link';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { NewPasswordField, TextField } from '@/components/forms/text-field';
import { clubName } from '@/lib/access/club';
import { invitationOf } from '@/lib/auth/accept-invitation';
import { type Asked, readToken } from '@/lib/http/page';
import { acceptInvitationAction } from './actions';

export const metadata: Metadata = { title: 'Accept an invitation' };

export default async function AcceptInvitationPage({ searchParams }: { searchParams: Asked }) {
  const link = await readToken(searchParams, (token) => invitationOf(token).email);
  if (!link) return <SpentLink kind="invitation" />;
  return (
    <AccountSheet
      title={`Welcome to ${clubName() ?? 'the club'}`}
      lead={
        <p>
          Your account will go by <strong className="text-ink">{link.found}</strong>.
        </p>
      }
    >
      <ActionForm action={acceptInvitationAction} label="Accept the invitation">
        <TextField
          name="name"
          label="Your name"
          hint="As clubmates know you. It stands beside what you publish."
          autoComplete="name"
          maxLength={80}
        />
        <NewPasswordField />
        <input type="hidden" name="token" value={link.token} />
        <SubmitButton>Join</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
