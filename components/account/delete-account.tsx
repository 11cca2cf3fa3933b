import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextField } from '@/components/forms/text-field';
import { Sheet } from '@/components/ui/sheet';
import type { FormAction } from '@/lib/forms/state';

export function DeleteAccount({ action, name }: { action: FormAction; name: string }) {
  return (
    <Sheet className="p-5">
      <details>
        <summary className="min-h-6 font-bold font-heading text-lg">Delete your account</summary>
        <div className="mt-3 grid gap-6 lg:grid-cols-2">
          <ul className="grid max-w-prose list-disc gap-1.5 pl-5 marker:text-muted">
            <li>Your designs and their history are deleted at once and cannot be brought back.</li>
            <li>
              Presets you published stay in the club library under the name <strong>{name}</strong>, as others
              may have built on them. Ask a librarian first if one should be retired.
            </li>
            <li>What the audit trail says of you stays, with your name.</li>
            <li>Your address and password are deleted, and every sign-in ends.</li>
          </ul>
          <ActionForm action={action} label="Delete your account" className="max-w-md content-start">
            <TextField
              name="password"
              label="Your present password"
              type="password"
              autoComplete="current-password"
              maxLength={200}
            />
            <div>
              <SubmitButton look="line">Delete the account for good</SubmitButton>
            </div>
          </ActionForm>
        </div>
      </details>
    </Sheet>
  );
}
