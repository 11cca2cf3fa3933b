/**
 * One mass on one spring. Mass in g, stiffness N/mm, lengths mm, frequencies Hz. Linear, the ground shaken.
 * Source: Den Hartog, Mechanical Vibrations (from memory): f = sqrt(k/m) / (2 pi); transmissibility
 * sqrt((1 + (2 z r)^2) / ((1 - r^2)^2 + (2 z r)^2)), r = frequency over natural frequency, z damping ratio.
 */

/** Standard gravity, m/s2. */
export const GRAVITY = 9.80665;

/** N */
export const weightOf = (mass: number): number => (mass / 1000) * GRAVITY;

/** Deflection under the weight, mm. */
export const staticSag = (mass: number, stiffness: number): number => weightOf(mass) / stiffness;

/** Hz. N/mm over g is 1e6 per second squared. */
export const naturalFrequency = (mass: number, stiffness: number): number =>
  Math.sqrt((stiffness * 1e6) / mass) / (2 * Math.PI);

/** Frequency over the natural one from which on less arrives than is sent, whatever the damping. */
export const ISOLATES_FROM = Math.SQRT2;

/** Share of a shaking that arrives. */
export function transmissibility(ratio: number, damping: number): number {
  const damped = (2 * damping * ratio) ** 2;
  return Math.sqrt((1 + damped) / ((1 - ratio ** 2) ** 2 + damped));
}

/**
 * Greatest deflection from the unloaded spring when the mass falls on it from a height: the energy m g (h + x) is k x^2 / 2,
 * so x = d + sqrt(d^2 + 2 d h) with the static sag d. A drop from 0 gives twice the sag.
 */
export const dropDeflection = (sag: number, height: number): number =>
  sag + Math.sqrt(sag ** 2 + 2 * sag * height);
