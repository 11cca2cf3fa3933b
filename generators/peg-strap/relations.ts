import { WIDEST_EYE } from '@/lib/mechanics/strap-eye';
import { WIDEST_HALF_TURN } from '@/lib/mechanics/strap-half-turn';
import type { Relation } from '../parameters';
import { firstEyeAt, HEAD_RIM, headOf, returnLength, SMALLEST_TIP, stripLayout } from './layout';
import type { PegStrap } from './schema';

const mm = (value: number): string => `${Number(value.toFixed(2))} mm`;
/** Bounds are met within a thousandth of a millimetre, so that sums of decimals do not refuse a value typed exactly. */
const atLeast = (value: number, bound: number): boolean => value >= bound - 1e-3;

/** Web in mm that must stay beside and between eyes: two lines of a 0.4 mm nozzle. */
const WEB = 0.8;
/** Strip in mm that must stay beside the head. */
const EDGE = 0.5;
/** Part of a turn the tail may lap before it meets the peg again. */
const LAP = 0.8;
/** Common desktop bed, mm. */
const BED = 220;

const smallestEye = ({ pegDiameter, pegFillet }: PegStrap) => pegDiameter + 2 * pegFillet;
const smallestPitch = ({ eyeDiameter }: PegStrap) => eyeDiameter + WEB;
const smallestWidth = ({ eyeDiameter, headDiameter }: PegStrap) =>
  Math.max(eyeDiameter / WIDEST_EYE, eyeDiameter + 2 * WEB, headDiameter + 2 * EDGE);
const leadTo = (values: PegStrap, radius: number) =>
  (values.headDiameter / 2 - radius) / Math.tan((values.headLeadAngle * Math.PI) / 180);
/** The tip must enter the eye: 0.2 mm narrower. */
const shortestHead = (values: PegStrap) =>
  returnLength(values) + HEAD_RIM + leadTo(values, values.eyeDiameter / 2 - 0.1);
const longestHead = (values: PegStrap) => returnLength(values) + HEAD_RIM + leadTo(values, SMALLEST_TIP / 2);
const tail = (values: PegStrap) => stripLayout(values).to - firstEyeAt(values);

export const relations: readonly Relation<PegStrap>[] = [
  {
    id: 'eye-clears-peg',
    field: 'eyeDiameter',
    severity: 'refuse',
    holds: (v) => atLeast(v.eyeDiameter, smallestEye(v)),
    message: (v) =>
      `Eye diameter must be at least ${mm(smallestEye(v))}: Peg diameter plus twice the Peg fillet, so that the eye seats on the strip`,
  },
  {
    id: 'fillet-in-neck',
    field: 'pegFillet',
    severity: 'refuse',
    holds: (v) => atLeast(v.strapThickness, v.pegFillet),
    message: (v) =>
      `Peg fillet must be at most ${mm(v.strapThickness)}: the Strap thickness, so that a neck is left for the eye`,
  },
  {
    id: 'head-over-eye',
    field: 'headDiameter',
    severity: 'refuse',
    holds: (v) => atLeast(v.headDiameter, v.eyeDiameter + 0.1),
    message: (v) =>
      `Head diameter must be at least ${mm(v.eyeDiameter + 0.1)}: 0.1 mm more than Eye diameter, or nothing holds`,
  },
  {
    id: 'pitch-over-eye',
    field: 'eyePitch',
    severity: 'refuse',
    holds: (v) => v.eyeCount === 1 || atLeast(v.eyePitch, smallestPitch(v)),
    message: (v) =>
      `Eye pitch must be at least ${mm(smallestPitch(v))}: Eye diameter plus a web of ${mm(WEB)}`,
  },
  {
    id: 'width-over-eye',
    field: 'strapWidth',
    severity: 'refuse',
    holds: (v) => atLeast(v.strapWidth, smallestWidth(v)),
    message: (v) =>
      `Strap width must be at least ${mm(smallestWidth(v))}: Eye diameter over ${WIDEST_EYE}, a web of ${mm(WEB)} each side of the eye, and ${mm(EDGE)} each side of the head`,
  },
  {
    id: 'corner-in-width',
    field: 'cornerRadius',
    severity: 'refuse',
    holds: (v) => atLeast(v.strapWidth / 2, v.cornerRadius),
    message: (v) => `Corner radius must be at most ${mm(v.strapWidth / 2)}: half the Strap width`,
  },
  {
    id: 'head-enters-eye',
    field: 'headLength',
    severity: 'refuse',
    holds: (v) => atLeast(v.headLength, shortestHead(v)),
    message: (v) =>
      `Head length must be at least ${mm(shortestHead(v))}: back face, rim and a lead-in cone whose tip enters the eye`,
  },
  {
    id: 'head-keeps-tip',
    field: 'headLength',
    severity: 'refuse',
    holds: (v) => headOf(v).tipRadius >= SMALLEST_TIP / 2 - 1e-3,
    message: (v) =>
      `Head length must be at most ${mm(longestHead(v))}: there the lead-in cone ends in a tip of ${mm(SMALLEST_TIP)}`,
  },
  {
    id: 'loop-clears-peg',
    field: 'bundleDiameter',
    severity: 'refuse',
    holds: (v) => firstEyeAt(v) >= v.headDiameter / 2 + v.eyeDiameter + v.strapWidth / 2,
    message: (v) =>
      `Bundle diameter is too small: the first eye lies ${mm(firstEyeAt(v))} from the peg and must lie at least ${mm(v.headDiameter / 2 + v.eyeDiameter + v.strapWidth / 2)} from it`,
  },
  {
    id: 'tail-clears-peg',
    field: 'eyeCount',
    severity: 'refuse',
    holds: (v) => tail(v) <= LAP * firstEyeAt(v),
    message: (v) =>
      `The tail past the first eye is ${mm(tail(v))} long and must be at most ${mm(LAP * firstEyeAt(v))}, or it meets the peg again: fewer Eyes or less Eye pitch`,
  },
  {
    id: 'narrow-half-turn',
    field: 'strapWidth',
    severity: 'warn',
    holds: (v) => !v.halfTurn || v.strapWidth <= WIDEST_HALF_TURN * firstEyeAt(v),
    message: (v) =>
      `Strap width over ${mm(WIDEST_HALF_TURN * firstEyeAt(v))} does not turn over, it folds: the strain of the half turn is not known`,
  },
  {
    id: 'peg-prints',
    field: 'pegDiameter',
    severity: 'warn',
    holds: (v) => v.pegDiameter >= 3,
    message: () => 'Peg diameter under 3 mm prints weak: a pin of 3 mm is the usual smallest',
  },
  {
    id: 'return-prints',
    field: 'headReturnAngle',
    severity: 'warn',
    holds: (v) => v.headReturnAngle <= 45,
    message: () => 'Head return angle over 45 degrees overhangs: the back face of the head needs support',
  },
  {
    id: 'thin-for-bundle',
    field: 'strapThickness',
    severity: 'warn',
    holds: (v) => v.strapThickness <= v.bundleDiameter / 6,
    message: (v) =>
      `Strap thickness over ${mm(v.bundleDiameter / 6)} is stiff for this bundle: a sixth of Bundle diameter`,
  },
  {
    id: 'fits-bed',
    field: 'eyeCount',
    severity: 'warn',
    holds: (v) => stripLayout(v).to - stripLayout(v).from <= BED,
    message: (v) =>
      `The strap is ${mm(stripLayout(v).to - stripLayout(v).from)} long; many beds hold ${mm(BED)}. Lay it across the corner or print it in two`,
  },
];
