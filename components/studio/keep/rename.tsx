'use client';

import { Pencil } from 'lucide-react';
import { useRouter } from 'next/navigation';
import { type FormEvent, useId, useState } from 'react';
import { send } from '@/components/forms/send';
import { Button, buttonClass } from '@/components/ui/button';
import { lineClass } from '@/components/ui/field-class';
import { closeNote, Note } from '@/components/ui/note';

/** Gives a kept design another name. */
export function Rename({ id, name }: { id: string; name: string }) {
  const router = useRouter();
  const field = useId();
  const [fault, setFault] = useState<string | null>(null);
  const rename = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const given = String(new FormData(form).get('name') ?? '');
    const sent = await send('PATCH', `/api/v1/designs/${id}`, { name: given });
    setFault(sent.ok ? null : sent.message);
    if (!sent.ok) return form.querySelector('input')?.focus();
    closeNote(form);
    router.refresh();
  };
  return (
    <Note
      className={buttonClass('quiet', true)}
      trigger={
        <>
          <Pencil aria-hidden="true" size={16} />
          Rename
        </>
      }
    >
      <form onSubmit={rename} className="grid gap-2">
        <label htmlFor={field} className="font-semibold">
          Name
        </label>
        <input
          id={field}
          name="name"
          key={name}
          defaultValue={name}
          maxLength={80}
          autoComplete="off"
          aria-invalid={fault ? true : undefined}
          aria-describedby={fault ? `${field}-fault` : undefined}
          className={lineClass}
        />
        {fault && (
          <p id={`${field}-fault`} className="text-over">
            {fault}
          </p>
        )}
        <Button type="submit" look="ink" small className="justify-self-start">
          Rename
        </Button>
      </form>
    </Note>
  );
}
