import type { Band, Material, Quantity, Source } from './types';

/** Single properties given in place of the stored ones. */
export interface MaterialOverrides {
  /** MPa, at the working strain: taken as it stands, no softening with strain */
  readonly secantModulus?: number | undefined;
  /** on itself; one figure carries the usual band of +- 50 % */
  readonly friction?:
    | number
    | { readonly value: number; readonly low: number; readonly high: number }
    | undefined;
  /** fraction, final: the use, the layers and the temperature are taken as counted in */
  readonly allowableStrain?: number | undefined;
}

const GIVEN: Source = { text: 'Given in place of the stored figure', mark: 'given' };
const quantity = (value: number, unit: Quantity['unit']): Quantity => ({ value, unit, source: GIVEN });

function withModulus(material: Material, value: number): Material {
  const modulus = quantity(value, 'MPa');
  const secant = { kind: 'constant', slope: 0, validTo: 1, assumed: false, source: GIVEN } as const;
  return { ...material, flexuralModulus: modulus, tensileModulus: modulus, secant };
}

/** Snap-Fit Joints for Plastics - A Design Guide advises +- 50 % on any single friction figure (as quoted). */
function withFriction(material: Material, given: NonNullable<MaterialOverrides['friction']>): Material {
  const spread = typeof given === 'number' ? { value: given, low: 0.5 * given, high: 1.5 * given } : given;
  const friction: Band = { ...spread, unit: 'ratio', source: GIVEN };
  return { ...material, friction };
}

function withAllowable(material: Material, value: number): Material {
  const strain = quantity(value, 'strain');
  return {
    ...material,
    allowableFinal: strain,
    allowableOnce: strain,
    allowableOften: strain,
    allowableAcross: strain,
  };
}

/** The plastic with single properties replaced, each marked as given. */
export function withOverrides(material: Material, overrides: MaterialOverrides): Material {
  const { secantModulus, friction, allowableStrain } = overrides;
  let changed = material;
  if (secantModulus !== undefined) changed = withModulus(changed, secantModulus);
  if (friction !== undefined) changed = withFriction(changed, friction);
  if (allowableStrain !== undefined) changed = withAllowable(changed, allowableStrain);
  return changed;
}
