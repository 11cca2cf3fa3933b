import type { Vec3 } from '@/lib/geometry/kernel';
import type { Material } from '@/lib/materials/types';
import { bentHoleFactor, spiralOf, spiralRadius } from '@/lib/mechanics/strap';
import { halfTurnCurvature, halfTurnTwist, twistStrain } from '@/lib/mechanics/strap-half-turn';
import { followStrip, stripFrame } from '@/lib/mechanics/strip-curve';
import type { Motion, Posed } from '../contract';
import { firstEyeAt, headOf, headRadius, stripLayout } from './layout';
import type { PegStrap } from './schema';

/** Share of the motion in which the strip rolls up; in the rest the eye comes down over the head. */
const ROLLED = 0.75;
/** Extra height above the head while rolling up, mm, and steps along the strip. */
const CLEARANCE = 0.3;
const STEPS = 320;
/** Reach of the stretched eye, in eye radii. */
const REACH = 3;

const smooth = (share: number): number => {
  const x = Math.min(1, Math.max(0, share));
  return x * x * (3 - 2 * x);
};

/** The strip at one moment: how it bends and twists along its length (1/mm, rad/mm), and the eye's growth. */
interface Moment {
  readonly curvature: (s: number) => number;
  readonly twist: (s: number) => number;
  /** growth of the eye's radius over the head, mm */
  readonly growth: number;
  /** move of the whole strap, mm: the loop ends in the middle of where the strip lay, standing on the bed */
  readonly shift: Vec3;
}

/** Height of the eye's face over the peg's face: above the head while rolling, then down to the strip's thickness. */
function pitchAt(values: PegStrap, t: number): number {
  const above = headOf(values).top + CLEARANCE;
  return values.strapThickness + above * (1 - smooth((t - ROLLED) / (1 - ROLLED)));
}

/** The eye's radius grows to the widest part of the head inside its depth. */
function growthAt(values: PegStrap, t: number): number {
  if (t < ROLLED) return 0;
  const bottom = pitchAt(values, t) - values.strapThickness;
  const top = bottom + values.strapThickness;
  const { rimFrom, rimTo } = headOf(values);
  const heights = [bottom, top, rimFrom, rimTo].filter((z) => z >= bottom && z <= top);
  const widest = Math.max(...heights.map((z) => headRadius(values, z)));
  return Math.max(0, widest - values.eyeDiameter / 2);
}

/** How far the loop hangs below the strip's lower face at the peg, mm. */
function loopHeight({ bundleDiameter, strapWidth, strapThickness, halfTurn }: PegStrap): number {
  return halfTurn ? bundleDiameter + strapWidth : bundleDiameter + 3 * strapThickness;
}

function momentOf(values: PegStrap, t: number): Moment {
  const loop = firstEyeAt(values);
  const rolled = smooth(t / ROLLED);
  const pitch = pitchAt(values, t);
  const { from, to } = stripLayout(values);
  const shift: Vec3 = [(rolled * (from + to)) / 2, 0, rolled * loopHeight(values)];
  const still = { growth: growthAt(values, t), shift };
  if (values.halfTurn) {
    return {
      curvature: (s) => rolled * halfTurnCurvature(s / loop, loop, pitch),
      twist: (s) => rolled * halfTurnTwist(s / loop, loop, pitch),
      ...still,
    };
  }
  const spiral = spiralOf(loop, pitch);
  return {
    curvature: (s) => -rolled / spiralRadius(spiral, Math.max(0, s)),
    twist: () => 0,
    ...still,
  };
}

/** Share of movement in the strip's plane, and hoop strain, round the stretched eye: both fall off as in a wide plate. */
function stretch(x: number, y: number, radius: number, growth: number): number {
  const away = Math.max(Math.hypot(x, y), radius);
  if (growth === 0 || away > REACH * radius) return 0;
  const fade = 1 - smooth((away / radius - 1) / (REACH - 1));
  return ((growth * radius) / away ** 2) * fade;
}

const larger = (a: number, b: number): number => (Math.abs(a) > Math.abs(b) ? a : b);

