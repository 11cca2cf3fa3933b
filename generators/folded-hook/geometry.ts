import type { Kernel, Loop, NamedSolid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { arcPoints } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { catchLength, leadRun, meanBend, returnRun, type Values } from './schema';

const QUARTER = Math.PI / 2;
/** How far the arm reaches into its base so that they fuse, mm. */
const SUNK = 0.5;

/** Outward points of the catch along a leg pointing away from the bend: `face` the leg's outer face. */
function catchOn(p: Values, toward: 1 | -1, from: number, face: number): Vec2[] {
  const at = (along: number) => from + toward * along;
  const end = p.freeLeg;
  return [
    [face, at(end - catchLength(p))],
    [face + p.undercut, at(end - catchLength(p) + leadRun(p))],
    [face + p.undercut, at(end - returnRun(p))],
    [face, at(end)],
  ];
}

/** U in side view: root leg at x = 0 from y = 0 up, free leg down at +x. Counter-clockwise. */
function uOutline(p: Values, segments: number): Loop {
  const [h, r, f] = [p.thickness / 2, p.bendRadius, p.rootFillet];
  const apart = 2 * meanBend(p);
  const middle: Vec2 = [meanBend(p), p.rootLeg];
  const inner = arcPoints(middle, r, Math.PI, 0, segments);
  const outer = arcPoints(middle, r + p.thickness, 0, Math.PI, segments);
  const foot = arcPoints([h + f, f], f, 3 * QUARTER, 2 * QUARTER, segments);
  const heel = arcPoints([-h - f, f], f, 0, -QUARTER, segments);
  const tip = p.rootLeg - p.freeLeg;
  return [
    [h + f, -SUNK],
    ...foot,
    ...inner,
    [apart - h, tip],
    ...[...catchOn(p, -1, p.rootLeg, apart + h)].reverse(),
    ...outer,
    ...heel,
    [-h - f, -SUNK],
  ];
}

/** L in side view: root leg along +x from x = 0, free leg up. Counter-clockwise. */
function lOutline(p: Values, segments: number): Loop {
  const [h, r, f] = [p.thickness / 2, p.bendRadius, p.rootFillet];
  const middle: Vec2 = [p.rootLeg, meanBend(p)];
  const face = p.rootLeg + r + p.thickness;
  const outer = arcPoints(middle, r + p.thickness, -QUARTER, 0, segments);
  const inner = arcPoints(middle, r, 0, -QUARTER, segments);
  const under = arcPoints([f, -h - f], f, 2 * QUARTER, QUARTER, segments);
  const over = arcPoints([f, h + f], f, 3 * QUARTER, 2 * QUARTER, segments);
  const up = catchFromWall(p, face);
  const top = meanBend(p) + p.freeLeg;
  return [
    [-SUNK, -h - f],
    ...under,
    ...outer,
    ...up,
    [face - p.thickness, top],
    ...inner,
    ...over,
    [-SUNK, h + f],
  ];
}

/** Catch of an L: its holding edge looks back at the bend, its slope leads in from the free end. */
function catchFromWall(p: Values, face: number): Vec2[] {
  const top = meanBend(p) + p.freeLeg;
  const low = top - catchLength(p);
  return [
    [face, low],
    [face + p.undercut, low + returnRun(p)],
    [face + p.undercut, top - leadRun(p)],
    [face, top],
  ];
}

const outline = (p: Values, segments: number): Loop => {
  const loop = p.shape === 'u' ? uOutline(p, segments) : lOutline(p, segments);
  return loop.filter((point, i) => {
    const before = loop[(i + loop.length - 1) % loop.length]!;
    return Math.hypot(point[0] - before[0], point[1] - before[1]) > 1e-6;
  });
};

/** Outer face of the free leg and height of the holding edge, mm. */
function holdingEdge(p: Values): { face: number; height: number } {
  return p.shape === 'u'
    ? { face: 2 * meanBend(p) + p.thickness / 2, height: p.rootLeg - p.freeLeg }
    : { face: p.rootLeg + p.bendRadius + p.thickness, height: meanBend(p) + p.freeLeg - catchLength(p) };
}

/** Thickness of the strip the catch locks under: what fits above the base, at most 2 mm. */
const stripThickness = (p: Values): number => {
  const { height } = holdingEdge(p);
  return p.shape === 'u' ? Math.min(2, height - p.clearance - 0.2) : 2;
};

const STRIP_DEPTH = 6;

export const hasReceiver = (p: Values): boolean => p.receiver && stripThickness(p) >= 0.6;

function strip(p: Values, kernel: Kernel): NamedSolid {
  const { face, height } = holdingEdge(p);
  const thick = stripThickness(p);
  const size = [STRIP_DEPTH, p.armWidth + 4, thick] as const;
  const x = face + p.clearance + STRIP_DEPTH / 2;
  return { name: 'receiver', solid: kernel.box(size, [x, 0, height - p.clearance - thick / 2]) };
}

const baseBox = (p: Values): { size: [number, number, number]; at: [number, number, number] } =>
  p.shape === 'u'
    ? { size: [p.baseLength, p.baseWidth, p.baseThickness], at: [0, 0, -p.baseThickness / 2] }
    : { size: [p.baseThickness, p.baseWidth, p.baseLength], at: [-p.baseThickness / 2, 0, 0] };

/** Bodies "hook" and, where wanted, "receiver", the catch locked under its edge. x bends, y along the width, z pushes in. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const lying = kernel.extrude({ loops: [outline(p, kernel.quality.segmentsPerTurn)] }, p.armWidth);
  const arm = kernel.place(lying, compose(translation([0, p.armWidth / 2, 0]), rotation('x', QUARTER)));
  const { size, at } = baseBox(p);
  const hook = { name: 'hook', solid: kernel.union([arm, kernel.box(size, at)]) };
  return hasReceiver(p) ? [hook, strip(p, kernel)] : [hook];
}

/** Volume of the faceted bodies, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const sunk = SUNK * (p.thickness + 2 * p.rootFillet);
  const base = p.baseLength * p.baseWidth * p.baseThickness;
  const hook = (loopArea(outline(p, segmentsPerTurn)) - sunk) * p.armWidth + base;
  if (!hasReceiver(p)) return { hook };
  return { hook, receiver: STRIP_DEPTH * (p.armWidth + 4) * stripThickness(p) };
}
