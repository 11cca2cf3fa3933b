import type { Metadata } from 'next';
import { AccountSheet } from '@/components/account/account-sheet';
import { SpentLink } from '@/components/account/spent-link';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { addressToConfirm } from '@/lib/auth/confirm-address';
import { type Asked, readToken } from '@/lib/http/page';
import { confirmAddressAction } from './actions';

export const metadata: Metadata = { title: 'Confirm an address' };

export default async function VerifyEmailPage({ searchParams }: { searchParams: Asked }) {
  const link = await readToken(searchParams, addressToConfirm);
  if (!link) return <SpentLink kind="confirmation" />;
  return (
    <AccountSheet title="Is this your address?">
      <ActionForm action={confirmAddressAction} label="Confirm an address">
        <p className="break-words font-semibold text-lg">{link.found}</p>
        <input type="hidden" name="token" value={link.token} />
        <SubmitButton>Confirm this address</SubmitButton>
      </ActionForm>
    </AccountSheet>
  );
}
