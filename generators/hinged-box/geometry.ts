import type { Kernel, Loop, NamedSolid, Placement, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { type Corner, roundedPolygon } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import {
  armFace,
  backInner,
  backOuter,
  backRim,
  boxRim,
  frontOuter,
  halfWidth,
  keeperEdge,
  keeperFoot,
  keeperTop,
  LAND,
  lidRim,
  lipThickness,
  NOTCH_HEIGHT,
  noseEnd,
  notchMiddle,
  rebateDepth,
  slopeRun,
  tabEnd,
  tabWidth,
  webBottom,
  webTop,
} from './layout';
import type { Values } from './schema';

/** How far joined pieces reach into one another, mm. */
const SUNK = 0.5;

/** Corners at the front of the outline moved in by an inset, from -y to +y. */
function frontCorners(p: Values, inset: number): Corner[] {
  const [u, y] = [frontOuter(p) - inset, halfWidth(p) - inset];
  const radius = Math.max(0, p.cornerRadius - inset);
  return [
    { at: [u, -y], radius },
    { at: [u, y], radius },
  ];
}

/** Plan of a whole half, from the back wall to the front. */
function platePlan(p: Values, segments: number): Loop {
  const [back, y] = [backOuter(p), halfWidth(p)];
  return roundedPolygon([{ at: [back, -y] }, ...frontCorners(p, 0), { at: [back, y] }], segments);
}

/** Plan of sides and front between two insets, open towards the fold at u = from. */
function rimPlan(p: Values, [outer, inner]: readonly [number, number], from: number, segments: number): Loop {
  const y = halfWidth(p);
  const back = (inset: number, side: number): Corner => ({ at: [from, side * (y - inset)] });
  const turned = frontCorners(p, inner).reverse();
  return roundedPolygon(
    [back(outer, -1), ...frontCorners(p, outer), back(outer, 1), back(inner, 1), ...turned, back(inner, -1)],
    segments,
  );
}

/** Side view of the arm with its catch, u and z, sunk into the plate; the inner face looks at the box. */
function armSide(p: Values, segments: number): Loop {
  const [inner, root] = [armFace(p), p.floor];
  const outer = inner + p.armThickness;
  const tip = root + p.armLength;
  const fillet = p.armFillet;
  return roundedPolygon(
    [
      { at: [inner - fillet, root - SUNK] },
      { at: [outer + fillet, root - SUNK] },
      { at: [outer + fillet, root] },
      { at: [outer, root], radius: fillet },
      { at: [outer, root + noseEnd(p)] },
      { at: [inner, root + noseEnd(p)] },
      { at: [inner - p.undercut, tip + LAND] },
      { at: [inner - p.undercut, tip] },
      { at: [inner, tip - slopeRun(p, p.undercut)] },
      { at: [inner, root], radius: fillet },
      { at: [inner - fillet, root] },
    ],
    segments,
  );
}

/** Side view of the keeper on the front of the box, u and z, sunk into the wall. */
function keeperSide(p: Values): Loop {
  const [wall, out] = [frontOuter(p), frontOuter(p) + p.undercut];
  const foot: Vec2[] = p.returnAngle >= 90 ? [] : [[wall, keeperFoot(p)]];
  return [
    [wall - SUNK, keeperFoot(p)],
    ...foot,
    [out, keeperEdge(p)],
    [out, keeperEdge(p) + LAND],
    [wall, keeperTop(p)],
    [wall - SUNK, keeperTop(p)],
  ];
}

/** Section of the web between the back walls, x and z, with a piece of wall at either end. */
function webSection(p: Values, segments: number): Loop {
  const [half, low, high] = [p.webLength / 2, webBottom(p), webTop(p)];
  const under = low - p.webFillet - SUNK;
  const over = high + Math.min(p.webFillet, p.webRecess);
  const right: Corner[] = [
    { at: [half, low], radius: p.webFillet },
    { at: [half, under] },
    { at: [half + SUNK, under] },
    { at: [half + SUNK, over] },
    { at: [half, over] },
    { at: [half, high], radius: over - high },
  ];
  const distinct = over > high ? right : right.filter((_, at) => at !== 4);
  const left = distinct.map(({ at: [x, z], radius }): Corner => ({ at: [-x, z], radius })).reverse();
  return roundedPolygon([...distinct, ...left], segments);
}

/** A side view (first coordinate stays x, second becomes z) given a width along y, middle on y = 0. */
function across(kernel: Kernel, loop: Loop, width: number): Solid {
  const upright: Placement = compose(translation([0, width / 2, 0]), rotation('x', Math.PI / 2));
  return kernel.place(kernel.extrude({ loops: [loop] }, width), upright);
}

const block = (
  kernel: Kernel,
  from: readonly [number, number, number],
  to: readonly [number, number, number],
): Solid =>
  kernel.box(
    [to[0] - from[0], to[1] - from[1], to[2] - from[2]],
    [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2, (from[2] + to[2]) / 2],
  );

const backWall = (p: Values, kernel: Kernel): Solid =>
  block(kernel, [backOuter(p), -halfWidth(p), 0], [backInner(p), halfWidth(p), backRim(p)]);

/** Where the sides of the box begin that stand higher than its back wall, and the lip. */
const highFrom = (p: Values): number => backInner(p) + p.clearance;
const lipFrom = (p: Values): number => backInner(p) + 2 * p.clearance;

/** Box half on +x with everything it carries but the web. */
export function boxSolid(p: Values, kernel: Kernel): Solid {
  const n = kernel.quality.segmentsPerFillet;
  const wall = [0, p.wall] as const;
  const lip = [p.wall - lipThickness(p), p.wall] as const;
  const rise = (plan: Loop, from: number, to: number) =>
    kernel.place(kernel.extrude({ loops: [plan] }, to - from), translation([0, 0, from]));
  const parts = [
    kernel.extrude({ loops: [platePlan(p, n)] }, p.floor),
    backWall(p, kernel),
    rise(rimPlan(p, wall, backInner(p) - SUNK, n), 0, backRim(p)),
    rise(rimPlan(p, wall, highFrom(p), n), 0, boxRim(p)),
    across(kernel, keeperSide(p), p.armWidth),
    ...(p.lipHeight > 0
      ? [rise(rimPlan(p, lip, lipFrom(p), n), boxRim(p) - SUNK, boxRim(p) + p.lipHeight)]
      : []),
  ];
  const box = kernel.union(parts);
  if (p.notchWidth === 0) return box;
  const [front, y, rim] = [frontOuter(p), notchMiddle(p), boxRim(p)];
  const half = p.notchWidth / 2;
  const notch = block(
    kernel,
    [front - p.wall / 2, y - half, rim - NOTCH_HEIGHT],
    [front + 1, y + half, rim + 1],
  );
  return kernel.subtract(box, [notch]);
}

/** Lid half on +x, without its catch. */
export function lidShell(p: Values, kernel: Kernel): Solid {
  const n = kernel.quality.segmentsPerFillet;
  const from = backInner(p) - SUNK;
  const rise = (inner: number, height: number) =>
    kernel.extrude({ loops: [rimPlan(p, [0, inner], from, n)] }, height);
  const walls =
    p.lipHeight > 0
      ? [rise(lipThickness(p), lidRim(p)), rise(p.wall, lidRim(p) - rebateDepth(p))]
      : [rise(p.wall, lidRim(p))];
  return kernel.union([kernel.extrude({ loops: [platePlan(p, n)] }, p.floor), backWall(p, kernel), ...walls]);
}

/** The catch on +x: its tab in the plane of the lid plate, and the arm. */
export function catchSolid(p: Values, kernel: Kernel): Solid {
  const half = tabWidth(p) / 2;
  const tab = block(kernel, [frontOuter(p) - SUNK, -half, 0], [tabEnd(p), half, p.floor]);
  return kernel.union([tab, across(kernel, armSide(p, kernel.quality.segmentsPerFillet), p.armWidth)]);
}

/** One body "box", open as printed: box on -x, lid on +x, fold along y. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const box = kernel.place(boxSolid(p, kernel), rotation('z', Math.PI));
  const web = across(kernel, webSection(p, kernel.quality.segmentsPerFillet), 2 * halfWidth(p));
  return [{ name: 'box', solid: kernel.union([box, lidShell(p, kernel), catchSolid(p, kernel), web]) }];
}

/** Volume of the faceted body, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const n = segmentsPerTurn === 96 ? 16 : 8;
  const rim = (insets: readonly [number, number], from: number) => loopArea(rimPlan(p, insets, from, n));
  const [back, rise] = [backInner(p), backRim(p) - p.floor];
  const shared = 2 * (loopArea(platePlan(p, n)) * p.floor + p.wall * 2 * halfWidth(p) * rise);
  const lip = lipThickness(p);
  const box =
    rim([0, p.wall], back) * rise +
    rim([0, p.wall], highFrom(p)) * (boxRim(p) - backRim(p)) +
    (p.lipHeight > 0 ? rim([p.wall - lip, p.wall], lipFrom(p)) * p.lipHeight : 0) +
    (loopArea(keeperSide(p)) - SUNK * (keeperTop(p) - keeperFoot(p))) * p.armWidth -
    (p.notchWidth * NOTCH_HEIGHT * p.wall) / 2;
  const whole = rim([0, p.wall], back) * p.lidHeight;
  const rebate = rim([lip, p.wall], back) * rebateDepth(p);
  const lid = p.lipHeight > 0 ? whole - rebate : whole;
  const arm = loopArea(armSide(p, n)) - SUNK * (p.armThickness + 2 * p.armFillet);
  const latch = (tabEnd(p) - frontOuter(p)) * tabWidth(p) * p.floor + arm * p.armWidth;
  const section = webSection(p, n);
  const ends = 2 * SUNK * (Math.max(...section.map(([, z]) => z)) - Math.min(...section.map(([, z]) => z)));
  return { box: shared + box + lid + latch + (loopArea(section) - ends) * 2 * halfWidth(p) };
}
