import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import {
  bondedStiffness,
  bucklingLoad,
  type Column,
  columnFault,
  columnStiffness,
  columnSway,
  type Rubber,
  squeezedHeight,
} from '@/lib/mechanics/rubber-column';
import { springStiffness } from '@/lib/mechanics/s-spring';
import { dropDeflection, naturalFrequency, staticSag } from '@/lib/mechanics/vibration';
import { freeHeight, onColumns, springOf, type Values } from './schema';

/** Share of the free height up to which linear stiffness is trusted. */
export const LINEAR_SHARE = 0.2;

const columnOf = (p: Values): Column => ({ side: p.columnSide, height: p.columnHeight });
const columnCount = (p: Values): number => p.columnsAlong * p.columnsAcross;

export interface Stiffness {
  /** N/mm of the whole mount for the modulus given */
  readonly axial: number;
  readonly handbook: number;
  readonly sway: number;
  readonly swayHandbook: number | null;
  /** strain per mm of travel */
  readonly axialStrain: number;
  readonly axialStrainHandbook: number | null;
  /** N; null for springs, which sink long before they give way */
  readonly buckling: number | null;
}

function ofColumns(p: Values, rubber: Rubber): Stiffness {
  const column = columnOf(p);
  const n = columnCount(p);
  return {
    axial: n * columnStiffness(column, rubber),
    handbook: n * bondedStiffness(column, rubber),
    sway: n * columnSway(column, rubber),
    swayHandbook: n * columnSway(column, rubber, 'plain'),
    axialStrain: 1 / squeezedHeight(column),
    axialStrainHandbook: 1 / p.columnHeight,
    buckling: n * bucklingLoad(column, rubber),
  };
}

function ofSprings(p: Values, rubber: Rubber): Stiffness {
  const one = springStiffness(springOf(p), { ...rubber, width: p.plateWidth });
  return {
    axial: 2 * one.axial,
    handbook: 2 * one.axial,
    sway: 2 * one.sway,
    swayHandbook: null,
    axialStrain: one.axialStrain,
    axialStrainHandbook: null,
    buckling: null,
  };
}

/** Stiffness of the mount for a modulus in MPa; strain does not depend on the modulus. */
export const stiffnessOf = (p: Values, rubber: Rubber): Stiffness =>
  onColumns(p) ? ofColumns(p, rubber) : ofSprings(p, rubber);

export interface Carried {
  /** MPa, secant at the static strain */
  readonly modulus: number;
  readonly inRange: boolean;
  readonly stiffness: Stiffness;
  /** mm */
  readonly sag: number;
  readonly knock: number;
  /** Hz */
  readonly frequency: number;
  readonly swayFrequency: number;
}

const ROUNDS = 6;

/** The mass at rest on the mount, modulus and sag found together; null where the modulus is not known. */
function settled(
  p: Values,
  material: Material,
): { modulus: number; inRange: boolean; strain: number } | null {
  const poisson = material.poisson.value;
  const unit = stiffnessOf(p, { modulus: 1, poisson });
  let strain = 0;
  for (let round = 0; round < ROUNDS; round += 1) {
    const secant = secantModulus(material, strain);
    if (!secant) return null;
    const next = unit.axialStrain * staticSag(p.mass, unit.axial * secant.value);
    if (Math.abs(next - strain) < 1e-6 || round === ROUNDS - 1) {
      return { modulus: secant.value, inRange: secant.inRange, strain: next };
    }
    strain = next;
  }
  return null;
}

export function carriedBy(p: Values, material: Material): Carried | null {
  const rest = settled(p, material);
  if (!rest) return null;
  const stiffness = stiffnessOf(p, { modulus: rest.modulus, poisson: material.poisson.value });
  const sag = staticSag(p.mass, stiffness.axial);
  return {
    modulus: rest.modulus,
    inRange: rest.inRange,
    stiffness,
    sag,
    knock: dropDeflection(sag, p.dropHeight),
    frequency: naturalFrequency(p.mass, stiffness.axial),
    swayFrequency: naturalFrequency(p.mass, stiffness.sway),
  };
}

/** Why nothing is known of this mount; null where it is covered. */
export function mountFault(p: Values, material: Material): string | null {
  if (onColumns(p)) return columnFault(columnOf(p), material.poisson.value);
  return p.bendRadius < p.stripThickness
    ? 'the bends must have a radius of at least the strip thickness'
    : null;
}

/** Whether a travel is within what linear stiffness covers. */
export const isLinear = (p: Values, travel: number): boolean => travel <= LINEAR_SHARE * freeHeight(p);
