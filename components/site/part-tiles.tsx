import Link from 'next/link';
import { KindGlyph } from '@/components/studio/kind-glyph';
import { classNames } from '@/components/ui/class-names';
import { FinishedImage } from '@/components/ui/finished-image';
import { type About, KIND_NAME, type Kind } from '@/generators/contract';

const KINDS = Object.keys(KIND_NAME) as Kind[];

export const PartPicture = ({ about, className }: { about: About; className?: string }) => (
  <FinishedImage
    src={`/guide/${about.id}/part.svg`}
    alt={`${about.name}, drawn from the first preset`}
    width={480}
    height={360}
    className={className}
  />
);

function Tile({ about }: { about: About }) {
  return (
    <li className="flex flex-col overflow-hidden rounded-sheet border border-hair bg-sheet shadow-lift">
      <div className="relative border-hair border-b bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]">
        <PartPicture about={about} className="h-auto w-full" />
        <span className="absolute top-2.5 left-3 flex items-center gap-1.5 font-semibold text-sm">
          <KindGlyph kind={about.kind} size={22} />
          {KIND_NAME[about.kind]}
        </span>
      </div>
      <div className="flex flex-1 flex-col gap-1.5 p-4">
        <h3 className="font-bold text-xl leading-tight">{about.name}</h3>
        <p className="text-muted">{about.summary}</p>
        <p className="mt-auto flex gap-5 pt-2">
          <Link href={`/design/${about.id}`} className="inline-flex min-h-9 items-center font-semibold">
            <span className="marked">Design one</span>
          </Link>
          <Link
            href={`/guide/${about.id}`}
            className="inline-flex min-h-9 items-center text-muted underline decoration-hair underline-offset-4 hover:text-ink hover:decoration-ink"
          >
            How it works
          </Link>
        </p>
      </div>
    </li>
  );
}

const SPAN = {
  two: { 1: 'sm:col-span-1', 2: 'sm:col-span-2' },
  three: { 1: 'lg:col-span-1', 2: 'lg:col-span-2', 3: 'lg:col-span-3' },
  four: { 1: 'xl:col-span-1', 2: 'xl:col-span-2', 3: 'xl:col-span-3', 4: 'xl:col-span-4' },
} as const;

/** Columns left over in the last row of `count` tiles; all of them where the row is full. */
export const leftOver = (count: number, columns: number): number => columns - (count % columns);

/** Fills the last row, however many tiles there are. */
function LastTile({ count }: { count: number }) {
  const spans = [
    SPAN.two[leftOver(count, 2) as 1 | 2],
    SPAN.three[leftOver(count, 3) as 1 | 2 | 3],
    SPAN.four[leftOver(count, 4) as 1 | 2 | 3 | 4],
  ];
  return (
    <li
      className={classNames(
        'flex flex-col justify-center gap-2 rounded-sheet border border-edge border-dashed p-6',
        ...spans,
      )}
    >
      <h3 className="font-bold text-2xl leading-tight">Not sure which?</h3>
      <p className="max-w-prose text-muted">Each kind of part is right for some jobs and wrong for others.</p>
      <Link href="/design" className="inline-flex min-h-9 w-fit items-center font-semibold">
        <span className="marked">Compare when each is right</span>
      </Link>
    </li>
  );
}

/** Every family with its picture, in the order of the kinds. */
export function PartTiles({ families }: { families: readonly About[] }) {
  const sorted = [...families].sort((a, b) => KINDS.indexOf(a.kind) - KINDS.indexOf(b.kind));
  return (
    <ul className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
      {sorted.map((about) => (
        <Tile key={about.id} about={about} />
      ))}
      <LastTile count={sorted.length} />
    </ul>
  );
}
