import type { Bounds, BuiltBody, Kernel, NamedSolid, Placement } from '@/lib/geometry/kernel';
import { boundsOf } from '@/lib/geometry/mesh-check';
import { compose, IDENTITY, movePositions, translation } from '@/lib/geometry/placement';
import type { Stance } from './contract';

/** Free distance in mm between bodies laid on the bed together. */
export const BED_GAP = 5;

interface Oriented {
  readonly orient: Placement;
  /** bounds once oriented */
  readonly bounds: Bounds;
}

const orientOf = (stance: Stance, name: string): Placement =>
  stance.together ?? stance.orient[name] ?? IDENTITY;

/** Puts oriented bodies side by side along x with a gap, the row centred on the origin, each on z = 0. */
function row(bodies: readonly Oriented[]): Placement[] {
  const widths = bodies.map(({ bounds }) => bounds[3] - bounds[0]);
  const total = widths.reduce((sum, width) => sum + width, 0) + BED_GAP * (bodies.length - 1);
  let left = -total / 2;
  return bodies.map(({ orient, bounds }, at) => {
    const move = translation([left - bounds[0], -(bounds[1] + bounds[4]) / 2, -bounds[2]]);
    left += widths[at]! + BED_GAP;
    return compose(move, orient);
  });
}

const least = (bodies: readonly Oriented[], at: number) =>
  Math.min(...bodies.map(({ bounds }) => bounds[at]!));
const most = (bodies: readonly Oriented[], at: number) =>
  Math.max(...bodies.map(({ bounds }) => bounds[at]!));

/** Moves oriented bodies as one: centred on the origin, the lowest of them on z = 0. */
function asOne(bodies: readonly Oriented[]): Placement[] {
  const middle = (at: number) => (least(bodies, at) + most(bodies, at + 3)) / 2;
  const move = translation([-middle(0), -middle(1), -least(bodies, 2)]);
  return bodies.map(({ orient }) => compose(move, orient));
}

const laid = (bodies: readonly Oriented[], { together }: Stance): Placement[] =>
  together ? asOne(bodies) : row(bodies);

/** Where each body lies on the bed in a stance, bodies in the order given. */
export function bedPlacements(
  bodies: readonly BuiltBody[],
  stance: Stance,
): Readonly<Record<string, Placement>> {
  const oriented = bodies.map(({ name, mesh }) => {
    const orient = orientOf(stance, name);
    return { orient, bounds: boundsOf(movePositions(orient, mesh.positions)) };
  });
  const placements = laid(oriented, stance);
  return Object.fromEntries(bodies.map((body, at) => [body.name, placements[at]!]));
}

/** Where one body lies when it is printed alone: centred on the origin, lowest point on z = 0. */
export const bedPlacement = (body: BuiltBody, stance: Stance): Placement =>
  bedPlacements([body], stance)[body.name]!;

/** The same arrangement within a build, so that the finished meshes are checked as they will be exported. */
export function laySolidsOnBed(kernel: Kernel, solids: readonly NamedSolid[], stance: Stance): NamedSolid[] {
  const oriented = solids.map(({ name, solid }) => {
    const orient = orientOf(stance, name);
    return { orient, bounds: kernel.bounds(kernel.place(solid, orient)) };
  });
  const placements = laid(oriented, stance);
  return solids.map(({ name, solid }, at) => ({ name, solid: kernel.place(solid, placements[at]!) }));
}
