import type { Kernel, Loop, NamedSolid, Vec2 } from '@/lib/geometry/kernel';
import { translation } from '@/lib/geometry/placement';
import { pegOutline, stripLayout } from './layout';
import type { PegStrap } from './schema';

/** The peg is sunk this deep into the strip so that the two fuse, mm. */
const SINK = 0.4;

const filletSegments = (segmentsPerTurn: number): number => Math.max(2, Math.round(segmentsPerTurn / 8));

/** Rounded rectangle, counter-clockwise; each corner a quarter of the polygon that stands for a circle. */
export function stripOutline(values: PegStrap, segmentsPerTurn: number): Loop {
  const { from, to } = stripLayout(values);
  const half = values.strapWidth / 2;
  const radius = Math.min(values.cornerRadius, half);
  const steps = radius > 0 ? segmentsPerTurn / 4 : 0;
  const corners: readonly (readonly [number, number, number])[] = [
    [to - radius, radius - half, -90],
    [to - radius, half - radius, 0],
    [from + radius, half - radius, 90],
    [from + radius, radius - half, 180],
  ];
  const points = corners.flatMap(([x, y, start]) =>
    Array.from({ length: steps + 1 }, (_, at): Vec2 => {
      const angle = ((start + (steps === 0 ? 0 : (90 * at) / steps)) * Math.PI) / 180;
      return [x + radius * Math.cos(angle), y + radius * Math.sin(angle)];
    }),
  );
  return points.filter((point, at) => distance(point, points.at(at - 1)!) > 1e-6);
}

const distance = (a: Vec2, b: Vec2): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

/** Radius of the polygon drawn round an eye, so that its flats, not its corners, lie on the eye's circle. */
const eyeRadius = (values: PegStrap, segmentsPerTurn: number): number =>
  values.eyeDiameter / 2 / Math.cos(Math.PI / segmentsPerTurn);

function eyeLoop(values: PegStrap, at: number, segmentsPerTurn: number): Loop {
  const radius = eyeRadius(values, segmentsPerTurn);
  return Array.from({ length: segmentsPerTurn }, (_, step): Vec2 => {
    const angle = (-2 * Math.PI * step) / segmentsPerTurn;
    return [at + radius * Math.cos(angle), radius * Math.sin(angle)];
  });
}

/** One body, lying flat as printed: strip from z = 0 to its thickness, peg at the origin pointing up. */
export function build(values: PegStrap, kernel: Kernel): readonly NamedSolid[] {
  const { segmentsPerTurn } = kernel.quality;
  const { eyes } = stripLayout(values);
  const loops = [
    stripOutline(values, segmentsPerTurn),
    ...eyes.map((at) => eyeLoop(values, at, segmentsPerTurn)),
  ];
  const strip = kernel.extrude({ loops }, values.strapThickness);
  const sink = Math.min(SINK, values.strapThickness / 2);
  const outline = pegOutline(values, -sink, filletSegments(segmentsPerTurn));
  const peg = kernel.place(
    kernel.revolve({ loops: [outline] }, segmentsPerTurn),
    translation([0, 0, values.strapThickness]),
  );
  return [{ name: 'strap', solid: kernel.union([strip, peg]) }];
}

const polygonArea = (segments: number): number => (segments / 2) * Math.sin((2 * Math.PI) / segments);

/** Volume swept by an outline (radius, height) about the axis, as a polygon of revolution. */
function revolvedVolume(outline: readonly Vec2[], segments: number): number {
  let sum = 0;
  for (let at = 1; at < outline.length; at += 1) {
    const [[r1, z1], [r2, z2]] = [outline[at - 1]!, outline[at]!];
    sum += ((z2 - z1) / 3) * (r1 * r1 + r1 * r2 + r2 * r2);
  }
  return polygonArea(segments) * sum;
}

/** Closed-form volume in mm3 of the strap as faceted. */
export function volumes(values: PegStrap, segmentsPerTurn: number): { strap: number } {
  const { from, to, eyes } = stripLayout(values);
  const { strapWidth, strapThickness } = values;
  const radius = Math.min(values.cornerRadius, strapWidth / 2);
  const corners = radius ** 2 * (4 - polygonArea(segmentsPerTurn));
  const eye = eyeRadius(values, segmentsPerTurn) ** 2 * polygonArea(segmentsPerTurn);
  const strip = ((to - from) * strapWidth - corners - eyes.length * eye) * strapThickness;
  const peg = revolvedVolume(pegOutline(values, 0, filletSegments(segmentsPerTurn)), segmentsPerTurn);
  return { strap: strip + peg };
}
