import type { Material } from '@/lib/materials/types';
import type { Motion } from '../contract';
import { foldPose } from '../web-motion';
import { hingeMechanics } from './mechanics';
import type { Values } from './schema';
import { foldAngleOf, webOf } from './web';

/** Folds one leaf over the other: towards the flat face the free leaf turns down, towards the groove up. */
export function motion(p: Values, _material: Material): Motion {
  const { strain, nominal } = hingeMechanics(p);
  const web = webOf(p);
  const peak = strain?.peak ?? nominal;
  const middle = web.relief + web.thickness / 2;
  const fold = foldPose({ web, middle, peak, sign: p.foldTowards === 'flat-face' ? -1 : 1 });
  return {
    label: 'Fold',
    from: 'flat as printed',
    to: `folded by ${p.foldAngle}°`,
    peakStrain: peak,
    pose: (_body, rest, t, out) => fold(rest, foldAngleOf(p) * t, t, out),
  };
}
