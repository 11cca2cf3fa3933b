import type { Material, Quantity } from './types';

/** The properties that are one figure with a unit. */
export type QuantityKey = {
  [K in keyof Material]-?: NonNullable<Material[K]> extends Quantity ? K : never;
}[keyof Material];

export interface Property {
  readonly key: QuantityKey;
  readonly label: string;
}

export interface PropertyGroup {
  readonly id: string;
  readonly label: string;
  readonly properties: readonly Property[];
}

/** Every figure of a plastic in reading order. */
export const PROPERTY_GROUPS: readonly PropertyGroup[] = [
  {
    id: 'strain',
    label: 'Strain',
    properties: [
      { key: 'allowableOnce', label: 'Allowable strain, opened once' },
      { key: 'allowableOften', label: 'Allowable strain, opened often' },
      { key: 'allowableAcross', label: 'Allowable strain across layers, once' },
      { key: 'yieldStrain', label: 'Yield strain' },
      { key: 'breakStrain', label: 'Elongation at break' },
      { key: 'breakStrainAcross', label: 'Elongation at break across layers' },
    ],
  },
  {
    id: 'stiffness',
    label: 'Stiffness and strength',
    properties: [
      { key: 'flexuralModulus', label: 'Flexural modulus' },
      { key: 'tensileModulus', label: 'Tensile modulus' },
      { key: 'tensileModulusAcross', label: 'Tensile modulus across layers' },
      { key: 'poisson', label: "Poisson's ratio" },
      { key: 'tensileStrength', label: 'Tensile strength' },
      { key: 'tensileStrengthAcross', label: 'Tensile strength across layers' },
      { key: 'friction', label: 'Friction on itself' },
    ],
  },
  {
    id: 'heat',
    label: 'Heat and size',
    properties: [
      { key: 'heatDeflection', label: 'Heat deflection temperature, 0.45 MPa' },
      { key: 'glassTransition', label: 'Glass transition' },
      { key: 'continuousService', label: 'Continuous service temperature' },
      { key: 'thermalExpansion', label: 'Thermal expansion' },
      { key: 'shrinkage', label: 'Shrinkage' },
      { key: 'density', label: 'Density' },
    ],
  },
];

const NOT_FOUND = 'no figure was found in the sources used';

/** Why a property of this plastic is not known. */
export const gapReason = (material: Material, key: keyof Material): string =>
  material.gaps?.[key] ?? NOT_FOUND;

/** Share by which a property falls from one state to another, for example nylon dry to wet. */
export const shareLost = (before: number, after: number): number => 1 - after / before;

/** Strength across the layers over strength along them; null when either is not known. */
export function layerStrengthRatio(material: Material): number | null {
  const { tensileStrength, tensileStrengthAcross } = material;
  return tensileStrength && tensileStrengthAcross
    ? tensileStrengthAcross.value / tensileStrength.value
    : null;
}
