'use client';

import { ActionForm } from '@/components/forms/action-form';
import { ChooseField } from '@/components/forms/choose-field';
import { SubmitButton } from '@/components/forms/submit-button';
import { TextArea } from '@/components/forms/text-area';
import { TextField } from '@/components/forms/text-field';
import type { Option } from '@/components/ui/select-field';
import type { FormAction } from '@/lib/forms/state';

const OUTCOMES: readonly Option[] = [
  { value: 'yes', label: 'It worked' },
  { value: 'no', label: 'It did not' },
];

/** "Worked for me" or not: one report a member and version. */
export function ReportForm({
  action,
  slug,
  version,
  material,
  materials,
}: {
  action: FormAction;
  slug: string;
  version: number;
  material: string;
  materials: readonly Option[];
}) {
  return (
    <ActionForm action={action} label="Tell how it went" className="max-w-xl">
      <input type="hidden" name="slug" value={slug} />
      <input type="hidden" name="version" value={version} />
      <div className="grid gap-4 sm:grid-cols-2">
        <ChooseField name="worked" label="How it went" options={OUTCOMES} first="yes" />
        <ChooseField name="material" label="Plastic" options={materials} first={material} />
      </div>
      <TextField
        name="printer"
        label="Printer"
        maxLength={60}
        placeholder="the bench printer, 0.4 mm nozzle"
      />
      <TextArea
        name="note"
        label="Note"
        maxLength={600}
        rows={3}
        hint="What fitted, what broke, what you changed."
      />
      <div>
        <SubmitButton look="line">Send the report</SubmitButton>
      </div>
    </ActionForm>
  );
}
