/** A ring plug pressed into the bore of a neck, both of the same plastic. Diameters in mm. */
export interface PlugFit {
  /** diameter where plug and neck meet */
  readonly bore: number;
  readonly neckOuter: number;
  /** zero for a solid plug */
  readonly plugInner: number;
  /** plug larger than the bore by this much on the diameter */
  readonly interference: number;
  readonly poisson: number;
}

export interface PlugStrain {
  /** hoop strain at the bore, tension */
  readonly neck: number;
  /** hoop strain of the plug where it touches, compression, negative */
  readonly plug: number;
  /** hoop strain at the inside of a ring plug, compression, negative; equal to `plug` for a solid one */
  readonly plugInside: number;
  /** contact pressure over the modulus */
  readonly pressureShare: number;
}

/**
 * Lame's two rings: p/E = (i/d) / (W_h + W_s), W_h = (D^2 + d^2)/(D^2 - d^2), W_s = (d^2 + d_i^2)/(d^2 - d_i^2),
 * hoop strains p/E (W_h + nu) in the neck and -p/E (W_s - nu) in the plug, which add to i/d.
 * Plane stress, equal plastics, contact longer than a wall thickness, no friction along the axis.
 * Source: Lame; the solid-shaft case is the interference fit of DuPont module I (from memory).
 */
export function plugStrain(fit: PlugFit): PlugStrain {
  const { bore: d, neckOuter: outer, plugInner: inner, poisson } = fit;
  const neckStiffness = (outer ** 2 + d ** 2) / (outer ** 2 - d ** 2);
  const plugStiffness = (d ** 2 + inner ** 2) / (d ** 2 - inner ** 2);
  const pressureShare = fit.interference / d / (neckStiffness + plugStiffness);
  const plug = -pressureShare * (plugStiffness - poisson);
  return {
    pressureShare,
    neck: pressureShare * (neckStiffness + poisson),
    plug,
    plugInside: inner > 0 ? (-pressureShare * 2 * d ** 2) / (d ** 2 - inner ** 2) : plug,
  };
}

/** The rigid-mate value of the handbook, i/d: all of the interference taken by one part. */
export const rigidPlugStrain = (fit: PlugFit): number => fit.interference / fit.bore;

/**
 * Peak strain over the hoop strain y/ri where a ring is loaded at its end: 1 + 0.17 sqrt(s/ri), wall s, inner radius
 * ri. Source: finite-element table of loaded rings (CalculiX), within 3 %; on the safe side for a long contact.
 */
export const endFactor = (wall: number, innerRadius: number): number =>
  1 + 0.17 * Math.sqrt(wall / innerRadius);

/**
 * Torque in N mm that drags a plug round in the bore: mu p pi d^2 L / 2, pressure p in MPa over the length L (mm).
 */
export const plugDrag = (friction: number, pressure: number, bore: number, length: number): number =>
  (friction * pressure * Math.PI * bore ** 2 * length) / 2;

/** Hoop strain at radius r of a ring (mm) that has strain `atContact` at the contact radius; Lame, plane stress. */
export function ringHoopStrain(given: {
  readonly atContact: number;
  readonly contactRadius: number;
  /** the free radius of the ring: outside of the neck, inside of the plug (0 when solid) */
  readonly freeRadius: number;
  readonly poisson: number;
  readonly radius: number;
}): number {
  const { contactRadius: c, freeRadius: f, poisson, radius } = given;
  // u/r is A + B/r^2 with (1 + nu) A f^2 = (1 - nu) B, so that the free face bears no pressure
  const shape = (r: number) => 1 - poisson + ((1 + poisson) * f ** 2) / r ** 2;
  return (given.atContact * shape(radius)) / shape(c);
}
