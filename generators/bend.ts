import type { ElasticNumbers } from '@/lib/fea/model';
import { LINEAR, NON_LINEAR, type SolveOptions } from '@/lib/fea/solve/options';
import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solved } from '@/lib/fea/solve/solution';
import type { LayerAllowable } from '@/lib/fea/strain/layers';
import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import type { Bending, BendingPlane, Family } from './contract';

/** Strain does not depend on the modulus; where it is unknown 1 MPa stands in and the force is not shown. */
const ANY_MODULUS = 1;

/** Ratio of the moduli across and along the layers; null where one is not known. */
function acrossRatio({ tensileModulus, tensileModulusAcross }: Material): number | null {
  return tensileModulus && tensileModulusAcross ? tensileModulusAcross.value / tensileModulus.value : null;
}

function numbersOf({ modulus, layerNormal }: BendingPlane, material: Material): ElasticNumbers {
  const along = modulus ?? ANY_MODULUS;
  const ratio = acrossRatio(material);
  const layers =
    layerNormal === null || ratio === null
      ? null
      : { normal: layerNormal, across: ratio * along, shearBetween: null };
  return { modulus: along, poisson: material.poisson.value, layers };
}

function allowableOf({ layerNormal }: BendingPlane, material: Material, use: Use): LayerAllowable | null {
  if (layerNormal === null || material.process === 'moulded') return null;
  const limit = (layers: Use['layers']) => allowableStrain(material, { ...use, layers }).value;
  return { along: limit('along'), across: limit('across'), normal: layerNormal };
}

/** The family's plane model, or why there is none. Dimensions that do not fit together are a reason too. */
export function bendingOf<P>(family: Family<P>, values: P, material: Material, use: Use): Bending {
  if (!family.bending) {
    return { none: `The part does not bend as a plane shape: it gives by ${family.about.bendsBy}.` };
  }
  try {
    return family.bending(values, material, use);
  } catch (error) {
    if (error instanceof RangeError) return { none: `The outline could not be drawn: ${error.message}.` };
    throw error;
  }
}

/** What to solve for a plane: `small` for the first answer, `large` for the figure that counts. */
export function solveRequest(
  plane: BendingPlane,
  material: Material,
  use: Use,
  displacement: SolveOptions['displacement'],
): SolveRequest {
  return {
    model: plane.model,
    numbers: numbersOf(plane, material),
    options: displacement === 'small' ? LINEAR : NON_LINEAR,
    allowable: allowableOf(plane, material, use),
  };
}

/**
 * The same request for a plastic of 1 MPa. Shape and strain are those of any modulus and forces are in proportion, so
 * that plastics alike in all else share one solution.
 */
export function perModulus(request: SolveRequest): SolveRequest {
  const { modulus, layers, ...rest } = request.numbers;
  const across = layers && {
    ...layers,
    across: layers.across / modulus,
    shearBetween: layers.shearBetween && layers.shearBetween / modulus,
  };
  return { ...request, numbers: { ...rest, modulus: 1, layers: across } };
}

/** A solution for 1 MPa as it is for a plastic of `modulus` (MPa). */
export function atModulus(solution: Solved, modulus: number): Solved {
  return { ...solution, steps: solution.steps.map((step) => ({ ...step, force: step.force * modulus })) };
}
