import type { Web } from '@/lib/mechanics/web';
import { radians } from '@/lib/units';
import type { Values } from './schema';

/** The parameters as the mechanics see them. */
export const webOf = (p: Values): Web => ({
  length: p.webLength,
  thickness: p.webThickness,
  leafThickness: p.leafThickness,
  relief: p.webRelief,
  fillet: p.webFillet,
  foldTowards: p.foldTowards,
});

export const foldAngleOf = (p: Values): number => radians(p.foldAngle);

/** True where the leaves are pressed face to face. */
export const pressedShut = (p: Values): boolean => p.closing === 'shut' && p.foldAngle === 180;
