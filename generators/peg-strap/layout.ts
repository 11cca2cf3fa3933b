import type { Vec2 } from '@/lib/geometry/kernel';
import { loopLength } from '@/lib/mechanics/strap';
import { halfTurnLength } from '@/lib/mechanics/strap-half-turn';
import { radians } from '@/lib/units';
import type { PegStrap } from './schema';

/** Play of the eye on the neck, mm: the neck is longer than the strip is thick by this much. */
export const NECK_PLAY = 0.2;
/** Straight rim between lead-in cone and back face, mm: two layers, so that the largest diameter prints true. */
export const HEAD_RIM = 0.4;
/** Smallest flat at the tip of the head, mm across. */
export const SMALLEST_TIP = 1;

/** Heights in mm above the strip's face, and radii. */
export interface Head {
  readonly neck: number;
  readonly rimFrom: number;
  readonly rimTo: number;
  readonly top: number;
  readonly tipRadius: number;
}

const slope = (angle: number): number => (angle >= 90 ? Number.POSITIVE_INFINITY : Math.tan(radians(angle)));

/** Length of the back face along the axis, mm. */
export const returnLength = ({ headDiameter, pegDiameter, headReturnAngle }: PegStrap): number =>
  (headDiameter - pegDiameter) / 2 / slope(headReturnAngle);

export function headOf(values: PegStrap): Head {
  const neck = values.strapThickness + NECK_PLAY;
  const rimFrom = neck + returnLength(values);
  const rimTo = rimFrom + HEAD_RIM;
  const top = neck + values.headLength;
  const tipRadius = values.headDiameter / 2 - (top - rimTo) * slope(values.headLeadAngle);
  return { neck, rimFrom, rimTo, top, tipRadius };
}

/** Length from peg to first eye along the middle of the strip, mm. */
export const firstEyeAt = ({ bundleDiameter, strapWidth, strapThickness, halfTurn }: PegStrap): number =>
  halfTurn
    ? halfTurnLength(bundleDiameter, strapWidth, strapThickness)
    : loopLength(bundleDiameter, strapThickness);

export interface StripLayout {
  /** x of both ends, the peg at 0, mm */
  readonly from: number;
  readonly to: number;
  readonly eyes: readonly number[];
}

/**
 * Half a width of strip behind the peg; a whole width past the last eye, half of it so that the eye is stretched like
 * the others, half of it to hold.
 */
export function stripLayout(values: PegStrap): StripLayout {
  const first = firstEyeAt(values);
  const eyes = Array.from({ length: values.eyeCount }, (_, at) => first + at * values.eyePitch);
  return { from: -values.strapWidth / 2, to: eyes.at(-1)! + values.strapWidth, eyes };
}

/** Outline of the peg above `bottom` (z), radius and height, from the axis up and back to the axis. z = 0 is the strip's face. */
export function pegOutline(values: PegStrap, bottom: number, fillet: number): Vec2[] {
  const { pegDiameter, pegFillet, headDiameter } = values;
  const { neck, rimFrom, rimTo, top, tipRadius } = headOf(values);
  const foot = Array.from({ length: fillet + 1 }, (_, at): Vec2 => {
    const angle = (Math.PI / 2) * (at / fillet);
    return [pegDiameter / 2 + pegFillet * (1 - Math.sin(angle)), pegFillet * (1 - Math.cos(angle))];
  });
  const points: Vec2[] = [
    [0, bottom],
    [pegDiameter / 2 + pegFillet, bottom],
    ...foot,
    [pegDiameter / 2, neck],
    [headDiameter / 2, rimFrom],
    [headDiameter / 2, rimTo],
    [tipRadius, top],
    [0, top],
  ];
  return points.filter(([x, y], at) => at === 0 || x !== points[at - 1]![0] || y !== points[at - 1]![1]);
}

/** Radius of the head in mm at a height above the strip's face; the neck's below it, nothing above it. */
export function headRadius(values: PegStrap, height: number): number {
  const { neck, rimFrom, rimTo, top, tipRadius } = headOf(values);
  const [root, rim] = [values.pegDiameter / 2, values.headDiameter / 2];
  if (height < neck) return root;
  if (height < rimFrom) return root + ((rim - root) * (height - neck)) / (rimFrom - neck);
  if (height <= rimTo) return rim;
  if (height <= top) return rim + ((tipRadius - rim) * (height - rimTo)) / (top - rimTo);
  return 0;
}
