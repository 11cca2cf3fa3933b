import { condenseThrough, type Isotropic, type Law, newResponse, type Response } from './law';
import type { Plane } from './plane';

const UNIT = [1, 1, 0, 1];

interface Constants {
  readonly shear: number;
  readonly bulk: number;
}

/** Stress and tangent of the solid for given C33. `inverse` holds C^-1 for 11, 22, 12, 33. */
function solidResponse(
  { shear, bulk }: Constants,
  c: Float64Array,
  inverse: Float64Array,
  out: Response,
): void {
  const flat = c[0]! * c[1]! - c[2]! * c[2]!;
  const volume = Math.sqrt(flat * c[3]!);
  inverse[0] = c[1]! / flat;
  inverse[1] = c[0]! / flat;
  inverse[2] = -c[2]! / flat;
  inverse[3] = 1 / c[3]!;
  const a = shear * volume ** (-2 / 3);
  const trace = c[0]! + c[1]! + c[3]!;
  const pressure = bulk * (volume - 1) * volume;
  const spherical = pressure - (a * trace) / 3;
  for (let i = 0; i < 4; i++) out.stress[i] = a * UNIT[i]! + spherical * inverse[i]!;
  const cross = (-2 / 3) * a;
  const dyad = (2 / 9) * a * trace + bulk * volume * (2 * volume - 1);
  const identity = (2 / 3) * a * trace - 2 * pressure;
  writeTangent(inverse, cross, dyad, identity, out.tangent);
}

function writeTangent(g: Float64Array, cross: number, dyad: number, identity: number, d: Float64Array): void {
  for (let i = 0; i < 4; i++) {
    for (let j = 0; j < 4; j++) {
      d[4 * i + j] = cross * (UNIT[i]! * g[j]! + g[i]! * UNIT[j]!) + dyad * g[i]! * g[j]!;
    }
  }
  const g11 = g[0]!;
  const g22 = g[1]!;
  const g12 = g[2]!;
  const g33 = g[3]!;
  d[0]! += identity * g11 * g11;
  d[1]! += identity * g12 * g12;
  d[2]! += identity * g11 * g12;
  d[4]! += identity * g12 * g12;
  d[5]! += identity * g22 * g22;
  d[6]! += identity * g22 * g12;
  d[8]! += identity * g11 * g12;
  d[9]! += identity * g22 * g12;
  d[10]! += (identity * (g11 * g22 + g12 * g12)) / 2;
  d[15]! += identity * g33 * g33;
}

/**
 * Compressible neo-Hooke, W = mu/2 (I1 J^(-2/3) - 3) + K/2 (J - 1)^2, C = F^T F; mu and K from the modulus and
 * Poisson's ratio, so that it is Hooke's law at small strain. Plane stress finds C33 from S33 = 0 by Newton's
 * method and condenses the tangent; plane strain has C33 = 1; axisymmetric takes E33 as given.
 * Source: Bonet and Wood, Nonlinear Continuum Mechanics for Finite Element Analysis (from memory).
 * Limit: J must stay positive, so a folded element gives NaN, which the solver reports.
 */
export function neoHooke({ modulus, poisson }: Isotropic, plane: Plane): Law {
  const constants = { shear: modulus / (2 * (1 + poisson)), bulk: modulus / (3 * (1 - 2 * poisson)) };
  const thinning = -poisson / (1 - poisson);
  const c = new Float64Array(4);
  const inverse = new Float64Array(4);
  const freeToThin = plane === 'plane-stress';
  return {
    plane,
    constant: false,
    respond(strain, out) {
      c[0] = 1 + 2 * strain[0]!;
      c[1] = 1 + 2 * strain[1]!;
      c[2] = strain[2]!;
      c[3] = plane === 'axisymmetric' ? 1 + 2 * strain[3]! : 1;
      if (freeToThin) c[3] = (c[0]! * c[1]! - c[2]! * c[2]!) ** thinning;
      solidResponse(constants, c, inverse, out);
      if (freeToThin) relaxThrough(constants, c, inverse, out);
    },
  };
}

/** Newton iterations on C33 until S33 vanishes; at most 12, usually one or two. */
function relaxThrough(constants: Constants, c: Float64Array, inverse: Float64Array, out: Response): void {
  for (let round = 0; round < 12; round++) {
    const stress = out.stress[3]!;
    if (Math.abs(stress) < 1e-9 * constants.bulk) break;
    c[3] = Math.max(0.05, c[3]! - (2 * stress) / out.tangent[15]!);
    solidResponse(constants, c, inverse, out);
  }
  condenseThrough(out.tangent);
}

/** Stress of one state, for tests and single evaluations. */
export function neoHookeAt(material: Isotropic, plane: Plane, strain: readonly number[]): Response {
  const out = newResponse();
  neoHooke(material, plane).respond(Float64Array.from(strain), out);
  return out;
}
