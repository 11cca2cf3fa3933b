import { radians } from '@/lib/units';

/**
 * Force along the insertion axis for a transverse force of one on a ramp of angle alpha with friction mu:
 * W/P = (mu + tan alpha) / (1 - mu tan alpha). Infinity at and past self-locking, mu tan alpha >= 1.
 * `angle` in degrees. Source: Snap-Fit Joints for Plastics - A Design Guide (as quoted); handbook A4.
 */
export function wedgeFactor(mu: number, angle: number): number {
  if (angle >= 90) return Number.POSITIVE_INFINITY;
  const slope = Math.tan(radians(angle));
  const rest = 1 - mu * slope;
  return rest <= 0 ? Number.POSITIVE_INFINITY : (mu + slope) / rest;
}

/** Return angle in degrees from which a catch no longer opens by pulling: atan(1/mu). */
export function selfLockingAngle(mu: number): number {
  return (Math.atan(1 / mu) * 180) / Math.PI;
}
