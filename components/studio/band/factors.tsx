import { Fragment } from 'react';
import { Note } from '@/components/ui/note';
import type { AllowableFactor, AllowableStrain } from '@/lib/materials/allowable';
import { formatQuantity } from '@/lib/units';
import { SourceText } from '../source-note';

function factorText({ id, value }: AllowableFactor): string {
  if (value === null) return 'not known';
  return id === 'short-term' ? formatQuantity(value, 'strain') : value.toFixed(2);
}

function Factor({ factor }: { factor: AllowableFactor }) {
  return (
    <Note
      aria-label={`${factor.label}: ${factorText(factor)}. Source`}
      className="group flex min-h-11 max-w-40 flex-col justify-start rounded-field text-left leading-tight"
      trigger={
        <>
          <span className="block font-mono font-semibold text-[0.95rem]">{factorText(factor)}</span>
          <span className="block text-muted text-xs underline decoration-dotted underline-offset-4 group-hover:text-ink">
            {factor.label}
          </span>
        </>
      }
    >
      {factor.note && <p className="mb-2 font-semibold">{factor.note}</p>}
      <SourceText source={factor.source} />
    </Note>
  );
}

/** The allowed strain as the product it is, each factor with its source on demand. */
export function Factors({ allowable }: { allowable: AllowableStrain }) {
  return (
    <div className="flex flex-wrap items-start gap-x-3 gap-y-1">
      {allowable.factors.map((factor, at) => (
        <Fragment key={factor.id}>
          {at > 0 && (
            <span aria-hidden="true" className="font-mono text-edge">
              ×
            </span>
          )}
          <Factor factor={factor} />
        </Fragment>
      ))}
      <span aria-hidden="true" className="font-mono text-edge">
        =
      </span>
      <p className="leading-tight">
        <span className="block font-mono font-semibold text-[0.95rem]">
          {formatQuantity(allowable.value, 'strain')}
        </span>
        <span className="block text-muted text-xs">allowed</span>
      </p>
    </div>
  );
}
