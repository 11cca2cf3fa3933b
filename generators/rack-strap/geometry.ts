import type { Kernel, Loop, NamedSolid, Profile, Vec2 } from '@/lib/geometry/kernel';
import { loopArea, profileArea } from '@/lib/geometry/loops';
import { type Corner, roundedPolygon } from '@/lib/geometry/outline';
import { translation } from '@/lib/geometry/placement';
import { asPrinted, crestOf, layoutOf, pawlFlat, rampRun, valleyOf } from './layout';
import type { Values } from './schema';

/** The band reaches this far into the anvil so that they fuse, and cutters past what they cut, mm. */
const FUSED = 1;
const PAST = 1;
const TAB_WIDTH = 2.2;
const ENTRY_CHAMFER = 0.6;
const TIP_SLOPE = 3;

const pieces = (segmentsPerTurn: number): number => Math.max(2, Math.round(segmentsPerTurn / 16));

/** One tooth whose valley begins at `x`, towards +x: flat, ramp, crest, steep face. */
function tooth(p: Values, x: number): Corner[] {
  const [t, top] = [p.bandThickness, p.bandThickness + p.toothDepth];
  const foot = x + valleyOf(p);
  const crest = foot + rampRun(p);
  return [
    { at: [foot, t], radius: p.rootRadius },
    { at: [crest, top] },
    { at: [crest + crestOf(p), top] },
    { at: [crest + crestOf(p), t], radius: p.rootRadius },
  ];
}

/** The loop with its long edges cut into pieces no longer than `longest`. */
function inShortEdges(loop: Loop, longest: number): Vec2[] {
  return loop.flatMap(([x, y], at): Vec2[] => {
    const [nextX, nextY] = loop[(at + 1) % loop.length]!;
    const count = Math.max(1, Math.ceil(Math.hypot(nextX - x, nextY - y) / longest));
    return Array.from(
      { length: count },
      (_, i): Vec2 => [x + ((nextX - x) * i) / count, y + ((nextY - y) * i) / count],
    );
  });
}

/** The band from above as it is printed, from its free end to where it enters the anvil; counter-clockwise. */
export function bandLoop(p: Values, segments: number): Loop {
  const { ring } = layoutOf(p);
  const straight = straightBand(p, segments);
  if (!Number.isFinite(ring)) return straight;
  const facet = (2 * Math.PI * ring) / (2 * segments);
  return inShortEdges(straight, facet).map((point) => asPrinted(p, point));
}

function straightBand(p: Values, segments: number): Loop {
  const { band, toothedFrom, teeth } = layoutOf(p);
  const t = p.bandThickness;
  const first = -toothedFrom - teeth * p.pitch;
  const teethFromEnd = Array.from({ length: teeth }, (_, i) => tooth(p, first + i * p.pitch));
  const top = [...teethFromEnd.flat()].reverse();
  return roundedPolygon(
    [
      { at: [-band, 0] },
      { at: [FUSED, 0] },
      { at: [FUSED, t] },
      ...top,
      { at: [-band + TIP_SLOPE, t] },
      { at: [-band, t / 2] },
    ],
    pieces(segments),
  );
}

/** Underside of the pawl from its end face at `tip` to its root: one tooth a pitch, steep faces towards -x, rounded as the band's roots. */
function pawlTeeth(p: Values): Corner[] {
  const { tip, roof } = layoutOf(p);
  const low = roof - p.toothDepth;
  return Array.from({ length: p.pawlTeeth }, (_, i): Corner[] => {
    const x = tip + i * p.pitch;
    const flat = x + pawlFlat(p);
    const face: Corner[] = i === 0 ? [] : [{ at: [x, roof] }];
    return [
      ...face,
      { at: [x, low], radius: p.rootRadius },
      { at: [flat, low] },
      { at: [flat + rampRun(p), roof] },
    ];
  }).flat();
}

