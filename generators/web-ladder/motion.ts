import type { Material } from '@/lib/materials/types';
import { foldWeb } from '@/lib/mechanics/web-fold';
import { radians } from '@/lib/units';
import type { Motion, Posed } from '../contract';
import { foldPose } from '../web-motion';
import { foldOf, layersOf, pitchOf, thicknessOf, type Values, webOf } from './schema';

function posesOf(p: Values) {
  return layersOf(p).map((layers) => {
    const { strain, nominal } = foldWeb(foldOf(p, layers));
    const peak = strain?.peak ?? nominal;
    const web = webOf(p, layers);
    return { peak, fold: foldPose({ web, middle: thicknessOf(p, layers) / 2, peak, sign: -1 }) };
  });
}

/** Vertices of each hinge, by where they lie along the fold. */
function sorted(p: Values, rest: Float32Array): number[][] {
  const groups: number[][] = Array.from({ length: p.hinges }, () => []);
  for (let i = 0; i < rest.length; i += 3) {
    const at = Math.round(rest[i + 1]! / pitchOf(p) + (p.hinges - 1) / 2);
    groups[Math.min(p.hinges - 1, Math.max(0, at))]!.push(i);
  }
  return groups;
}

/** Folds all free leaves down against the leaf they share. */
export function motion(p: Values, _material: Material): Motion {
  const poses = posesOf(p);

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    sorted(p, rest).forEach((group, hinge) => {
      const own = Float32Array.from(group.flatMap((i) => [rest[i]!, rest[i + 1]!, rest[i + 2]!]));
      const moved = { positions: new Float32Array(own.length), strain: new Float32Array(group.length) };
      poses[hinge]!.fold(own, radians(p.foldAngle) * t, t, moved);
      group.forEach((i, at) => {
        out.positions.set(moved.positions.subarray(3 * at, 3 * at + 3), i);
        out.strain[i / 3] = moved.strain[at]!;
      });
    });
  }

  const peakStrain = Math.max(...poses.map(({ peak }) => peak));
  return { label: 'Fold', from: 'flat as printed', to: `folded by ${p.foldAngle}°`, peakStrain, pose };
}
