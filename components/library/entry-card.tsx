import { Heart, Wrench } from 'lucide-react';
import Link from 'next/link';
import { VerdictMark } from '@/components/studio/verdict';
import type { LibraryEntry } from '@/lib/access/library';
import { Drawing } from './drawing';
import { reportWords } from './words';

export interface Entry extends LibraryEntry {
  readonly familyName: string;
  readonly materialName: string;
}

/** A preset as the library lists it. */
export function EntryCard({ entry }: { entry: Entry }) {
  const { slug, title, purpose, familyName, materialName, verdict, worked, failed, favourites } = entry;
  return (
    <li className="relative flex flex-col overflow-hidden rounded-sheet border border-hair bg-sheet shadow-lift focus-within:border-ink hover:border-edge">
      <Drawing
        src={`/api/v1/presets/${slug}/picture?of=${entry.versionId.slice(0, 8)}`}
        alt=""
        className="border-hair border-b"
      />
      <div className="flex flex-1 flex-col gap-1.5 p-4">
        <h2 className="font-bold text-xl leading-tight">
          <Link
            href={`/library/${slug}`}
            prefetch={false}
            className="underline-offset-4 after:absolute after:inset-0 hover:underline"
          >
            {title}
          </Link>
        </h2>
        <p className="text-muted text-sm">
          {familyName} in {materialName}, by {entry.author}
        </p>
        <p className="line-clamp-3">{purpose}</p>
        <div className="mt-auto flex flex-wrap items-center justify-between gap-x-4 gap-y-2 pt-2 text-sm">
          <VerdictMark verdict={verdict} />
          <span className="flex items-center gap-3 text-muted">
            <span className="inline-flex items-center gap-1">
              <Wrench aria-hidden="true" size={15} />
              {reportWords(worked, failed)}
            </span>
            {favourites > 0 && (
              <span className="inline-flex items-center gap-1">
                <Heart aria-hidden="true" size={15} />
                {favourites}
                <span className="sr-only">{favourites === 1 ? 'favourite' : 'favourites'}</span>
              </span>
            )}
          </span>
        </div>
      </div>
    </li>
  );
}
