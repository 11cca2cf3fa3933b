import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { inscribedArea, roundedPolygon } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { radians } from '@/lib/units';
import type { Values } from './schema';

/** How far bars reach into rocker and frame so that the bodies fuse, mm. */
const SUNK = 0.5;

/** Slope lengths of the nose along the rocker, mm. */
const leadRun = (p: Values): number => p.undercut / Math.tan(radians(p.leadInAngle));
const returnRun = (p: Values): number => p.undercut / Math.tan(radians(p.returnAngle));

/** Front end of the rocker: return face, land and lead-in beyond the holding edge, mm. */
export const frontEnd = (p: Values): number => p.catchArm + returnRun(p) + p.landLength + leadRun(p);

/** Side view of the rocker: x towards the nose, y up from the bed. */
function rockerSide(p: Values): Loop {
  const top = p.panelThickness;
  const raised = top + p.undercut;
  const land = p.catchArm + returnRun(p);
  return [
    [-p.tailArm, 0],
    [frontEnd(p), 0],
    [frontEnd(p), top],
    [land + p.landLength, raised],
    [land, raised],
    [p.catchArm, top],
    [-p.tailArm, top],
  ];
}

/** Frame open towards the nose, in plan. */
function framePlan(p: Values): Loop {
  const inner = p.rockerWidth / 2 + p.barLength;
  const outer = inner + p.railWidth;
  const back = -p.tailArm - p.gap;
  const front = Math.max(p.barWidth, p.barDiameter) / 2 + p.barFillet + 3;
  return [
    [back - p.railWidth, -outer],
    [front, -outer],
    [front, -inner],
    [back, -inner],
    [back, inner],
    [front, inner],
    [front, outer],
    [back - p.railWidth, outer],
  ];
}

/** One rectangular bar in plan with fillets at both ends, from inside the rocker to inside the frame. */
function barPlan(p: Values, segmentsPerFillet: number): Loop {
  const [w, r] = [p.barWidth / 2, p.barFillet];
  const [from, to] = [p.rockerWidth / 2, p.rockerWidth / 2 + p.barLength];
  const half: { at: Vec2; radius?: number }[] = [
    { at: [w + r, from - SUNK] },
    { at: [w + r, from] },
    { at: [w, from], radius: r },
    { at: [w, to], radius: r },
    { at: [w + r, to] },
    { at: [w + r, to + SUNK] },
  ];
  const other = half.map(({ at, radius }) => ({ at: [-at[0], at[1]] as Vec2, radius })).reverse();
  return roundedPolygon([...half, ...other], segmentsPerFillet);
}

function bars(p: Values, kernel: Kernel): Solid[] {
  const mirror = rotation('z', Math.PI);
  const bar = p.barShape === 'round' ? roundBar(p, kernel) : rectangularBar(p, kernel);
  return [bar, kernel.place(bar, mirror)];
}

const rectangularBar = (p: Values, kernel: Kernel): Solid =>
  kernel.extrude({ loops: [barPlan(p, kernel.quality.segmentsPerFillet)] }, p.barThickness);

function roundBar(p: Values, kernel: Kernel): Solid {
  const radius = p.barDiameter / 2;
  const bar = kernel.cylinder(radius, p.barLength + 2 * SUNK, { segments: kernel.quality.segmentsPerTurn });
  const start = p.rockerWidth / 2 - SUNK;
  return kernel.place(bar, compose(translation([0, start, radius]), rotation('x', -Math.PI / 2)));
}

/** One body "latch", flat as printed: bars along y, nose towards +x and up. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const lying = kernel.extrude({ loops: [rockerSide(p)] }, p.rockerWidth);
  const rocker = kernel.place(
    lying,
    compose(translation([0, p.rockerWidth / 2, 0]), rotation('x', Math.PI / 2)),
  );
  const frame = kernel.extrude({ loops: [framePlan(p)] }, p.panelThickness);
  return [{ name: 'latch', solid: kernel.union([rocker, frame, ...bars(p, kernel)]) }];
}

/** Volume of the faceted body, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const sunk = 2 * SUNK * (p.barWidth + 2 * p.barFillet);
  const bar =
    p.barShape === 'round'
      ? inscribedArea(p.barDiameter / 2, segmentsPerTurn) * p.barLength
      : (loopArea(barPlan(p, segmentsPerTurn === 96 ? 16 : 8)) - sunk) * p.barThickness;
  const rocker = loopArea(rockerSide(p)) * p.rockerWidth;
  return { latch: rocker + loopArea(framePlan(p)) * p.panelThickness + 2 * bar };
}
