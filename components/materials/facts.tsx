import type { ReactNode } from 'react';
import { SourceText } from '@/components/studio/source-note';
import type { Judgement, Material, Range, Source } from '@/lib/materials/types';
import { UNIT_SYMBOL } from '@/lib/units';

function Fact({ label, children, source }: { label: string; children: ReactNode; source: Source }) {
  return (
    <div className="grid gap-x-4 border-hair border-t py-2 sm:grid-cols-[15rem_14rem_1fr]">
      <dt className="font-semibold">{label}</dt>
      <dd>{children}</dd>
      <dd className="text-sm">
        <SourceText source={source} />
      </dd>
    </div>
  );
}

const between = ({ low, high, unit }: Range) =>
  `${low === high ? low : `${low} to ${high}`} ${UNIT_SYMBOL[unit]}`;

const ENCLOSURE = { needed: 'needed', helpful: 'helpful', 'not-needed': 'not needed' } as const;
const WARP = {
  low: 'low',
  medium: 'medium',
  high: 'high',
  'very-high': 'very high',
  unknown: 'not known',
} as const;

function Heat({ label, range, fallback }: { label: string; range: Range | null; fallback: Source }) {
  return (
    <Fact label={label} source={range?.source ?? fallback}>
      {range ? between(range) : 'not known'}
    </Fact>
  );
}

/** Nozzle, bed, enclosure, surface, drying and warp. */
export function PrintFacts({ print }: { print: NonNullable<Material['print']> }) {
  const { nozzle, bed, enclosure, bedSurface, drying, warp, source } = print;
  return (
    <dl className="mt-3">
      <Heat label="Nozzle" range={nozzle} fallback={source} />
      <Heat label="Bed" range={bed} fallback={source} />
      <Fact label="Enclosure" source={source}>
        {ENCLOSURE[enclosure]}
      </Fact>
      <Fact label="Bed surface" source={source}>
        {bedSurface}
      </Fact>
      {drying && (
        <Fact label="Drying" source={drying.temperature.source}>
          {between(drying.temperature)}, {between(drying.hours)}
        </Fact>
      )}
      <Fact label="Warp" source={source}>
        {WARP[warp]}
      </Fact>
    </dl>
  );
}

const RATING = { good: 'good', fair: 'fair', poor: 'poor', unknown: 'not known' } as const;
const FOLDS = {
  'long-life': 'long life',
  thousands: 'thousands of folds',
  few: 'under 1000 folds',
  unknown: 'not known',
} as const;

function Judged({ label, judgement }: { label: string; judgement: Judgement }) {
  return (
    <Fact label={label} source={judgement.source}>
      <b className="font-semibold">{RATING[judgement.rating]}</b>
      <span className="block text-sm">{judgement.because}</span>
    </Fact>
  );
}

/** Weather, chemicals, gluing, folding, the secant model and the price. */
export function OtherFacts({ material }: { material: Material }) {
  const { foldEndurance, secant, price } = material;
  return (
    <dl className="mt-3">
      <Judged label="Weather" judgement={material.weather} />
      <Judged label="Chemicals" judgement={material.chemicals} />
      <Judged label="Gluing" judgement={material.gluing} />
      <Fact label="Folding as a thin web" source={foldEndurance.source}>
        <b className="font-semibold">{FOLDS[foldEndurance.class]}</b>
        <span className="block text-sm">{foldEndurance.because}</span>
      </Fact>
      <Fact label="Modulus under strain" source={secant.source}>
        {secant.kind === 'constant'
          ? 'taken as constant'
          : `falls by ${(secant.slope).toFixed(1)} % of itself for each 1 % of strain`}
      </Fact>
      {price && (
        <Fact label="Price" source={price.source}>
          {price.perKg.toFixed(2)} € per kg, entered {price.asOf}
        </Fact>
      )}
    </dl>
  );
}
