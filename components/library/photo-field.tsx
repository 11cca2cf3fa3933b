'use client';

import { ImagePlus, X } from 'lucide-react';
import { type ChangeEvent, useId, useState } from 'react';
import { useForm } from '@/components/forms/action-form';
import { FieldError } from '@/components/forms/field-error';
import { Button } from '@/components/ui/button';
import { lineClass } from '@/components/ui/field-class';
import { FinishedImage } from '@/components/ui/finished-image';
import type { Photo } from '@/lib/access/photos';

const MOST = 6;
const MOST_BYTES = 12 * 1024 * 1024;

async function upload(file: File): Promise<Photo | string> {
  if (file.size > MOST_BYTES) return `${file.name}: at most 12 MB`;
  const response = await fetch('/api/v1/photos', { method: 'POST', body: file }).catch(() => null);
  if (!response) return `${file.name}: the server cannot be reached`;
  const answer = await response.json().catch(() => ({}));
  return response.ok ? (answer as Photo) : `${file.name}: ${answer.detail ?? 'could not be read'}`;
}

function Line({ photo, number, onRemove }: { photo: Photo; number: number; onRemove: () => void }) {
  const id = useId();
  return (
    <li className="grid grid-cols-[6rem_1fr_auto] items-center gap-3">
      <FinishedImage
        src={`/api/v1/photos/${photo.id}`}
        alt=""
        width={photo.width}
        height={photo.height}
        className="aspect-4/3 w-full rounded-field border border-hair object-cover"
      />
      <div className="grid gap-1 text-sm">
        <label htmlFor={id}>What photo {number} shows</label>
        <input id={id} name="alts" maxLength={200} className={lineClass} />
        <input type="hidden" name="photos" value={photo.id} />
      </div>
      <Button look="quiet" small aria-label={`Leave out photo ${number}`} onClick={onRemove}>
        <X aria-hidden="true" size={17} />
      </Button>
    </li>
  );
}

/** Photos of the print: sent at once, made smaller and rid of place and camera by the server. */
export function PhotoField() {
  const id = useId();
  const { state } = useForm();
  const [photos, setPhotos] = useState<readonly Photo[]>([]);
  const [faults, setFaults] = useState<readonly string[]>([]);
  const [busy, setBusy] = useState(false);
  const add = async ({ target }: ChangeEvent<HTMLInputElement>) => {
    const files = [...(target.files ?? [])].slice(0, MOST - photos.length);
    target.value = '';
    setBusy(true);
    const answers: (Photo | string)[] = [];
    for (const file of files) answers.push(await upload(file));
    setPhotos((before) => [...before, ...answers.filter((one) => typeof one !== 'string')]);
    setFaults(answers.filter((one) => typeof one === 'string'));
    setBusy(false);
  };
  const remove = (photo: Photo) => {
    setPhotos((before) => before.filter((one) => one !== photo));
    void fetch(`/api/v1/photos/${photo.id}`, { method: 'DELETE' }).catch(() => null);
  };
  return (
    <div className="grid gap-2">
      <label htmlFor={id} className="font-semibold">
        Photos
      </label>
      <p id={`${id}-hint`} className="text-muted text-sm">
        Up to {MOST}, JPEG, PNG or WebP, at most 12 MB each. Place and camera data are removed.
      </p>
      <ul className="grid gap-3">
        {photos.map((photo, at) => (
          <Line key={photo.id} photo={photo} number={at + 1} onRemove={() => remove(photo)} />
        ))}
      </ul>
      {photos.length < MOST && (
        <span className="relative inline-flex min-h-11 items-center gap-2 justify-self-start rounded-field border border-edge bg-sheet px-4 font-semibold has-focus-visible:outline-3 has-focus-visible:outline-petrol has-focus-visible:outline-offset-2 hover:border-ink">
          <ImagePlus aria-hidden="true" size={18} />
          {busy ? 'Sending' : 'Choose photos'}
          <input
            id={id}
            type="file"
            accept="image/jpeg,image/png,image/webp"
            multiple
            disabled={busy}
            aria-describedby={`${id}-hint`}
            onChange={add}
            className="absolute inset-0 cursor-pointer opacity-0"
          />
        </span>
      )}
      <div role="alert" className="grid gap-1">
        {[...faults, ...[state.errors.photos ?? []].flat()].map((fault) => (
          <FieldError key={fault} id={`${id}-error`}>
            {fault}
          </FieldError>
        ))}
      </div>
    </div>
  );
}
