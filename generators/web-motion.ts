import { reliefFillet, type Web } from '@/lib/mechanics/web';
import type { Posed } from './contract';

const STATIONS = 65;

/** A web that lies along x between -length/2 and length/2, what is left of it stands still, what is right turns with it. */
export interface TurningWeb {
  readonly web: Web;
  /** height of its middle, mm */
  readonly middle: number;
  /** highest strain at the whole fold */
  readonly peak: number;
  /** 1: what is right turns up; -1: down */
  readonly sign: 1 | -1;
}

/** Local thickness of the section at a distance from the nearer leaf, mm. */
function thicknessAt(web: Web, fromLeaf: number): number {
  const rise = (radius: number) =>
    fromLeaf >= radius ? 0 : radius - Math.sqrt(Math.max(0, radius ** 2 - (radius - fromLeaf) ** 2));
  return web.thickness + rise(web.fillet) + rise(reliefFillet(web));
}

interface Bend {
  /** bend angle reached at each station along the web, share of the fold, 0..1 */
  readonly turned: Float64Array;
  /** curvature at each station over that of an even bend */
  readonly curvature: Float64Array;
}

/** Curvature follows the moment over the stiffness of the local section, 1 / h^3, and adds up to the whole fold. */
function bendOf(web: Web): Bend {
  const step = web.length / (STATIONS - 1);
  const curvature = Float64Array.from({ length: STATIONS }, (_, i) => {
    const s = i * step;
    return (web.thickness / thicknessAt(web, Math.min(s, web.length - s))) ** 3;
  });
  const turned = new Float64Array(STATIONS);
  for (let i = 1; i < STATIONS; i += 1) turned[i] = turned[i - 1]! + (curvature[i]! + curvature[i - 1]!) / 2;
  const total = turned[STATIONS - 1]!;
  for (let i = 0; i < STATIONS; i += 1) {
    turned[i]! /= total;
    curvature[i]! *= (STATIONS - 1) / total;
  }
  return { turned, curvature };
}

/** Position of the mid-line at each station for a fold of `angle`. */
function midline(turned: Float64Array, step: number, angle: number) {
  const x = new Float64Array(STATIONS);
  const z = new Float64Array(STATIONS);
  for (let i = 1; i < STATIONS; i += 1) {
    const middle = ((turned[i]! + turned[i - 1]!) / 2) * angle;
    x[i] = x[i - 1]! + step * Math.cos(middle);
    z[i] = z[i - 1]! + step * Math.sin(middle);
  }
  return { x, z };
}

function sample(values: Float64Array, at: number): number {
  const i = Math.min(STATIONS - 2, Math.floor(at));
  return values[i]! + (values[i + 1]! - values[i]!) * (at - i);
}

export type FoldPose = (rest: Float32Array, angle: number, share: number, out: Posed) => void;

/**
 * Folds what lies along x about a web by `angle` (rad, positive), `share` of the whole fold. Strain is curvature times
 * distance from mid-web, scaled so that its greatest value is the peak of the check, and falls with the square of the
 * local thickness inside the fillets.
 */
export function foldPose({ web, middle, peak, sign }: TurningWeb): FoldPose {
  const bend = bendOf(web);
  const half = web.length / 2;
  const highest = Math.max(...bend.curvature);

  function strainAt(s: number, height: number): number {
    const inside = Math.max(0, Math.min(1, s / web.length));
    if (inside !== s / web.length) return 0;
    const local = thicknessAt(web, Math.min(s, web.length - s));
    if (Math.abs(height - middle) > local) return 0;
    const share = sample(bend.curvature, inside * (STATIONS - 1)) / highest;
    const lever = Math.max(-1, Math.min(1, (2 * (height - middle)) / local));
    return -sign * peak * share * (local / web.thickness) * lever;
  }

  return (rest, angle, share, out) => {
    const line = midline(bend.turned, web.length / (STATIONS - 1), sign * angle);
    for (let i = 0; i < rest.length; i += 3) {
      const s = rest[i]! + half;
      const height = rest[i + 2]!;
      const inside = Math.max(0, Math.min(web.length, s));
      const at = (inside / web.length) * (STATIONS - 1);
      const turn = sample(bend.turned, at) * sign * angle;
      const past = s - inside;
      const n = height - middle;
      out.positions[i] = sample(line.x, at) - half + past * Math.cos(turn) - n * Math.sin(turn);
      out.positions[i + 1] = rest[i + 1]!;
      out.positions[i + 2] = middle + sample(line.z, at) + past * Math.sin(turn) + n * Math.cos(turn);
      out.strain[i / 3] = share * strainAt(s, height);
    }
  };
}
