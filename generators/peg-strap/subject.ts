import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import {
  acrossLayers,
  alongPeg,
  type Banded,
  type HoldingLoads,
  holdingLoads,
  type RadialForce,
  radialForce,
  type StrapStrain,
  strapStrain,
} from './mechanics';
import type { PegStrap } from './schema';

/** One strap in one plastic and use, with everything the figures are made from. */
export interface Subject {
  readonly values: PegStrap;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly across: AllowableStrain;
  readonly strain: StrapStrain;
  readonly radial: RadialForce | null;
  readonly push: Banded | null;
  readonly pull: Banded | null;
  readonly loads: HoldingLoads;
}

export function subjectOf(values: PegStrap, material: Material, use: Use): Subject {
  const allowable = allowableStrain(material, use);
  const across = acrossLayers(material, use);
  const radial = radialForce(values, material);
  return {
    values,
    material,
    allowable,
    across,
    strain: strapStrain(values, material.poisson.value),
    radial,
    push: radial && alongPeg(radial, values.headLeadAngle, material),
    pull: radial && alongPeg(radial, values.headReturnAngle, material),
    loads: holdingLoads(values, material, allowable.value, across.value),
  };
}

export const finite = (value: number | null | undefined): number | null =>
  value !== null && value !== undefined && Number.isFinite(value) ? value : null;
