import Link from 'next/link';
import type { ReactNode } from 'react';
import type { PresetVersion } from '@/lib/access/presets';
import { formatQuantity } from '@/lib/units';
import { LICENCES } from './licences';
import { enclosureWords, sizeWords } from './words';

const OPENED = { once: 'opened once', sometimes: 'opened sometimes', often: 'opened often' } as const;
const LAYERS = { along: 'layers along the strain', across: 'layers across the strain' } as const;

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[8rem_1fr] gap-3 border-hair border-t py-2">
      <dt className="text-muted text-sm">{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

/** What is known of a version besides its figures. */
export function PresetFacts({
  version,
  family,
  material,
}: {
  version: PresetVersion;
  family: string;
  material: string;
}) {
  const licence = LICENCES[version.licence];
  const { use, size, mass, enclosure, tags, startedFrom } = version;
  return (
    <dl>
      <Fact name="Part">
        <Link href={`/guide/${version.family}`} className="underline underline-offset-4">
          {family}
        </Link>
      </Fact>
      <Fact name="Made for">
        <Link href={`/materials/${version.material}`} className="underline underline-offset-4">
          {material}
        </Link>
        , {OPENED[use.opening]}, {LAYERS[use.layers]}, up to {formatQuantity(use.temperature, 'degC')}
      </Fact>
      <Fact name="Size on the bed">{sizeWords(size)}</Fact>
      <Fact name="Mass">
        {mass === null ? 'not known: density missing' : `${formatQuantity(mass, 'g')}, printed solid`}
      </Fact>
      <Fact name="Printer">{enclosureWords(enclosure)}</Fact>
      {tags.length > 0 && (
        <Fact name="Tags">
          {tags.map((tag, at) => (
            <span key={tag}>
              {at > 0 && ', '}
              <Link
                href={`/library?text=${encodeURIComponent(tag)}`}
                className="underline underline-offset-4"
              >
                {tag}
              </Link>
            </span>
          ))}
        </Fact>
      )}
      {startedFrom && (
        <Fact name="Started from">
          <Link href={`/library/${startedFrom.slug}`} className="underline underline-offset-4">
            {startedFrom.title}
          </Link>
        </Fact>
      )}
      <Fact name="Licence">
        <a href={licence.deed} rel="license noreferrer" className="underline underline-offset-4">
          {licence.name}
        </a>
        : {licence.means}
      </Fact>
    </dl>
  );
}