/** Top of the pawl from its root to its end, with the tab where there is one. */
function pawlTop(p: Values): Corner[] {
  const { tip, root, pawlTop: top } = layoutOf(p);
  const tab: Corner[] =
    p.release === 'tab'
      ? [
          { at: [tip + TAB_WIDTH, top] },
          { at: [tip + TAB_WIDTH, top + p.tabHeight], radius: TAB_WIDTH / 3 },
          { at: [tip, top + p.tabHeight], radius: TAB_WIDTH / 3 },
        ]
      : [{ at: [tip, top] }];
  return [{ at: [root, top], radius: p.pawlFillet }, ...tab];
}

/** The head seen from the side: open over the pawl with a tab, else under a guard. */
export function headProfile(p: Values, segments: number): Profile {
  const { head, exit, root, roof, skinTop, exitTop, entryTop, guardFrom, guardTop } = layoutOf(p);
  const notch: Corner[] = [{ at: [root, roof] }, { at: [root, skinTop] }, { at: [exit, skinTop] }];
  if (p.release === 'tab') {
    const outline: Corner[] = [
      { at: [0, 0] },
      { at: [head, 0], radius: 1 },
      { at: [head, entryTop], radius: 1 },
      { at: [root, entryTop] },
      ...pawlTop(p),
      ...pawlTeeth(p),
      ...notch,
      { at: [exit, exitTop] },
      { at: [0, exitTop], radius: 0.5 },
    ];
    return { loops: [roundedPolygon(outline, pieces(segments))] };
  }
  const outer: Corner[] = [
    { at: [0, 0] },
    { at: [head, 0], radius: 1 },
    { at: [head, guardTop], radius: 1 },
    { at: [0, guardTop], radius: 1 },
  ];
  const hole: Corner[] = [
    { at: [root, guardFrom] },
    ...pawlTop(p),
    ...pawlTeeth(p),
    ...notch,
    { at: [exit, guardFrom] },
  ];
  return { loops: [roundedPolygon(outer, pieces(segments)), roundedPolygon(hole, pieces(segments))] };
}

/** The passage from the side, under the pawl only as high as the skins. */
function passageLoop(p: Values): Loop {
  const { head, exit, root, floor, roof, skinTop } = layoutOf(p);
  const under = skinTop + p.clearance / 2;
  return [
    [-PAST, floor],
    [head + PAST, floor],
    [head + PAST, roof + ENTRY_CHAMFER],
    [head, roof + ENTRY_CHAMFER],
    [head - ENTRY_CHAMFER, roof],
    [root, roof],
    [root, under],
    [exit + 0.3, under],
    [exit + 0.3, roof],
    [-PAST, roof],
  ] satisfies Vec2[];
}

/** One body, on edge as printed: the band from the bed up, the head over its whole height. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const { segmentsPerTurn } = kernel.quality;
  const { passageFrom, passageTo, headTop } = layoutOf(p);
  const block = kernel.extrude(headProfile(p, segmentsPerTurn), headTop);
  const passage = kernel.extrude({ loops: [passageLoop(p)] }, passageTo - passageFrom);
  const head = kernel.subtract(block, [kernel.place(passage, translation([0, 0, passageFrom]))]);
  const band = kernel.extrude({ loops: [bandLoop(p, segmentsPerTurn)] }, p.bandWidth);
  return [{ name: 'strap', solid: kernel.union([head, band]) }];
}

/** Area in mm2 that the passage takes out of the head. */
function hollowArea(p: Values): number {
  const { head, exit, root, floor, roof, skinTop } = layoutOf(p);
  const open = (exit + head - root) * (roof - floor);
  return open + (root - exit) * (skinTop - floor) + ENTRY_CHAMFER ** 2 / 2;
}

/** Volume in mm3 of the faceted strap: plane areas times heights, the fused end of the band counted once. */
export function volumes(p: Values, segments: number): Record<string, number> {
  const { passageFrom, passageTo, headTop } = layoutOf(p);
  const head = profileArea(headProfile(p, segments)) * headTop - hollowArea(p) * (passageTo - passageFrom);
  const band = loopArea(bandLoop(p, segments)) - FUSED * p.bandThickness;
  return { strap: head + band * p.bandWidth };
}
