import { type Isotropic, type Law, linearLaw } from './law';
import type { Plane } from './plane';

/**
 * A printed plastic, alike in all directions of the layer plane and different across it. Moduli in MPa.
 * `poisson` is the ratio within the layer plane and, for want of data, also that of a pull in the plane to the
 * thinning across it.
 */
export interface Layered extends Isotropic {
  /** modulus across the layers */
  readonly across: number;
  /** shear modulus between layers; null takes Huber's estimate */
  readonly shearBetween: number | null;
  /** direction across the layers, rad from x */
  readonly normal: number;
}

/**
 * Shear modulus between layers from the two moduli: G = sqrt(Ep Ez) / (2 (1 + sqrt(nu_pz nu_zp))).
 * Source: Huber's approximation for orthotropic plates (1923), from memory; an estimate, not a property.
 */
export function shearEstimate({ modulus, across, poisson }: Layered): number {
  const mixed = poisson * Math.sqrt(across / modulus);
  return Math.sqrt(modulus * across) / (2 * (1 + mixed));
}

/** Stiffness along (across layers n, in the layer t, shear nt, in the layer z), by inverting the compliance. */
function principalStiffness(m: Layered): Float64Array {
  const { modulus: ep, across: en, poisson: nu } = m;
  const shear = m.shearBetween ?? shearEstimate(m);
  const between = -nu / ep;
  const [nn, pp] = [1 / en, 1 / ep];
  // compliance rows n, t, z: [nn b b] [b pp b] [b b pp]; t and z are alike, so the inverse is short
  const sum = pp + between;
  const whole = (pp - between) * (nn * sum - 2 * between * between);
  const knn = (pp * pp - between * between) / whole;
  const knt = (-between * (pp - between)) / whole;
  const ktt = (nn * pp - between * between) / whole;
  const ktz = (between * between - nn * between) / whole;
  return Float64Array.of(
    ...[knn, knt, 0, knt],
    ...[knt, ktt, 0, ktz],
    ...[0, 0, shear, 0],
    ...[knt, ktz, 0, ktt],
  );
}

/** Rotation of strain (11, 22, 2x12, 33) from x, y to axes turned by the angle. */
function strainRotation(angle: number): number[][] {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return [
    [c * c, s * s, c * s, 0],
    [s * s, c * c, -c * s, 0],
    [-2 * c * s, 2 * c * s, c * c - s * s, 0],
    [0, 0, 0, 1],
  ];
}

/** T^T D T: stiffness along x, y from that along the axes. */
function rotated(stiffness: Float64Array, angle: number): Float64Array {
  const t = strainRotation(angle);
  const out = new Float64Array(16);
  for (let i = 0; i < 4; i++) {
    for (let j = 0; j < 4; j++) {
      let sum = 0;
      for (let k = 0; k < 4; k++) {
        for (let l = 0; l < 4; l++) sum += t[k]![i]! * stiffness[4 * k + l]! * t[l]![j]!;
      }
      out[4 * i + j] = sum;
    }
  }
  return out;
}

/** 4 x 4 stiffness of the layered solid along x and y. */
export function layeredStiffness(material: Layered): Float64Array {
  return rotated(principalStiffness(material), material.normal);
}

/**
 * Elastic law of a layered print: transversely isotropic, linear in Green-Lagrange strain (St-Venant).
 * Source: Lekhnitskii, Theory of Elasticity of an Anisotropic Body (from memory). Limit: as St-Venant, reads
 * tension low above 3 % strain. With equal moduli and the isotropic shear modulus it is the isotropic law.
 */
export const layeredLaw = (material: Layered, plane: Plane): Law =>
  linearLaw(layeredStiffness(material), plane);
