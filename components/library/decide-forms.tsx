'use client';

import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextArea } from '@/components/forms/text-area';
import type { FormAction } from '@/lib/forms/state';

interface Actions {
  readonly id: string;
  readonly again: FormAction;
  readonly publish: FormAction;
  readonly sendBack: FormAction;
}

/** What a librarian can do with a version that waits. */
export function DecideForms({ id, again, publish, sendBack }: Actions) {
  const version = <input type="hidden" name="id" value={id} />;
  return (
    <div className="grid gap-6">
      <ActionForm action={again} label="Run the check again">
        {version}
        <div>
          <SubmitButton look="line">Run the check again</SubmitButton>
        </div>
      </ActionForm>
      <ActionForm action={publish} label="Publish">
        {version}
        <TextArea name="note" label="Note, if there is one" maxLength={600} rows={2} />
        <div>
          <SubmitButton>Publish</SubmitButton>
        </div>
      </ActionForm>
      <ActionForm action={sendBack} label="Send back">
        {version}
        <TextArea
          name="note"
          label="What is missing"
          maxLength={600}
          rows={3}
          hint="The author reads this."
        />
        <div>
          <SubmitButton look="line">Send back</SubmitButton>
        </div>
      </ActionForm>
    </div>
  );
}

/** Takes a published preset off the list. */
export function RetireForm({ slug, action }: { slug: string; action: FormAction }) {
  return (
    <ActionForm action={action} label="Retire">
      <input type="hidden" name="slug" value={slug} />
      <TextArea name="note" label="Why it is retired" maxLength={600} rows={2} />
      <div>
        <SubmitButton look="line">Retire the preset</SubmitButton>
      </div>
    </ActionForm>
  );
}
