import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { hingeMechanics } from './mechanics';
import type { Values } from './schema';
import { foldAngleOf, webOf } from './web';

const STATIONS = 65;

interface Bend {
  /** bend angle reached at each station along the web, share of the fold, 0..1 */
  readonly turned: Float64Array;
  /** curvature at each station over that of an even bend */
  readonly curvature: Float64Array;
  /** position of the mid-line at each station for a fold of `angle` */
  readonly place: (angle: number) => { x: Float64Array; z: Float64Array };
}

/** Local thickness of the section at a distance from the nearer leaf, mm. */
function thicknessAt(p: Values, fromLeaf: number): number {
  const web = webOf(p);
  const rise = (radius: number) =>
    fromLeaf >= radius ? 0 : radius - Math.sqrt(Math.max(0, radius ** 2 - (radius - fromLeaf) ** 2));
  return web.thickness + rise(web.fillet) + rise(Math.min(web.fillet, web.relief));
}

/** Curvature follows the moment over the stiffness of the local section, 1 / h^3, and adds up to the whole fold. */
function bendOf(p: Values): Bend {
  const step = p.webLength / (STATIONS - 1);
  const curvature = Float64Array.from({ length: STATIONS }, (_, i) => {
    const s = i * step;
    return (p.webThickness / thicknessAt(p, Math.min(s, p.webLength - s))) ** 3;
  });
  const turned = new Float64Array(STATIONS);
  for (let i = 1; i < STATIONS; i += 1) turned[i] = turned[i - 1]! + (curvature[i]! + curvature[i - 1]!) / 2;
  const total = turned[STATIONS - 1]!;
  for (let i = 0; i < STATIONS; i += 1) {
    turned[i]! /= total;
    curvature[i]! *= (STATIONS - 1) / total;
  }
  return { turned, curvature, place: (angle) => midline(turned, step, angle) };
}

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

/**
 * Folds one leaf over the other. The fold angle is signed: towards the flat face the free leaf turns down (-z).
 * Strain is curvature times distance from mid-web, scaled so that its greatest value is the peak of the check, and
 * falls with the square of the local thickness inside the fillets.
 */
export function motion(p: Values, _material: Material): Motion {
  const bend = bendOf(p);
  const web = webOf(p);
  const mechanics = hingeMechanics(p);
  const peak = mechanics.strain?.peak ?? mechanics.nominal;
  const sign = p.foldTowards === 'flat-face' ? -1 : 1;
  const mid = web.relief + web.thickness / 2;
  const half = p.webLength / 2;
  const highest = Math.max(...bend.curvature);

  function strainAt(s: number, height: number): number {
    const inside = Math.max(0, Math.min(1, s / p.webLength));
    if (inside !== s / p.webLength) return 0;
    const local = thicknessAt(p, Math.min(s, p.webLength - s));
    const share = sample(bend.curvature, inside * (STATIONS - 1)) / highest;
    const lever = Math.max(-1, Math.min(1, (2 * (height - mid)) / local));
    return -sign * peak * share * (local / web.thickness) * lever;
  }

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const angle = sign * foldAngleOf(p) * t;
    const line = bend.place(angle);
    for (let i = 0; i < rest.length; i += 3) {
      const s = rest[i]! + half;
      const height = rest[i + 2]!;
      const inside = Math.max(0, Math.min(p.webLength, s));
      const at = (inside / p.webLength) * (STATIONS - 1);
      const turn = sample(bend.turned, at) * angle;
      const past = s - inside;
      const n = height - mid;
      out.positions[i] = sample(line.x, at) - half + past * Math.cos(turn) - n * Math.sin(turn);
      out.positions[i + 1] = rest[i + 1]!;
      out.positions[i + 2] = mid + sample(line.z, at) + past * Math.sin(turn) + n * Math.cos(turn);
      out.strain[i / 3] = t * strainAt(s, height);
    }
  }

  return { label: 'Fold', from: 'flat as printed', to: `folded by ${p.foldAngle}°`, peakStrain: peak, pose };
}
