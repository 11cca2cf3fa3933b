import type { Material } from '@/lib/materials/types';
import { formatQuantity } from '@/lib/units';

const percentOf = (strain: number, full: number) => `${Math.min(100, (100 * strain) / full)}%`;

function Ticks({ full }: { full: number }) {
  const steps = Array.from({ length: Math.round(full * 100) + 1 }, (_, index) => index);
  const every = steps.length > 6 ? 2 : 1;
  return (
    <span className="relative mt-1 block h-4 font-mono text-muted text-xs">
      {steps
        .filter((step) => step % every === 0)
        .map((step) => (
          <i
            key={step}
            className="absolute -translate-x-1/2 not-italic first:translate-x-0 last:-translate-x-full"
            style={{ left: percentOf(step / 100, full) }}
          >
            {step}
            {step === steps.at(-1) && ' %'}
          </i>
        ))}
    </span>
  );
}

/** How far a plastic may be strained: solid when opened often, lighter up to once, hatched beyond. */
export function StrainBar({ material, full }: { material: Material; full: number }) {
  const often = material.allowableOften?.value ?? 0;
  const once = material.allowableOnce?.value ?? 0;
  return (
    <div>
      <span aria-hidden="true" className="block">
        <span className="relative block h-4 border-ink border-b-2">
          <i className="hatched absolute inset-y-0 right-0" style={{ left: percentOf(once, full) }} />
          <i className="absolute inset-y-0 left-0 bg-petrol/30" style={{ width: percentOf(once, full) }} />
          <i className="absolute inset-y-0 left-0 bg-petrol" style={{ width: percentOf(often, full) }} />
        </span>
        <Ticks full={full} />
      </span>
      <p className="text-sm">
        <b className="font-semibold">{formatQuantity(often, 'strain')}</b> opened often,{' '}
        <b className="font-semibold">{formatQuantity(once, 'strain')}</b> once
        {once > full && <span className="text-muted">; runs off this scale</span>}
      </p>
    </div>
  );
}
