import Link from 'next/link';
import { type About, type Guide, KIND_NAME } from '@/generators/contract';
import { PartPicture } from './part-tiles';

export interface GuideEntry {
  readonly about: About;
  readonly guide: Guide;
}

function Line({ about, guide }: GuideEntry) {
  return (
    <li className="relative grid grid-cols-[6.5rem_1fr] items-center gap-x-5 gap-y-2 border-hair border-t px-4 py-4 hover:bg-tint sm:grid-cols-[9rem_minmax(12rem,0.6fr)_1fr] sm:px-6">
      <PartPicture
        about={about}
        className="h-auto w-full rounded-field bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]"
      />
      <div>
        <p className="text-muted text-sm">
          {KIND_NAME[about.kind]} · {about.bendsBy}
        </p>
        <h2 className="font-bold text-2xl leading-tight tracking-tight">
          <Link
            href={`/guide/${about.id}`}
            className="underline-offset-4 after:absolute after:inset-0 hover:underline"
          >
            {about.name}
          </Link>
        </h2>
      </div>
      <p className="col-span-2 max-w-[62ch] sm:col-span-1">
        <span className="font-semibold">Fails first: </span>
        {guide.howItFails[0]}
      </p>
    </li>
  );
}

/** The families as a reader meets them: what gives, and what gives way. */
export function GuideIndex({ entries }: { entries: readonly GuideEntry[] }) {
  return (
    <ul className="rounded-sheet border border-hair bg-sheet shadow-lift [&>li:first-child]:border-t-0">
      {entries.map((entry) => (
        <Line key={entry.about.id} {...entry} />
      ))}
    </ul>
  );
}
