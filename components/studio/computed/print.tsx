'use client';

import type { ReactNode } from 'react';
import { countedPeak } from '@/generators/computed';
import type { BendingPlane } from '@/generators/contract';
import type { Solved } from '@/lib/fea/solve/solution';
import { formatQuantity, significant } from '@/lib/units';
import { useSolving } from './standing-context';
import { milliseconds, percent, whole } from './words';

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

/** What was solved: method, size, time, peak, estimated error. */
export function Print({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
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
