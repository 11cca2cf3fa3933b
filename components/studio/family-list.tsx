import Link from 'next/link';
import { type About, KIND_NAME, type Kind } from '@/generators/contract';
import { KindGlyph } from './kind-glyph';

function FamilyLine({ about }: { about: About }) {
  return (
    <li className="relative grid gap-x-8 gap-y-2 border-hair border-t px-5 py-5 focus-within:bg-tint hover:bg-tint sm:px-7 lg:grid-cols-[1.1fr_1fr_1fr]">
      <div>
        <h3 className="font-bold text-2xl leading-tight">
          <Link
            href={`/design/${about.id}`}
            className="underline-offset-4 after:absolute after:inset-0 hover:underline"
          >
            {about.name}
          </Link>
        </h3>
        <p className="mt-1">{about.summary}</p>
        <p className="mt-1 text-muted text-sm">Gives by {about.bendsBy}</p>
      </div>
      <p className="text-[0.95rem]">
        <b className="block font-semibold text-ok text-sm">Right when</b>
        {about.rightWhen}
      </p>
      <p className="text-[0.95rem]">
        <b className="block font-semibold text-over text-sm">Wrong when</b>
        {about.wrongWhen}
      </p>
    </li>
  );
}

/** The part families by kind. */
export function FamilyList({ families }: { families: readonly About[] }) {
  const kinds = (Object.keys(KIND_NAME) as Kind[]).filter((kind) =>
    families.some((one) => one.kind === kind),
  );
  return (
    <div className="mt-10 grid gap-8">
      {kinds.map((kind) => (
        <section key={kind} aria-labelledby={kind} className="grid gap-3 lg:grid-cols-[11rem_1fr]">
          <div className="flex items-center gap-3 lg:flex-col lg:items-start lg:pt-4">
            <KindGlyph kind={kind} size={64} />
            <h2 id={kind} className="font-bold text-2xl">
              {KIND_NAME[kind]}
            </h2>
          </div>
          <ul className="rounded-sheet border border-hair bg-sheet shadow-lift [&>li:first-child]:border-t-0">
            {families
              .filter((one) => one.kind === kind)
              .map((about) => (
                <FamilyLine key={about.id} about={about} />
              ))}
          </ul>
        </section>
      ))}
    </div>
  );
}
