import { Download } from 'lucide-react';
import Link from 'next/link';
import { When } from '@/components/designs/when';
import { buttonClass } from '@/components/ui/button';
import { FinishedImage } from '@/components/ui/finished-image';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { Preset, PresetVersion } from '@/lib/access/presets';

export const PAD = 'px-5 py-4 sm:px-7';

export function Files({ version, link }: { version: PresetVersion; link: string }) {
  const address = (format: string) =>
    `/api/v1/export?family=${version.family}&format=${format}&quality=export&name=${encodeURIComponent(version.title.slice(0, 80))}&${link}`;
  return (
    <Sheet labelledBy="files" className={PAD}>
      <SheetTitle id="files">Files</SheetTitle>
      <p className="mt-1 text-muted text-sm">
        In millimetres, laid on the bed, built from the parameters at this moment.
      </p>
      <p className="mt-3 flex flex-wrap gap-2">
        {['stl', '3mf'].map((format) => (
          <a key={format} href={address(format)} download className={buttonClass('line')}>
            <Download aria-hidden="true" size={18} />
            {format.toUpperCase()}
          </a>
        ))}
      </p>
    </Sheet>
  );
}

export function Versions({ preset }: { preset: Preset }) {
  return (
    <Sheet labelledBy="versions" className={PAD}>
      <SheetTitle id="versions">Versions</SheetTitle>
      <ol className="mt-2">
        {preset.versions.map(({ number, title, decidedAt }) => (
          <li key={number} className="flex flex-wrap items-baseline gap-x-3 border-hair border-t py-1.5">
            <Link
              href={`/library/${preset.slug}?version=${number}`}
              aria-current={number === preset.version.number ? 'true' : undefined}
              className="inline-flex min-h-9 items-center underline underline-offset-4 aria-[current]:font-semibold aria-[current]:no-underline"
            >
              Version {number}
            </Link>
            <span>{title}</span>
            {decidedAt && (
              <span className="text-muted text-sm">
                <When iso={decidedAt} />
              </span>
            )}
          </li>
        ))}
      </ol>
    </Sheet>
  );
}

export function Photos({ version }: { version: PresetVersion }) {
  if (version.photos.length === 0) return null;
  return (
    <ul className="grid grid-cols-2 gap-3 sm:grid-cols-3">
      {version.photos.map(({ id, alt, width, height }) => (
        <li key={id}>
          <a href={`/api/v1/photos/${id}`} className="block">
            <FinishedImage
              src={`/api/v1/photos/${id}`}
              alt={alt}
              width={width}
              height={height}
              className="aspect-4/3 h-auto w-full rounded-sheet border border-hair bg-sheet object-cover"
            />
          </a>
        </li>
      ))}
    </ul>
  );
}
