import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import type { FlexibleArm } from '@/lib/mechanics/large-deflection';
import { armFault } from '@/lib/mechanics/standing-arm';
import { inPanel } from './dimensions';
import {
  armOf,
  deflectionRatio,
  flexibleArm,
  GUIDE_MOST_DEFLECTION,
  type HookStrain,
  strainOf,
} from './mechanics';
import type { HookValues } from './schema';

/** Everything the figures of one check are made from. */
export interface Subject {
  readonly values: HookValues;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly flexible: FlexibleArm;
  /** bent by the whole undercut */
  readonly strain: HookStrain;
  /** why the corrected figures do not hold for these values; null where they do */
  readonly trouble: string | null;
  /** the same for the strains alone */
  readonly strainTrouble: string | null;
}

function troubleOf(v: HookValues): string | null {
  const fault = armFault(armOf(v), v.undercut);
  if (fault) return fault;
  const flatness = v.rootWidth / v.rootThickness;
  if (inPanel(v) && (flatness < 1 || flatness > 8)) {
    return 'in a panel the arm must be one to eight times as wide as thick';
  }
  return null;
}

export function subjectOf(values: HookValues, material: Material, use: Use): Subject {
  const flexible = flexibleArm(values, material.poisson.value);
  const trouble = troubleOf(values);
  return {
    values,
    material,
    allowable: allowableStrain(material, use),
    flexible,
    strain: strainOf(values, flexible, values.undercut),
    trouble,
    strainTrouble:
      trouble ?? (values.rootFillet > 0 ? null : 'a sharp root has no finite strain, give it a fillet'),
  };
}

/** The plain formula is for small deflections; past 0.3 of the length it is not used. */
export const inGuideRange = (v: HookValues): boolean => deflectionRatio(v) <= GUIDE_MOST_DEFLECTION;

/** Force in N of the arm bent so far, with the modulus at its nominal root strain; null where no modulus is known. */
export function forceOf(material: Material, strain: HookStrain): number | null {
  const modulus = secantModulus(material, strain.nominal);
  return modulus && modulus.value * strain.bent.forcePerModulus;
}
