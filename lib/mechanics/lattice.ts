import { type BarSection, shearPerRate, torsionConstant } from './torsion';

/**
 * Panel with staggered rows of slits, bent about the slits. Between two rows a strip of `width` is left; it is twisted
 * from every bridge of one row to the next bridges of the other. Handbook: a bar of Saint-Venant as long as the slits
 * overlap, its ends free, bridges stiff. Corrected: the strip goes on twisting where a bridge holds only one of its sides,
 * and a narrow tall strip is held by its bridges, L + w (1.10 + 0.97 ln(w/t) - 0.26 ln^2(w/t) + 0.23 s/w).
 *
 * Fit of solid finite elements made for this project (tests/reference/lattice): moment within 2 %, shear strain from
 * 3 % low to 9 % high. Valid for w/t 0.25 to 2, bridge 1.2 to 5 w, slit 0.25 to 1.25 w, overlap at least 2 w.
 * The slit's end concentrates the strain of the bridge; that is not counted. Lengths mm, angles rad.
 */
export interface Lattice {
  /** of a strip, between two rows */
  readonly width: number;
  /** of the sheet */
  readonly thickness: number;
  readonly slit: number;
  /** left between two slits of a row */
  readonly bridge: number;
  /** length that a slit shares with those of the next row: the free length of a link */
  readonly overlap: number;
}

const sectionOf = ({ width, thickness }: Lattice): BarSection => ({ shape: 'rectangular', width, thickness });

/** Length of a link that twists, corrected, mm. */
export function linkLength(lattice: Lattice): number {
  const { width, thickness, slit, overlap } = lattice;
  const slim = Math.log(width / thickness);
  return overlap + width * (1.1 + 0.97 * slim - 0.26 * slim ** 2 + (0.23 * slit) / width);
}

/** Why the correction does not cover the lattice; null where it does. */
export function latticeFault({ width, thickness, slit, bridge, overlap }: Lattice): string | null {
  const within = (value: number, low: number, high: number) => value >= low - 1e-9 && value <= high + 1e-9;
  if (!within(width / thickness, 0.25, 2))
    return 'links must be 0.25 to 2 times as wide as the sheet is thick';
  if (!within(bridge / width, 1.2, 5)) return 'bridges must be 1.2 to 5 link widths long';
  if (!within(slit / width, 0.25, 1.25)) return 'slits must be 0.25 to 1.25 link widths wide';
  return overlap < 2 * width - 1e-9 ? 'slits must overlap those of the next row by two link widths' : null;
}

export interface LinkTwist {
  /** torque of one link over the modulus of shear, mm3 */
  readonly torque: number;
  /** largest shear strain, at the middle of the wider face */
  readonly shear: number;
}

/** One link twisted by an angle over a length. */
export const twistLink = (lattice: Lattice, angle: number, length: number): LinkTwist => ({
  torque: (torsionConstant(sectionOf(lattice)) * angle) / length,
  shear: (shearPerRate(sectionOf(lattice)) * angle) / length,
});

/** Nominal bending strain of a bridge, which takes the torque of two links; `torque` over the modulus of shear. */
export const bridgeStrain = ({ bridge, thickness }: Lattice, torque: number, poisson: number): number =>
  (6 * 2 * torque) / (2 * (1 + poisson) * bridge * thickness ** 2);

/** Twist of a link at which the edges of neighbouring strips meet on the inner face, rad: s / t. */
export const closingTwist = ({ slit, thickness }: Lattice): number => slit / thickness;

/**
 * Give of a link when the panel is pulled across its slits: a beam held at both ends, E v / F in mm/mm2 times MPa.
 * No correction: short links give more.
 */
export const pullGive = ({ overlap, width, thickness }: Lattice): number =>
  overlap ** 3 / (thickness * width ** 3);

/** Strain at the ends of such a link for a sideways displacement v of its ends, 3 w v / L^2. */
export const pullStrain = ({ overlap, width }: Lattice, displacement: number): number =>
  (3 * width * displacement) / overlap ** 2;
