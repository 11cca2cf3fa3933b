/**
 * Annular snap as the trade's guide gives it: a bead that stretches a tube, or squeezes a hollow shaft, all round.
 * y is the DIAMETRAL interference in mm (a bead of height y/2 on the radius); d is the diameter at the joint, d0 the
 * outside of the outer tube, di the bore of the inner shaft, mm. Source: Snap-Fit Joints for Plastics - A Design
 * Guide, pp. 20-22 (as quoted).
 */

/** Mean hoop strain y/d, as a fraction, of the side that gives; the mate taken as rigid. */
export const hoopStrain = (interference: number, diameter: number): number => interference / diameter;

/** Radial bead height in mm that strains the ring by `strain`. */
export const beadHeight = (strain: number, diameter: number): number => (strain * diameter) / 2;

const thinness = (ratio: number): number => 0.62 * Math.sqrt((ratio - 1) / (ratio + 1));
const thickRing = (ratio: number): number => (ratio ** 2 + 1) / (ratio ** 2 - 1);

/** Geometry factor X_N: rigid shaft of diameter d in an elastic tube of outside d0. */
export const tubeFactor = (d: number, d0: number, poisson: number): number =>
  thinness(d0 / d) / (thickRing(d0 / d) + poisson);

/** Geometry factor X_W: rigid tube of bore d round an elastic hollow shaft of bore di. */
export const shaftFactor = (d: number, di: number, poisson: number): number =>
  thinness(d / di) / (thickRing(d / di) - poisson);

/**
 * Transverse force in N near the end of the tube: P = y d Es X. Thin-shell theory gives 1.41 to 1.46 times as much
 * for the same line load, see SHELL_BAND.
 */
export const annularForce = (interference: number, d: number, modulus: number, factor: number): number =>
  interference * d * modulus * factor;

/** The force may lie this many times higher: edge-loaded thin shell against the guide's factor (derived here). */
export const SHELL_BAND = 1.45;

/** Distance from the end in mm past which the whole tube resists; the force is then up to four times as high. */
export const remoteDistance = (d: number, wall: number): number => 1.8 * Math.sqrt(d * wall);

/**
 * P/(y d E) of a semi-infinite thin tube loaded along its edge, mean radius r, wall t:
 * (pi/12) 3^0.75 (1 - nu^2)^-0.25 (t/r)^1.5. Derived here from the edge-loaded cylindrical shell (Hetenyi);
 * a line load far from the end takes four times as much.
 */
export const edgeLoadedShell = (wall: number, radius: number, poisson: number): number =>
  ((Math.PI / 12) * 3 ** 0.75 * (wall / radius) ** 1.5) / (1 - poisson ** 2) ** 0.25;
