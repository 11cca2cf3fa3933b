import type { Material } from './types';

export interface SecantModulus {
  /** MPa */
  readonly value: number;
  /** false past the strain the model was calibrated to; the value is then held at that strain */
  readonly inRange: boolean;
}

/**
 * Secant modulus sigma/eps in MPa at a working strain (fraction, sign ignored).
 * Starts from the flexural modulus, which is what arms and webs see, and falls back on the tensile one.
 * Null when neither is known. Source: handbook section B6 (assumption calibrated on PC, 1815 MPa at 2 %).
 */
export function secantModulus(material: Material, strain: number): SecantModulus | null {
  const initial = material.flexuralModulus ?? material.tensileModulus;
  if (!initial) return null;
  const { kind, slope, validTo } = material.secant;
  const size = Math.abs(strain);
  const factor = kind === 'constant' ? 1 : 1 - slope * Math.min(size, validTo);
  return { value: initial.value * factor, inRange: size <= validTo };
}
