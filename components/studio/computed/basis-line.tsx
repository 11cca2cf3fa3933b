'use client';

import type { Computed } from '@/generators/computed';
import { type Basis, formulaBeside } from './standing';
import { useStanding } from './standing-context';

/** Id of the sheet that tells how the figures came about. */
export const HOW_ID = 'how-computed';

function openHow(): void {
  const details = document.getElementById(HOW_ID);
  if (!(details instanceof HTMLDetailsElement)) return;
  details.open = true;
  const calm = window.matchMedia('(prefers-reduced-motion: reduce)').matches;
  details.scrollIntoView({ behavior: calm ? 'auto' : 'smooth', block: 'start' });
  details.querySelector('summary')?.focus({ preventScroll: true });
}

function words(basis: Basis, ofFigure: boolean): string {
  if (basis.kind === 'solving') return 'Stands on the corrected formula while finite elements are solved.';
  if (basis.kind === 'formula') return `Stands on the corrected formula. ${basis.because}`;
  if (!ofFigure) return 'This figure is the formula’s; others among the checks stand on finite elements.';
  return basis.pending
    ? 'Stands on finite elements for small movement while the large one is solved.'
    : 'Stands on finite elements, solved on the outline of the part.';
}

/** A difference worth saying, with its likely reason. */
function Apart({ difference, likely }: Computed) {
  if (difference === null || likely === null) return null;
  const side = difference < 0 ? 'below' : 'above';
  return (
    <p className="max-w-prose border-near border-l-4 bg-near-soft px-2 py-1">
      Computed {Math.round(100 * Math.abs(difference))} % {side} the corrected formula, likely because{' '}
      {likely}.
    </p>
  );
}

/** What the figure on the band stands on, and how it came about. */
export function BasisLine({ figure }: { figure: string }) {
  const standing = useStanding();
  const { basis } = standing;
  const ofFigure = formulaBeside(standing, figure) !== null;
  return (
    <div className="grid gap-1.5 text-sm">
      <p>
        <span className="text-muted">{words(basis, ofFigure)}</span>{' '}
        <button
          type="button"
          onClick={openHow}
          className="min-h-6 font-semibold underline decoration-dotted underline-offset-4 pointer-coarse:min-h-9"
        >
          How this was computed
        </button>
      </p>
      {basis.kind === 'computed' && !basis.pending && <Apart {...basis.computed} />}
    </div>
  );
}
