import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { rotation, translation } from '@/lib/geometry/placement';
import { ridgeMesh, ridgeVolume } from '@/lib/geometry/thread';
import { aroundCircle, revolvedVolume, threadedBody, threadedVolume } from '@/lib/geometry/thread-bodies';
import { gapMark, withMarks } from '../coupon';
import { holeRidge, plateFrom, studOf } from './layout';
import { clearancesOf, columnAt, edgesOf, mouthChamfer, plateLength, type Values } from './schema';

/** How far a hole is cut past the faces of the plate, mm. */
const PAST = 1;

/** Section of what is hollow in a hole, counter-clockwise, the underside of the plate at z = 0. */
function holeSection(p: Values, wall: number, past: number, segments: number): Loop {
  const [radius, c, top] = [aroundCircle(wall, segments), mouthChamfer(p), p.plateThickness];
  const below: Vec2[] =
    past > 0
      ? [
          [0, -past],
          [radius + c, -past],
        ]
      : [[0, 0]];
  const above: Vec2[] =
    past > 0
      ? [
          [radius + c, top + past],
          [0, top + past],
        ]
      : [[0, top]];
  return [...below, [radius + c, 0], [radius, c], [radius, top - c], [radius + c, top], ...above];
}

const plateLoop = (p: Values): Loop => {
  const { front, back } = edgesOf(p);
  return [
    [0, front],
    [plateLength(p), front],
    [plateLength(p), back],
    [0, back],
  ];
};

/** Turned by half a facet against the rings of its ridge, as every threaded wall is. */
function hole(p: Values, wall: number, kernel: Kernel): Solid {
  const { segmentsPerTurn } = kernel.quality;
  const section = holeSection(p, wall, PAST, segmentsPerTurn);
  return kernel.place(kernel.revolve({ loops: [section] }), rotation('z', Math.PI / segmentsPerTurn));
}

function plate(p: Values, kernel: Kernel): Solid {
  const { segmentsPerTurn } = kernel.quality;
  const ridges = clearancesOf(p).map((clearance) => holeRidge(p, clearance));
  const holes = ridges.map(({ outline }, at) =>
    kernel.place(hole(p, outline[0]![0], kernel), translation([columnAt(p, at), 0, 0])),
  );
  const threads = ridges.map((ridge, at) =>
    kernel.place(
      kernel.fromMesh(ridgeMesh(ridge, segmentsPerTurn)),
      translation([columnAt(p, at), 0, -plateFrom(p)]),
    ),
  );
  const block = kernel.extrude({ loops: [plateLoop(p)] }, p.plateThickness);
  const threaded = kernel.union([kernel.subtract(block, holes), ...threads]);
  const marks = clearancesOf(p).map((clearance, at) => ({
    text: gapMark(clearance),
    at: [columnAt(p, at), edgesOf(p).figures] as const,
  }));
  return withMarks(kernel, threaded, p.plateThickness, marks, p);
}

/** Counter-clockwise from the axis; the core of the stud on its shoulder at z = 0. */
function coreSection(p: Values): Loop {
  const { core, height, chamfer } = studOf(p);
  return [
    [0, 0],
    [core, 0],
    [core, height - chamfer],
    [core - chamfer, height],
    [0, height],
  ];
}

/** Six corners of the head, 2 mm wider than the thread on its flats. */
function headLoop(p: Values): Loop {
  const corner = (p.majorDiameter / 2 + 2) / Math.cos(Math.PI / 6);
  return Array.from({ length: 6 }, (_, at): Vec2 => {
    const angle = (Math.PI / 3) * at;
    return [corner * Math.cos(angle), corner * Math.sin(angle)];
  });
}

function stud(p: Values, kernel: Kernel): Solid {
  const head = kernel.place(
    kernel.extrude({ loops: [headLoop(p)] }, p.gripHeight),
    translation([0, 0, -p.gripHeight]),
  );
  return kernel.place(
    threadedBody(kernel, coreSection(p), studOf(p).ridge, [head]),
    translation([columnAt(p, p.holes - 1), 0, -plateFrom(p)]),
  );
}

/** Bodies "plate", its underside on z = 0, and "stud", screwed into the widest hole from below. */
export const build = (p: Values, kernel: Kernel): NamedSolid[] => [
  { name: 'plate', solid: plate(p, kernel) },
  { name: 'stud', solid: stud(p, kernel) },
];

/** Volumes of the faceted bodies, mm3, ridges within a thousandth; none in closed form with figures on the plate. */
export function volumes(p: Values, segments: number): Readonly<Record<string, number>> | null {
  if (p.marks !== 'none') return null;
  const cut = clearancesOf(p).reduce((sum, clearance) => {
    const ridge = holeRidge(p, clearance);
    const section = holeSection(p, ridge.outline[0]![0], 0, segments);
    return sum + revolvedVolume(section, segments) - ridgeVolume(ridge, segments);
  }, 0);
  return {
    plate: loopArea(plateLoop(p)) * p.plateThickness - cut,
    stud: threadedVolume(coreSection(p), studOf(p).ridge, segments) + loopArea(headLoop(p)) * p.gripHeight,
  };
}
