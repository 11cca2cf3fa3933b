import { paintPicture, type Stroke } from '@/components/viewport/drawing/painter';
import { frameOf, type Pixel, parallel } from '@/components/viewport/drawing/views';
import { arrange } from '@/components/viewport/mesh/arrange';
import type { PreparedBody } from '@/components/viewport/mesh/prepare';
import { refine, type SplitRule } from '@/components/viewport/mesh/refine';
import { shadingOf } from '@/components/viewport/mesh/shading';
import type { Motion } from '@/generators/contract';
import type { BuiltBody } from '@/lib/geometry/kernel';
import { MOST_PULL, SAMPLE_VALUES, SCALE_END } from './sample';

export const BEND_SIZE = { width: 560, height: 640 } as const;
const SCALE = 12.9;
const FRAME = frameOf({ turn: 24, rise: 16 });
const PROJECT = parallel(FRAME, [-1.5, 0, 19.6], SCALE, BEND_SIZE);

/** The crest of the catch, which the visitor takes hold of. */
const CREST = [SAMPLE_VALUES.undercut, 0, SAMPLE_VALUES.armLength + SAMPLE_VALUES.landLength / 2] as const;

export interface BendPicture {
  readonly strokes: readonly Stroke[];
  readonly crest: { readonly x: number; readonly y: number };
}

const round = ({ x, y }: Pixel) => ({ x: Math.round(10 * x) / 10, y: Math.round(10 * y) / 10 });

function crestAt(motion: Motion, body: string, t: number): Pixel {
  const out = { positions: new Float32Array(3), strain: new Float32Array(1) };
  motion.pose(body, Float32Array.from(CREST), t, out);
  const [x, y, z] = out.positions;
  return PROJECT([x!, y!, z!]);
}

/** Steps of colour from no strain to the end of the scale. */
const STEPS = 22;

/** Splits edges along which the colour changes by more than a step: each triangle is painted in one colour. */
function colourSteps(motion: Motion, body: string): SplitRule {
  return ({ positions, edges: { count, ends } }) => {
    const out = {
      positions: new Float32Array(positions.length),
      strain: new Float32Array(positions.length / 3),
    };
    motion.pose(body, positions, 1, out);
    return Float32Array.from({ length: count }, (_, edge) => {
      const change = out.strain[ends[2 * edge]!]! - out.strain[ends[2 * edge + 1]!]!;
      return ((STEPS * change) / SCALE_END) ** 2;
    });
  };
}

/** The hook, cut so finely that its strain can be painted triangle by triangle. */
export function bendBody({ name, mesh }: BuiltBody, motion: Motion): PreparedBody {
  const refined = refine(mesh, colourSteps(motion, name), { maxTriangles: 2600, maxRounds: 8 });
  return { name, mesh: refined.mesh, shading: shadingOf(refined, mesh) };
}

/** The hook with its catch pulled back by so many mm, painted by strain. */
export function bendPicture(body: PreparedBody, motion: Motion, pull: number): BendPicture {
  const t = pull / MOST_PULL;
  const moved = arrange([body], motion, t);
  const painted = moved.map((one) => ({ moved: one, colour: [1, 1, 1] as const, seeThrough: false }));
  return {
    strokes: paintPicture(painted, FRAME, PROJECT, SCALE_END),
    crest: round(crestAt(motion, body.name, t)),
  };
}

/** How far the crest travels on the picture from rest to the most pull. */
export function crestTravel(motion: Motion, body: string): { readonly x: number; readonly y: number } {
  const [from, to] = [crestAt(motion, body, 0), crestAt(motion, body, 1)];
  return { x: to.x - from.x, y: to.y - from.y };
}
