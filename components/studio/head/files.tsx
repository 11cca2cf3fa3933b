'use client';

import { ChevronDown, Download } from 'lucide-react';
import { useState } from 'react';
import { buttonClass } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Note } from '@/components/ui/note';
import { Segmented } from '@/components/ui/segmented';
import type { Family } from '@/generators/contract';
import { type Design, writeLink } from '@/generators/url-state';
import { useReading, useSession } from '../session-context';

export type FileFormat = 'stl' | '3mf';

const FORMATS = [
  { value: 'stl', label: 'STL' },
  { value: '3mf', label: '3MF' },
] as const;

const ABOUT: Readonly<Record<FileFormat, string>> = {
  stl: 'Triangles only, in millimetres.',
  '3mf': 'Triangles with unit, name and plastic.',
};

interface Wish {
  readonly format: FileFormat;
  /** how the part lies on the bed; the family's best where null */
  readonly stance: string | null;
  /** all bodies where left out */
  readonly body?: string;
}

/** Address of the file of a design. */
export function exportLink(family: Family, design: Design, { format, stance, body }: Wish): string {
  const wish = new URLSearchParams({ family: family.about.id, format, quality: 'export' });
  if (stance !== null) wish.set('stance', stance);
  if (body !== undefined) wish.set('bodies', body);
  return `/api/v1/export?${wish}&${writeLink(family, design)}`;
}

/** The file to slice: one press for the usual one, a note for the other format and single bodies. */
export function Files({ bodies, stance }: { bodies: readonly string[]; stance: string | null }) {
  const { family } = useSession();
  const design = useReading((reading) => reading.design);
  const faulty = useReading(({ issues }) => issues.length > 0);
  const [format, setFormat] = useState<FileFormat>('stl');
  const choices = bodies.length > 1 ? bodies : [];
  return (
    <div className="flex">
      <a
        href={exportLink(family, design, { format, stance })}
        download
        className={classNames(buttonClass('ink'), 'rounded-r-none')}
      >
        <Download aria-hidden="true" size={18} />
        Download {format.toUpperCase()}
        {faulty && ' '}
        {faulty && (
          <span className="max-w-20 whitespace-normal font-normal text-xs/tight">of the last valid part</span>
        )}
      </a>
      <Note
        aria-label="Other files"
        className={classNames(buttonClass('ink'), 'rounded-l-none border-l-paper px-2!')}
        trigger={<ChevronDown aria-hidden="true" size={18} />}
      >
        <h2 className="mb-2 font-bold">{faulty ? 'File of the last valid part' : 'File'}</h2>
        <Segmented legend="Format" value={format} options={FORMATS} onChange={setFormat} />
        <p className="mt-1.5 text-muted">{ABOUT[format]}</p>
        <ul className="mt-3 grid gap-1">
          {choices.map((body) => (
            <li key={body}>
              <a
                href={exportLink(family, design, { format, stance, body })}
                download
                className="flex min-h-9 items-center gap-2 font-semibold underline underline-offset-4"
              >
                <Download aria-hidden="true" size={16} />
                only the {body}
              </a>
            </li>
          ))}
        </ul>
      </Note>
    </div>
  );
}
