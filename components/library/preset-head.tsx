import { Play } from 'lucide-react';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { buttonClass } from '@/components/ui/button';
import type { Preset } from '@/lib/access/presets';
import type { FormAction } from '@/lib/forms/state';
import { FavouriteButton } from './favourite-button';
import { reportWords } from './words';

/** A member's copy is kept in the account and remembers where it came from; a visitor's is a link to the design page. */
function Start({
  preset,
  link,
  member,
  action,
}: {
  preset: Preset;
  link: string;
  member: boolean;
  action: FormAction;
}) {
  if (!member) {
    return (
      <a href={link} className={buttonClass('ink')}>
        <Play aria-hidden="true" size={18} />
        Start from this
      </a>
    );
  }
  return (
    <ActionForm action={action} label="Start from this preset">
      <input type="hidden" name="slug" value={preset.slug} />
      <input type="hidden" name="version" value={preset.version.number} />
      <SubmitButton>
        <Play aria-hidden="true" size={18} />
        Start from this
      </SubmitButton>
    </ActionForm>
  );
}

export function PresetHead({
  preset,
  link,
  member,
  start,
}: {
  preset: Preset;
  link: string;
  member: boolean;
  start: FormAction;
}) {
  const { version, author, listed, reports } = preset;
  const worked = reports.filter((one) => one.worked).length;
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <div className="max-w-3xl">
        <h1 className="font-bold text-4xl tracking-tight sm:text-5xl">{version.title}</h1>
        <p className="mt-2 text-muted">
          by {author}, version {version.number}. {reportWords(worked, reports.length - worked)}.
        </p>
        {!listed && (
          <p className="mt-3 border-near border-l-4 bg-near-soft px-4 py-2">
            Retired: no longer listed in the library. Read the reports before you print it.
          </p>
        )}
      </div>
      <div className="flex flex-wrap items-center gap-2">
        {member && <FavouriteButton slug={preset.slug} marked={preset.favourite} />}
        <Start preset={preset} link={link} member={member} action={start} />
      </div>
    </div>
  );
}
