import type { Kernel, Loop, NamedSolid, Profile, Solid, Vec2 } from '@/lib/geometry/kernel';
import { arcPoints, boreRadius, inscribedArea } from '@/lib/geometry/outline';
import { translation } from '@/lib/geometry/placement';
import { gapMark, withMarks } from '../coupon';
import { columnAt, gapsOf, plateLength, rowsOf, tongueThickness, type Values } from './schema';

/** Free length at the floor, so that the grip and not the tip comes to rest, mm. */
const SHORT = 0.5;
/** The tip of pin and tongue narrows by this over as much length, mm. */
const LEAD = 0.6;
/** What the grip stands out on each side, mm. */
const RIM = 2;

const box = ([x, y]: Vec2, width: number, height: number): Loop => [
  [x - width / 2, y - height / 2],
  [x + width / 2, y - height / 2],
  [x + width / 2, y + height / 2],
  [x - width / 2, y + height / 2],
];

/** Seen from above: the plate with its holes. Round holes are drawn round their circle, never smaller than named. */
function plateProfile(p: Values, segments: number): Profile {
  const { round, flat, front, back } = rowsOf(p);
  const length = plateLength(p);
  const plate = box([length / 2, (front + back) / 2], length, back - front);
  const holes = gapsOf(p).flatMap((gap, at): Loop[] => {
    const x = columnAt(p, at);
    const radius = boreRadius(p.pinDiameter / 2 + gap, segments);
    const slot = box([x, flat], p.pinDiameter + 2 * gap, tongueThickness(p) + 2 * gap);
    return [arcPoints([x, round], radius, 2 * Math.PI, 0, segments).slice(1), [...slot].reverse()];
  });
  return { loops: [plate, ...holes] };
}

function plate(p: Values, kernel: Kernel): Solid {
  const solid = kernel.extrude(plateProfile(p, kernel.quality.segmentsPerTurn), p.depth);
  const marks = gapsOf(p).map((gap, at) => ({ text: gapMark(gap), at: [columnAt(p, at), 0] as const }));
  return withMarks(kernel, solid, p.depth, marks, p);
}

/** The pin stands in the widest hole, its grip resting on the plate. */
function pin(p: Values, kernel: Kernel): Solid {
  const [radius, tip] = [p.pinDiameter / 2, SHORT];
  const section: Loop = [
    [0, tip],
    [radius - LEAD, tip],
    [radius, tip + LEAD],
    [radius, p.depth],
    [radius + RIM, p.depth],
    [radius + RIM, p.depth + p.gripHeight],
    [0, p.depth + p.gripHeight],
  ];
  return kernel.place(
    kernel.revolve({ loops: [section] }),
    translation([columnAt(p, p.holes - 1), rowsOf(p).round, 0]),
  );
}

/** Section of tongue and grip across its thickness, counter-clockwise in (y, z). */
function tongueSection(p: Values): Loop {
  const [half, top] = [tongueThickness(p) / 2, p.depth + p.gripHeight];
  return [
    [-half + LEAD, SHORT],
    [half - LEAD, SHORT],
    [half, SHORT + LEAD],
    [half, p.depth],
    [half + RIM, p.depth],
    [half + RIM, top],
    [-half - RIM, top],
    [-half - RIM, p.depth],
    [-half, p.depth],
    [-half, SHORT + LEAD],
  ];
}

function tongue(p: Values, kernel: Kernel): Solid {
  const lying = kernel.extrude({ loops: [tongueSection(p)] }, p.pinDiameter);
  // section (y, z) extruded along x
  const upright = [0, 1, 0, 0, 0, 0, 1, 0, 1, 0, 0, 0, 0, 0, 0, 1];
  return kernel.place(
    kernel.place(lying, upright),
    translation([columnAt(p, p.holes - 1) - p.pinDiameter / 2, rowsOf(p).flat, 0]),
  );
}

/** Bodies "plate" on z = 0, "pin" and "tongue" in its widest holes. */
export const build = (p: Values, kernel: Kernel): NamedSolid[] => [
  { name: 'plate', solid: plate(p, kernel) },
  { name: 'pin', solid: pin(p, kernel) },
  { name: 'tongue', solid: tongue(p, kernel) },
];

/** Frustum of a polygon with as many corners as the quality has segments. */
const frustum = (low: number, high: number, height: number, segments: number): number =>
  (height / 3) * (low * low + low * high + high * high) * inscribedArea(1, segments);

/** Volumes of the faceted bodies, mm3; none in closed form with figures on the plate. */
export function volumes(p: Values, segments: number): Readonly<Record<string, number>> | null {
  if (p.marks !== 'none') return null;
  const { front, back } = rowsOf(p);
  const holes = gapsOf(p).reduce(
    (sum, gap) =>
      sum +
      inscribedArea(boreRadius(p.pinDiameter / 2 + gap, segments), segments) +
      (p.pinDiameter + 2 * gap) * (tongueThickness(p) + 2 * gap),
    0,
  );
  const [radius, thick] = [p.pinDiameter / 2, tongueThickness(p)];
  const shank = p.depth - SHORT - LEAD;
  const area = (of: number) => inscribedArea(of, segments);
  return {
    plate: (plateLength(p) * (back - front) - holes) * p.depth,
    pin:
      frustum(radius - LEAD, radius, LEAD, segments) +
      area(radius) * shank +
      area(radius + RIM) * p.gripHeight,
    tongue: p.pinDiameter * ((thick - LEAD) * LEAD + thick * shank + (thick + 2 * RIM) * p.gripHeight),
  };
}
