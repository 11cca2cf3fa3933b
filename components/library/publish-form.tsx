'use client';

import { ActionForm } from '@/components/forms/action-form';
import { ChooseField } from '@/components/forms/choose-field';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextArea } from '@/components/forms/text-area';
import { TextField } from '@/components/forms/text-field';
import type { FormAction } from '@/lib/forms/state';
import { LICENCE_OPTIONS } from './licences';
import { PhotoField } from './photo-field';

export interface Words {
  readonly title: string;
  readonly purpose: string;
  readonly printingNotes: string;
  readonly tags: readonly string[];
  readonly licence: string;
}

/** What a design needs besides its dimensions to be of use to others. */
export function PublishForm({
  action,
  designId,
  first,
}: {
  action: FormAction;
  designId: string;
  first: Words;
}) {
  return (
    <ActionForm action={action} label="Hand in for the library">
      <input type="hidden" name="designId" value={designId} />
      <TextField name="title" label="Title" maxLength={80} defaultValue={first.title} />
      <TextArea
        name="purpose"
        label="What for"
        maxLength={1000}
        defaultValue={first.purpose}
        hint="What it holds, how often it is opened, what it must survive."
      />
      <TextArea
        name="printingNotes"
        label="Printing it"
        maxLength={2000}
        defaultValue={first.printingNotes}
        hint="Which way up, what you changed on the printer, what went wrong at first."
      />
      <TextField
        name="tags"
        label="Tags"
        maxLength={200}
        defaultValue={first.tags.join(', ')}
        hint="Up to eight words, parted by commas."
      />
      <ChooseField name="licence" label="Licence" options={LICENCE_OPTIONS} first={first.licence} />
      <PhotoField />
      <p className="max-w-prose text-muted text-sm">
        A librarian checks it before it is listed. A published version is never changed, only followed by
        another one; it stays, under your name, should you leave the club.
      </p>
      <div>
        <SubmitButton>Hand in</SubmitButton>
      </div>
    </ActionForm>
  );
}
