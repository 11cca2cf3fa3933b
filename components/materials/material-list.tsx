import Link from 'next/link';
import { serviceLimit } from '@/lib/materials/allowable';
import type { Material } from '@/lib/materials/types';
import { formatQuantity } from '@/lib/units';
import { StrainBar } from './strain-bar';

function Big({ value, children }: { value: string; children: string }) {
  return (
    <p className="leading-tight">
      <b className="block font-bold font-heading text-xl">{value}</b>
      <span className="text-muted text-sm">{children}</span>
    </p>
  );
}

const modulusOf = ({ flexuralModulus, tensileModulus }: Material) =>
  formatQuantity((flexuralModulus ?? tensileModulus)?.value ?? null, 'MPa');
const priceOf = ({ price }: Material) => (price ? `${price.perKg.toFixed(0)} €` : '–');

function MaterialLine({ material, full }: { material: Material; full: number }) {
  return (
    <li className="relative grid gap-x-8 gap-y-4 border-hair border-t px-5 py-5 focus-within:bg-tint hover:bg-tint sm:px-7 lg:grid-cols-[1.2fr_1.3fr_1fr]">
      <div>
        <h3 className="font-bold text-2xl leading-tight">
          <Link
            href={`/materials/${material.id}`}
            className="underline-offset-4 after:absolute after:inset-0 hover:underline"
          >
            {material.shortName}
          </Link>
        </h3>
        <p className="mt-1 max-w-prose text-[0.95rem]">{material.summary}</p>
      </div>
      <StrainBar material={material} full={full} />
      <div className="grid grid-cols-3 content-start gap-4">
        <Big value={modulusOf(material)}>modulus</Big>
        <Big value={formatQuantity(serviceLimit(material), 'degC')}>warmest use</Big>
        {material.process === 'printed' && <Big value={priceOf(material)}>a kilogram</Big>}
      </div>
    </li>
  );
}

/** Plastics one under the other, their strain on one scale from zero to `full` (a fraction). */
export function MaterialList({ materials, full }: { materials: readonly Material[]; full: number }) {
  return (
    <ul className="mt-4 rounded-sheet border border-hair bg-sheet shadow-lift [&>li:first-child]:border-t-0">
      {materials.map((material) => (
        <MaterialLine key={material.id} material={material} full={full} />
      ))}
    </ul>
  );
}
