'use client';

import Link from 'next/link';
import { type ReactNode, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Segmented } from '@/components/ui/segmented';
import type { Refinement } from '@/components/viewport/use-solution';
import { countedPeak } from '@/generators/computed';
import type { BendingPlane } from '@/generators/contract';
import { figureOf } from '@/generators/sensitivity';
import type { Solved } from '@/lib/fea/solve/solution';
import { formatQuantity, significant } from '@/lib/units';
import { HOW_ID } from './basis-line';
import { MeshPicture } from './mesh-picture';
import { useSolving } from './standing-context';

const whole = (value: number): string => formatQuantity(value, 'count', 6);
const percent = (share: number): string => `${significant(100 * share, 2)} %`;
const milliseconds = (time: number): string => `${significant(time, 2)} ms`;

function Row({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[7.5rem_1fr] sm:grid-cols-[10.5rem_1fr] gap-x-4 border-hair border-t py-1.5">
      <dt className="text-muted">{term}</dt>
      <dd>{children}</dd>
    </div>
  );
}

const PLANE_WORDS = {
  'plane-stress': 'free across its width (plane stress)',
  'plane-strain': 'held across its width (plane strain)',
  axisymmetric: 'turned about its axis',
} as const;

function Method({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
  const { steps } = solution;
  return (
    <>
      Six-node triangles on the outline, {PLANE_WORDS[plane.model.plane]}.{' '}
      {solution.method === 'linear'
        ? 'Small movement, one step.'
        : `Large movement and strain, ${steps.length} load steps.`}
    </>
  );
}

function Factors({ plane }: { plane: BendingPlane }) {
  return plane.model.factors.map(({ force, strain, because }) => (
    <p key={because}>
      Force × {significant(force, 3)}, strain × {significant(strain, 3)}: {because}.
    </p>
  ));
}

function peakText(solution: Solved, plane: BendingPlane): string {
  const { strain, place } = countedPeak(solution, plane);
  const [x, y] = place.map((at) => significant(at, 3));
  return `${formatQuantity(Math.abs(strain), 'strain')} in ${strain < 0 ? 'compression' : 'tension'}, at x ${x}, y ${y} mm of the outline`;
}

function Print({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
  const { took } = useSolving();
  return (
    <dl className="text-sm">
      <Row term="Method">
        <Method solution={solution} plane={plane} />
      </Row>
      <Row term="Elements">{whole(solution.elements)}</Row>
      <Row term="Degrees of freedom">{whole(solution.unknowns)}</Row>
      {took.large !== null && (
        <Row term="Solve time">
          {milliseconds(took.large)} in this browser
          {took.small !== null && `, ${milliseconds(took.small)} for the first answer`}
        </Row>
      )}
      <Row term="Peak strain">{peakText(solution, plane)}</Row>
      <Row term="Estimated error">
        {percent(solution.errorEstimate)} of the peak, from the mesh; an indication, not a bound
      </Row>
      {plane.model.factors.length > 0 && (
        <Row term="Not in the plane">
          <Factors plane={plane} />
        </Row>
      )}
      {plane.beside && <Row term="Beside it">{plane.beside.because}</Row>}
    </dl>
  );
}

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

function Refine({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
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

const SHAPES = [
  { value: 'bent', label: 'Bent' },
  { value: 'rest', label: 'At rest' },
] as const;

function Solution({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
  const { standing, refinement } = useSolving();
  const [shape, setShape] = useState<(typeof SHAPES)[number]['value']>('bent');
  const [finer, setFiner] = useState(false);
  const fine = refinement?.status === 'solved' ? refinement.solution : null;
  const limit = figureOf(standing.report, plane.strainFigure)?.limit ?? null;
  return (
    <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.1fr)]">
      <div className="grid gap-4">
        <Print solution={solution} plane={plane} />
        <Refine solution={solution} plane={plane} />
      </div>
      <div className="grid gap-3">
        <div className="flex flex-wrap gap-3">
          <Segmented legend="Shape" value={shape} options={SHAPES} onChange={setShape} />
          {fine && (
            <Button small aria-pressed={finer} onClick={() => setFiner(!finer)}>
              {finer ? 'Show the mesh in use' : 'Show the finer mesh'}
            </Button>
          )}
        </div>
        <MeshPicture
          solution={finer && fine ? fine : solution}
          plane={plane}
          allowable={limit}
          bent={shape === 'bent'}
        />
      </div>
    </div>
  );
}

function Body() {
  const { plane, solution, basis } = useSolving().standing;
  return (
    <div className="grid gap-4 border-hair border-t pt-4 pb-3">
      <p className="max-w-prose text-sm">
        {basis.kind === 'formula'
          ? basis.because
          : 'The outline of the part is cut into triangles, held and pushed as in use, and brought to balance step by step.'}{' '}
        <Link href="/guide/verification" className="font-semibold underline underline-offset-4">
          How far this can be trusted
        </Link>
      </p>
      {plane && solution && <Solution solution={solution} plane={plane} />}
      {basis.kind === 'solving' && <p className="text-muted text-sm">Being solved.</p>}
    </div>
  );
}

/** Print of the finite elements: mesh, size, time, estimated error. Drawn only while it is open. */
export function HowComputed() {
  const [open, setOpen] = useState(false);
  return (
    <details
      id={HOW_ID}
      onToggle={(event) => setOpen(event.currentTarget.open)}
      className="scroll-mt-16 rounded-sheet border border-hair bg-sheet px-5 py-3 shadow-lift sm:px-7"
    >
      <summary className="min-h-8 font-bold text-lg">How this was computed</summary>
      {open && <Body />}
    </details>
  );
}
