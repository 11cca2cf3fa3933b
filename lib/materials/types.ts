import type { Unit } from '@/lib/units';

/**
 * How well a value is known.
 * verified: read in the source named · quoted: read in a text that quotes the publication ·
 * computed: published formula, number computed here · derived: derived here and checked numerically ·
 * memory: remembered from the named book or standard · common-practice: trade fact without a source ·
 * given: entered by the user.
 */
export type Mark = 'verified' | 'quoted' | 'computed' | 'derived' | 'memory' | 'common-practice' | 'given';

export interface Source {
  readonly text: string;
  readonly mark: Mark;
}

export interface Quantity {
  readonly value: number;
  readonly unit: Unit;
  readonly low?: number;
  readonly high?: number;
  readonly source: Source;
}

/**
 * Secant modulus against strain. `softening`: Es = E (1 - slope eps) up to `validTo`; `constant`: Es = E.
 * `assumed` is true where the model was calibrated on another material.
 */
export interface SecantModel {
  readonly kind: 'softening' | 'constant';
  readonly slope: number;
  readonly validTo: number;
  readonly assumed: boolean;
  readonly source: Source;
}

/** A figure with a band, for friction: value is the middle used for single figures. */
export interface Band extends Quantity {
  readonly low: number;
  readonly high: number;
}

export type FoldClass = 'long-life' | 'thousands' | 'few' | 'unknown';
export type Rating = 'good' | 'fair' | 'poor' | 'unknown';

export interface Judgement {
  readonly rating: Rating;
  readonly because: string;
  readonly source: Source;
}

export interface Range {
  readonly low: number;
  readonly high: number;
  readonly unit: Unit;
  readonly source: Source;
}

export interface PrintWindow {
  readonly nozzle: Range | null;
  readonly bed: Range | null;
  readonly enclosure: 'needed' | 'helpful' | 'not-needed';
  readonly bedSurface: string;
  readonly drying: { readonly temperature: Range; readonly hours: Range } | null;
  readonly warp: 'low' | 'medium' | 'high' | 'very-high' | 'unknown';
  readonly source: Source;
}

export interface Price {
  readonly perKg: number;
  readonly currency: 'EUR';
  /** ISO date the price was entered */
  readonly asOf: string;
  readonly source: Source;
}

/**
 * One plastic in one state. Null means not known, never zero. Moduli and strengths in MPa, strains as fractions,
 * density g/cm3, temperatures °C, expansion 1/K, shrinkage as a fraction.
 */
export interface Material {
  readonly id: string;
  readonly name: string;
  readonly shortName: string;
  readonly process: 'printed' | 'moulded';
  readonly summary: string;
  readonly flexuralModulus: Quantity | null;
  readonly tensileModulus: Quantity | null;
  readonly tensileModulusAcross: Quantity | null;
  readonly secant: SecantModel;
  readonly poisson: Quantity;
  readonly yieldStrain: Quantity | null;
  readonly tensileStrength: Quantity | null;
  readonly tensileStrengthAcross: Quantity | null;
  /** elongation at break along and across the layers */
  readonly breakStrain?: Quantity | null;
  readonly breakStrainAcross?: Quantity | null;
  /** permissible short-time strain at 23 °C, along the layers */
  readonly allowableOnce: Quantity | null;
  readonly allowableOften: Quantity | null;
  /** as `allowableOnce`, where the strain pulls the layers apart */
  readonly allowableAcross: Quantity | null;
  /** given by the user for the use at hand: stands in place of limit, use, layers and temperature */
  readonly allowableFinal?: Quantity | null;
  /** friction of the plastic on itself */
  readonly friction: Band;
  readonly density: Quantity | null;
  readonly heatDeflection: Quantity | null;
  readonly glassTransition: Quantity | null;
  readonly continuousService: Quantity | null;
  readonly thermalExpansion: Quantity | null;
  readonly shrinkage: Quantity | null;
  readonly print: PrintWindow | null;
  readonly weather: Judgement;
  readonly chemicals: Judgement;
  readonly gluing: Judgement;
  readonly foldEndurance: { readonly class: FoldClass; readonly because: string; readonly source: Source };
  /** true for plastics whose thin webs are drawn and oriented by the first fold (PP, PE) */
  readonly drawsWhenFolded: boolean;
  readonly price: Price | null;
  /** why a figure of this plastic is not known, by property, where there is more to say than "not found" */
  readonly gaps?: Readonly<Partial<Record<string, string>>>;
}

export type Opening = 'once' | 'sometimes' | 'often';
export type LayerDirection = 'along' | 'across';

/** How the part is used. Temperature in °C. */
export interface Use {
  readonly opening: Opening;
  readonly layers: LayerDirection;
  readonly temperature: number;
}

export const DEFAULT_USE: Use = { opening: 'often', layers: 'along', temperature: 23 };
