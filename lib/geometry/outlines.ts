import geom2 from '@jscad/modeling/src/geometries/geom2/index.js';
import hull from '@jscad/modeling/src/operations/hulls/hull.js';
import circle from '@jscad/modeling/src/primitives/circle.js';
import polygon from '@jscad/modeling/src/primitives/polygon.js';
import rectangle from '@jscad/modeling/src/primitives/rectangle.js';
import roundedRectangle from '@jscad/modeling/src/primitives/roundedRectangle.js';
import vectorText from '@jscad/modeling/src/text/vectorText.js';
import { KernelError, type Loop, type Outlines, type Profile, type Quality, type Vec2 } from './kernel';
import { counterClockwise, loopArea, profileFault } from './loops';
import type { ManifoldModule } from './manifold';

type Geom2 = ReturnType<typeof circle>;

/** Below this half-width difference (mm) a rounded end is taken as a full half circle. */
const FULL_ROUND = 1e-4;
/** The single-line font counts its size without the ascent of its capitals: 14 of 21 units. */
const SIZE_OF_CAPITALS = 14 / 21;
/** The characters of that font. */
const PRINTABLE = /^[ -~]+$/;

function require(operation: string, holds: boolean, because: string): void {
  if (!holds) throw new KernelError(operation, because);
}

const positive = (value: number) => Number.isFinite(value) && value > 0;

/** Largest outline first, so that the first loop is an outline and never a hole. */
function profileOf(operation: string, loops: readonly Loop[]): Profile {
  require(operation, loops.length > 0, 'nothing is left');
  return { loops: [...loops].sort((a, b) => loopArea(b) - loopArea(a)) };
}

const fromGeom = (operation: string, geometry: Geom2): Profile =>
  profileOf(operation, geom2.toOutlines(geometry) as unknown as Loop[]);

const mutable = (loop: Loop): [number, number][] => loop.map(([x, y]) => [x, y]);

function roundedBox(
  size: [number, number],
  cornerRadius: number,
  center: [number, number],
  segments: number,
) {
  const spare = Math.min(...size) / 2 - cornerRadius;
  require('rectangle', spare >= -FULL_ROUND, 'the corner radius is larger than half a side');
  if (spare > FULL_ROUND) return roundedRectangle({ size, center, roundRadius: cornerRadius, segments });
  const radius = Math.min(...size) / 2;
  const reach = Math.max(...size) / 2 - radius;
  const [dx, dy] = size[0] >= size[1] ? [reach, 0] : [0, reach];
  const ends = [-1, 1].map((side) =>
    circle({ radius, segments, center: [center[0] + side * dx, center[1] + side * dy] }),
  );
  return hull(ends[0]!, ends[1]!);
}

/** One stroke of a letter: the hull of a disc at either end. */
function stroke(a: Vec2, b: Vec2, width: number, segments: number): Loop {
  const ends = [a, b].map(([x, y]) => circle({ radius: width / 2, segments, center: [x, y] }));
  return fromGeom('text', hull(ends[0]!, ends[1]!)).loops[0]!;
}

/** Strokes of all letters; the ink, not its middle line, starts at x = 0 and stands on y = 0. */
function letterStrokes(text: string, height: number, width: number, segments: number): Loop[] {
  const size = (height - width) * SIZE_OF_CAPITALS + width;
  const lines = vectorText({ height: size, extrudeOffset: width }, text) as Vec2[][];
  const left = Math.min(...lines.flat().map(([x]) => x)) - width / 2;
  return lines.flatMap((line) =>
    line.slice(1).map((end, at) => {
      const start = line[at]!;
      return stroke([start[0] - left, start[1]], [end[0] - left, end[1]], width, segments);
    }),
  );
}

/**
 * Plane work: shapes, hulls and letters by JSCAD; unions, cuts and offsets by the kernel's polygon clipper, because
 * JSCAD's offsets cross themselves, and its booleans round corners to a grid that grows with the part and take
 * seconds where there are many holes (tests/bench/geometry.bench.ts prints both).
 */
export function createOutlines(module: ManifoldModule, quality: Quality): Outlines {
  const { segmentsPerTurn, segmentsPerFillet } = quality;
  const loopsOf = (profiles: readonly Profile[]) => profiles.flatMap((profile) => profile.loops);
  return {
    rectangle(width, height, { cornerRadius = 0, center = [0, 0] } = {}) {
      require('rectangle', positive(width) && positive(height), 'width and height must be positive');
      require('rectangle', cornerRadius >= 0, 'the corner radius must not be negative');
      const size: [number, number] = [width, height];
      const at: [number, number] = [center[0], center[1]];
      const shape =
        cornerRadius > FULL_ROUND
          ? roundedBox(size, cornerRadius, at, segmentsPerFillet * 4)
          : rectangle({ size, center: at });
      return fromGeom('rectangle', shape);
    },
    circle(radius, { center = [0, 0], segments = segmentsPerTurn } = {}) {
      require('circle', positive(radius), 'the radius must be positive');
      return fromGeom('circle', circle({ radius, center: [center[0], center[1]], segments }));
    },
    polygon(points) {
      const loop = counterClockwise(points);
      const fault = profileFault({ loops: [loop] });
      require('polygon', fault === null, fault ?? '');
      return fromGeom('polygon', polygon({ points: mutable(loop) }));
    },
    union: (profiles) => profileOf('union', module.region(loopsOf(profiles))),
    subtract: (from, cutters) =>
      profileOf('subtract', module.region(from.loops, { cutters: loopsOf(cutters) })),
    offset: (profile, growth) =>
      profileOf('offset', module.region(profile.loops, { growth, segments: segmentsPerTurn })),
    hull(profiles) {
      const shapes = loopsOf(profiles).map((loop) => geom2.fromPoints(mutable(loop)));
      require('hull', shapes.length > 0, 'nothing to wrap');
      return fromGeom('hull', hull(...shapes));
    },
    text(text, { height, stroke: width }) {
      require('text', PRINTABLE.test(text) &&
        text.trim() !== '', 'only plain printable characters can be drawn');
      require('text', positive(width) && height > width, 'the letters must be higher than their stroke');
      const segments = quality.name === 'export' ? 12 : 8;
      return profileOf('text', module.region(letterStrokes(text, height, width, segments)));
    },
  };
}
