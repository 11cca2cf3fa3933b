import type { BendingPlane } from '@/generators/contract';
import type { Curve } from '@/generators/report';
import type { Solved } from '@/lib/fea/solve/solution';
import { degrees } from '@/lib/units';
import type { Standing } from './standing';

type Points = Curve['points'];

export interface LoadCurve {
  readonly curve: Curve;
  /** the corrected formula's, straight from rest; null where it has none for the whole movement */
  readonly formula: Points | null;
}

const AXES = {
  displacement: { x: { label: 'Deflection', unit: 'mm' }, y: { label: 'Force', unit: 'N' } },
  rotation: { x: { label: 'Turn', unit: 'deg' }, y: { label: 'Moment', unit: 'Nmm' } },
} as const;

const TITLE = { displacement: 'Force over deflection', rotation: 'Moment over turn' } as const;

function pointsOf({ steps }: Solved, { model }: BendingPlane): Points {
  const shown = (deflection: number) =>
    Math.abs(model.drive.kind === 'rotation' ? degrees(deflection) : deflection);
  return [[0, 0], ...steps.map(({ deflection, force }) => [shown(deflection), Math.abs(force)] as const)];
}

function formulaLine({ formula }: Standing, plane: BendingPlane, end: number): Points | null {
  const [main] = plane.forceFigures;
  const force = formula.figures.find(({ id }) => id === main)?.value;
  return force
    ? [
        [0, 0],
        [end, force],
      ]
    : null;
}

/** Force over deflection, or moment over turn, through the load steps; null where nothing was solved or E is unknown. */
export function loadCurve(standing: Standing): LoadCurve | null {
  const { basis, plane, solution } = standing;
  if (basis.kind !== 'computed' || !plane || !solution || plane.modulus === null) return null;
  const { kind } = plane.model.drive;
  const points = pointsOf(solution, plane);
  return {
    curve: { id: 'computed-load', label: TITLE[kind], ...AXES[kind], points },
    formula: formulaLine(standing, plane, points.at(-1)![0]),
  };
}
