import type { Material } from '../types';
import { abs } from './abs';
import { asa } from './asa';
import { MOULDED } from './moulded';
import { paConditioned, paDry } from './pa';
import { pc } from './pc';
import { petg } from './petg';
import { pla } from './pla';
import { pp } from './pp';
import { tpu95a } from './tpu';

/** The plastics as shipped: printed ones first, easy ones before hard ones, then moulded grades to compare. */
export const MATERIALS: readonly Material[] = [
  pla,
  petg,
  tpu95a,
  pp,
  abs,
  asa,
  paDry,
  paConditioned,
  pc,
  ...MOULDED,
];

export const materialById = (id: string): Material | undefined =>
  MATERIALS.find((material) => material.id === id);