/**
 * Bending strain beside an eye over that of the plain strip: the factor of a bent hole at the eye's sides, none before
 * and behind it, fading with the third power of the distance. The fading is drawn, not computed.
 */
function crowdingOf(values: PegStrap) {
  const { eyeDiameter, eyePitch, eyeCount, strapWidth, strapThickness } = values;
  const first = firstEyeAt(values);
  const factor = bentHoleFactor(eyeDiameter, strapWidth, strapThickness);
  return (s: number, y: number): number => {
    const index = Math.min(eyeCount - 1, Math.max(0, Math.round((s - first) / eyePitch)));
    const x = s - first - index * eyePitch;
    const away = Math.max(Math.hypot(x, y), eyeDiameter / 2, Number.EPSILON);
    const side = Math.min(1, (y / away) ** 2);
    return 1 + (eyeDiameter / 2 / away) ** 3 * ((factor - 1) * side - (1 - side));
  };
}

/** Stretch along the strip at a point: bending by its height, twist by its distance from the axis. */
function fibreStrain(
  values: PegStrap,
  moment: Moment,
  crowding: (s: number, y: number) => number,
  [s, y, height]: readonly [number, number, number],
): number {
  const twist = moment.twist(s);
  const { middle } = twistStrain(twist, values.strapWidth, values.strapThickness);
  return -moment.curvature(s) * height * crowding(s, y) + middle + (twist * y) ** 2 / 2;
}

/** Largest strain painted on the strip, fully rolled up: lifted off the head and closed. */
function paintedPeak(values: PegStrap): number {
  const { from, to, eyes } = stripLayout(values);
  const [half, edge, beside] = [values.strapThickness / 2, values.strapWidth / 2, values.eyeDiameter / 2];
  const along = Array.from({ length: STEPS + 1 }, (_, at) => from + ((to - from) * at) / STEPS);
  const places = [...along.flatMap((s) => [0, edge].map((y) => [s, y])), ...eyes.map((s) => [s, beside])];
  const crowding = crowdingOf(values);
  const strains = [momentOf(values, ROLLED), momentOf(values, 1)].flatMap((moment) =>
    places.flatMap(([s, y]) =>
      [half, -half].map((height) => Math.abs(fibreStrain(values, moment, crowding, [s!, y!, height]))),
    ),
  );
  return strains.reduce((a, b) => Math.max(a, b), values.headDiameter / values.eyeDiameter - 1);
}

/**
 * Closing on the smallest bundle by the first eye. The peg keeps upright; the strip rolls up beneath it, its mid-line
 * keeping its length, and comes round above the head, turned over on the way where it has a half turn; then the eye
 * comes down over the head, stretched while the head is in it. Above the strip's face the peg is rigid; its foot
 * passes over into the bent strip.
 */
export function motion(values: PegStrap, _material: Material): Motion {
  const { strapThickness, eyeDiameter } = values;
  const { from, to } = stripLayout(values);
  const eyeAt = firstEyeAt(values);
  const frame = new Float64Array(12);
  const crowding = crowdingOf(values);

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const moment = momentOf(values, t);
    const curve = followStrip(from, to, (to - from) / STEPS, moment.curvature, moment.twist);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const held = smooth((z - strapThickness) / strapThickness);
      const eye = stretch(x - eyeAt, y, eyeDiameter / 2, moment.growth);
      const [s, across, height] = [x + eye * (x - eyeAt), y + eye * y, z - strapThickness / 2];
      stripFrame(curve, s, frame);
      for (let axis = 0; axis < 3; axis += 1) {
        const base = axis === 2 ? strapThickness / 2 : 0;
        const bent = base + frame[axis]! + across * frame[6 + axis]! + height * frame[9 + axis]!;
        out.positions[i + axis] = moment.shift[axis]! + bent + held * (rest[i + axis]! - bent);
      }
      const inStrip = Math.min(height, strapThickness / 2);
      const strain = larger(fibreStrain(values, moment, crowding, [x, y, inStrip]), eye);
      out.strain[i / 3] = (1 - held) * strain;
    }
  }

  return { label: 'Close', from: 'flat', to: 'closed', peakStrain: paintedPeak(values), pose };
}
