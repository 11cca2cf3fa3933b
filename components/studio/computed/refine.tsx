'use client';

import { Button } from '@/components/ui/button';
import type { Refinement } from '@/components/viewport/use-solution';
import { countedPeak } from '@/generators/computed';
import type { BendingPlane } from '@/generators/contract';
import type { Solved } from '@/lib/fea/solve/solution';
import { formatQuantity } from '@/lib/units';
import { useSolving } from './standing-context';
import { milliseconds, percent, whole } from './words';

function refinedText(
  { solution, took }: { solution: Solved; took: number },
  base: Solved,
  plane: BendingPlane,
) {
  const [fine, coarse] = [solution, base].map((one) => Math.abs(countedPeak(one, plane).strain)) as [
    number,
    number,
  ];
  const apart = `${percent(Math.abs(fine / coarse - 1))} from the figure in use`;
  return `Edges half as long: ${formatQuantity(fine, 'strain', 4)}, ${apart}. ${whole(solution.elements)} elements, ${whole(solution.unknowns)} degrees of freedom, ${milliseconds(took)}.`;
}

function RefinementTold({
  refinement,
  solution,
  plane,
}: {
  refinement: Refinement | null;
  solution: Solved;
  plane: BendingPlane;
}) {
  if (!refinement) return null;
  if (refinement.status === 'solving') return 'Being solved.';
  if (refinement.status === 'failed') return `No answer: ${refinement.reason}.`;
  return refinedText(refinement, solution, plane);
}

/** One solve on edges half as long, on request; the figure in use stays. */
export function Refine({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
  const { refine, refinement } = useSolving();
  return (
    <div className="grid justify-items-start gap-2 text-sm">
      <Button small onClick={refine} disabled={refinement?.status === 'solving'}>
        Solve on a finer mesh
      </Button>
      <p role="status" className="min-h-6">
        <RefinementTold refinement={refinement} solution={solution} plane={plane} />
      </p>
    </div>
  );
}
