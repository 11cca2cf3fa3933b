import type { SolutionState } from '@/components/viewport/use-solution';
import { atModulus } from '@/generators/bend';
import { type Computed, withComputed } from '@/generators/computed';
import type { Bending, BendingPlane } from '@/generators/contract';
import type { Report } from '@/generators/report';
import type { Solved } from '@/lib/fea/solve/solution';

/** What the verdict stands on just now. */
export type Basis =
  | { readonly kind: 'solving' }
  | { readonly kind: 'computed'; readonly computed: Computed; readonly pending: boolean }
  | { readonly kind: 'formula'; readonly because: string };

/** The check as the page shows it: on the finite elements once they have answered for this part, else on the formulas. */
export interface Standing {
  readonly report: Report;
  /** the check by the corrected formulas alone */
  readonly formula: Report;
  readonly basis: Basis;
  readonly plane: BendingPlane | null;
  /** forces for the plastic in use, or for 1 MPa where its modulus is not known */
  readonly solution: Solved | null;
}

type Answer = Pick<SolutionState, 'solution' | 'pending' | 'reason'>;

/** Why the finite elements do not bear the verdict; null where they do. */
function whyNot({ solution, pending, reason }: Answer): string | null {
  if (!solution) return `Finite elements gave no answer: ${reason}.`;
  const lost = pending ? null : (solution.fellBack ?? reason);
  return lost && `Finite elements could not follow the large movement: ${lost}.`;
}

/** `answer` is that of this part, null while there is none. */
export function standingOf(formula: Report, bending: Bending, answer: Answer | null): Standing {
  if ('none' in bending) {
    const basis = { kind: 'formula', because: bending.none } as const;
    return { report: formula, formula, basis, plane: null, solution: null };
  }
  const plane = bending;
  if (!answer) return { report: formula, formula, basis: { kind: 'solving' }, plane, solution: null };
  const { pending } = answer;
  const solution = answer.solution && atModulus(answer.solution, plane.modulus ?? 1);
  const because = whyNot(answer);
  if (!solution || because !== null) {
    const basis = { kind: 'formula', because: because ?? '' } as const;
    return { report: formula, formula, basis, plane, solution };
  }
  const { computed, ...report } = withComputed(formula, plane, solution);
  return { report, formula, basis: { kind: 'computed', computed, pending }, plane, solution };
}

/** The corrected formula's value of a figure that stands on the finite elements; null where it does not. */
export function formulaBeside({ report, formula }: Standing, id: string): number | null {
  const [shown, own] = [report, formula].map(({ figures }) => figures.find((figure) => figure.id === id));
  return shown && own && shown !== own ? own.value : null;
}

/** The solution for large movement that the picture may take its shape from; null where it takes the family's. */
export function shapeOf({ basis, plane, solution }: Standing) {
  const final = basis.kind === 'computed' && !basis.pending && solution?.method === 'non-linear';
  return final && plane && plane.motion !== 'family' ? { plane, solution } : null;
}

/** True for a figure that the finite elements are being asked for. */
export function isComputedFor({ basis, plane }: Standing, id: string): boolean {
  if (basis.kind !== 'solving' || !plane) return false;
  return id === plane.strainFigure || plane.forceFigures.includes(id);
}
