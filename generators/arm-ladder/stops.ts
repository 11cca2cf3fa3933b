import type { Arm } from '@/lib/mechanics/beam';
import type { FlexibleArm } from '@/lib/mechanics/large-deflection';
import { armOnBlock, pushArm } from '@/lib/mechanics/standing-arm';

/** What the stops depend on. Lengths mm, strains as fractions. */
interface Sizes {
  readonly armLength: number;
  readonly armThickness: number;
  readonly armWidth: number;
  readonly rootFillet: number;
  readonly firstStrain: number;
  readonly strainStep: number;
  readonly arms: number;
}

/** The shape cannot know the plastic, so the stops are laid out for the middle of theirs. */
export const USUAL_POISSON = 0.38;

const armOf = (p: Sizes): Arm => ({
  length: p.armLength,
  rootThickness: p.armThickness,
  tipThickness: p.armThickness,
  rootWidth: p.armWidth,
  tipWidth: p.armWidth,
});

export const flexibleArm = (p: Sizes, poisson: number): FlexibleArm =>
  armOnBlock(armOf(p), p.rootFillet, p.armWidth, poisson);

/** Deflection in mm at which the peak reaches a strain; null past 0.9 of the length. */
function deflectionAt(flexible: FlexibleArm, strain: number): number | null {
  const furthest = 0.9 * flexible.arm.length;
  let y = Math.min((2 * strain * flexible.arm.length ** 2) / (3 * flexible.arm.rootThickness), furthest);
  for (let turn = 0; turn < 20; turn += 1) {
    const next = Math.min((y * strain) / pushArm(flexible, y).peak, furthest);
    if (Math.abs(next - y) < 1e-7 * y) return next < furthest ? next : null;
    y = next;
  }
  return null;
}

const known = new WeakMap<Sizes, readonly (number | null)[]>();

/** How far each arm may move at its tip before its stop holds it, mm; kept with the sizes. */
export function stopsOf(p: Sizes): readonly (number | null)[] {
  const found = known.get(p);
  if (found) return found;
  const flexible = flexibleArm(p, USUAL_POISSON);
  const stops = Array.from({ length: p.arms }, (_, at) =>
    deflectionAt(flexible, p.firstStrain + at * p.strainStep),
  );
  known.set(p, stops);
  return stops;
}
