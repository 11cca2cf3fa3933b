import type { BendingModel } from '@/lib/fea/model';
import type { Kernel, NamedSolid, Placement, Vec3 } from '@/lib/geometry/kernel';
import type { LayerDirection, Material, Source, Use } from '@/lib/materials/types';
import type { Unit } from '@/lib/units';
import type { Parameters } from './parameters';
import type { Report } from './report';

export type Kind = 'straps' | 'clips' | 'caps' | 'hinges' | 'mounts' | 'coupons';

export const KIND_NAME: Readonly<Record<Kind, string>> = {
  straps: 'Straps',
  clips: 'Clips',
  caps: 'Caps',
  hinges: 'Hinges',
  mounts: 'Mounts',
  coupons: 'Fit coupons',
};

/** What a newcomer reads to choose. Small: every family's `about` is in the list of families. */
export interface About {
  readonly id: string;
  readonly kind: Kind;
  readonly name: string;
  /** what it is, one line */
  readonly summary: string;
  readonly rightWhen: string;
  readonly wrongWhen: string;
  /** how it gives: "bending", "torsion", ... */
  readonly bendsBy: string;
}

/** A ready-made starting point. `values` differ from the defaults only where named. */
export interface Preset<P> {
  readonly id: string;
  readonly name: string;
  readonly purpose: string;
  readonly material: string;
  readonly use: Use;
  readonly values: Partial<P>;
}

/** A dimension to draw in the view, from the part at rest. `field` is the parameter it shows. */
export interface Callout {
  readonly field: string;
  readonly kind: 'length' | 'diameter' | 'radius' | 'angle';
  readonly from: Vec3;
  readonly to: Vec3;
  /** where the dimension line stands, as an offset from the measured points */
  readonly offset: Vec3;
  readonly value: number;
  readonly unit: Unit;
}

/**
 * A way to lay the part on the bed. The host drops each body to z = 0 and spaces bodies apart; bodies printed inside
 * one another, as a hinge on its pin, keep their places and are dropped as one.
 */
export interface Stance {
  readonly id: string;
  readonly label: string;
  readonly because: string;
  /** how the layers run against the strain in this stance */
  readonly layers: LayerDirection;
  /** rotation for a body; bodies not named keep the orientation they are built in */
  readonly orient: Readonly<Record<string, Placement>>;
  /** rotation of the whole part, for bodies that are printed as they are assembled; `orient` is not read then */
  readonly together?: Placement;
}

/** Points of one body moved to a moment of the motion, and the strain there. */
export interface Posed {
  /** xyz per vertex, written by the motion */
  readonly positions: Float32Array;
  /** signed surface strain per vertex as a fraction, tension positive, written by the motion */
  readonly strain: Float32Array;
}

/**
 * How the part moves in use: bending, closing, screwing on. `t` runs from 0 (first label) to 1 (last label).
 * `pose` reads `rest` (xyz per vertex of the body as built) and writes into `out`, arrays of matching length.
 */
export interface Motion {
  /** name of the slider: "Flex", "Close", "Screw on" */
  readonly label: string;
  readonly from: string;
  readonly to: string;
  /** largest absolute strain at t = 1, for the colour scale; 0 where nothing strains */
  readonly peakStrain: number;
  /** what shape and strain come from; left out: the family's formulas */
  readonly by?: string;
  /** signed strain of the place to be marked at a moment; left out: the largest absolute one of the pose */
  readonly markedStrain?: (t: number) => number;
  pose(body: string, rest: Float32Array, t: number, out: Posed): void;
}

/**
 * How one body of a family bends as a plane shape, for the finite elements. Plain data, so that a worker can solve
 * it without the family.
 */
export interface BendingPlane {
  readonly model: BendingModel;
  readonly body: string;
  /**
   * Each takes x and y of the plane, and z out of it, to the coordinates of the body as built; several where the
   * shape stands side by side in one body, at different x.
   */
  readonly placements: readonly [Placement, ...Placement[]];
  /** figure of the report that the solved peak strain stands for */
  readonly strainFigure: string;
  /** what that figure counts: the largest tension, or the larger of tension and compression */
  readonly counts: 'tension' | 'either';
  /** strain of a place that the plane does not show, from the formulas; counts where it is the larger. Null: none */
  readonly beside: { readonly strain: number; readonly because: string } | null;
  /** figures in proportion to the solved force, the force itself first; empty where none is */
  readonly forceFigures: readonly string[];
  /** secant modulus in MPa at the working strain; null where the plastic's is not known */
  readonly modulus: number | null;
  /** direction across the layers in the plane, rad from x, in the stance the use names; null where they lie in it */
  readonly layerNormal: number | null;
  /** `family`: the part does more in use than this bending, so the picture keeps the family's motion */
  readonly motion?: 'family';
  /** what the formula leaves out of this outline, shown as the likely reason where the two are far apart */
  readonly apart?: string;
}

/** Why a family, or these values of it, has no plane model: shown with the figures. */
export interface NoBending {
  readonly none: string;
}

export type Bending = BendingPlane | NoBending;

/** Guide page of a family: data, rendered by one page. Loaded apart from the family. */
export interface Guide {
  readonly purpose: readonly string[];
  readonly howItFails: readonly string[];
  readonly formulas: readonly {
    readonly name: string;
    /** plain text, symbols explained in `symbols` */
    readonly formula: string;
    readonly symbols: string;
    readonly validity: string;
    readonly source: Source;
  }[];
  readonly printing: readonly string[];
  readonly cautions: readonly string[];
}

/**
 * A part family. Everything is pure and synchronous: same input, same output, no clock, no randomness.
 * Bodies are built free of strain, two-body families in the assembled pose.
 */
// biome-ignore lint/suspicious/noExplicitAny: families of different parameters stand in one list
export interface Family<P = any> {
  readonly about: About;
  readonly parameters: Parameters<P>;
  /** at least three, for different uses; the first is the one the family opens with */
  readonly presets: readonly Preset<P>[];
  readonly check: (values: P, material: Material, use: Use) => Report;
  readonly build: (values: P, kernel: Kernel) => readonly NamedSolid[];
  /** closed-form volume in mm3 of each body, by name, as faceted at the given quality, for tests and mass; null where none exists */
  readonly volumes: (values: P, segmentsPerTurn: number) => Readonly<Record<string, number>> | null;
  readonly motion: (values: P, material: Material) => Motion;
  /** plane model for the finite elements; families that never bend as one leave it out */
  readonly bending?: (values: P, material: Material, use: Use) => Bending;
  readonly callouts: (values: P) => readonly Callout[];
  /** best first */
  readonly stances: (values: P) => readonly Stance[];
}
