import { revolvedVolume } from '@/lib/geometry/thread-bodies';
import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { wedgeFactor } from '@/lib/mechanics/friction';
import {
  bandReach,
  dimpleStrain,
  ribForceHigh,
  ribForceLow,
  type SqueezedPlug,
  squeezePressure,
  squeezeStrain,
} from '@/lib/mechanics/plug';
import { endFactor } from '@/lib/mechanics/seal';
import { bodyRadius, cavityRadius, ribRadius, ribStarts, type Values } from './schema';
import { section } from './section';

/** Facets a turn for the volume of the round body. */
const FINE = 360;

/** Hoop compression past which small-strain elasticity is not used. */
export const STRAIN_LIMIT = 0.2;

export interface PlugStrains {
  /** hoop compression at the bore */
  readonly contact: number;
  /** greatest hoop compression of the body, at the cavity of a hollow one */
  readonly peak: number;
  /** as `peak` without the bending at the open end */
  readonly handbook: number;
  /** where a free ring would dimple; null for a solid plug */
  readonly dimple: number | null;
}

const squeezed = (p: Values, height: number, poisson: number): Omit<SqueezedPlug, 'modulus'> => ({
  outer: ribRadius(p),
  inner: cavityRadius(p, height),
  interference: p.interference / 2,
  poisson,
});

const lastRib = (p: Values): number => ribStarts(p).at(-1)! + p.ribWidth;

export function plugStrains(p: Values, poisson: number): PlugStrains {
  const plug = squeezed(p, lastRib(p), poisson);
  const handbook = squeezeStrain(plug);
  const hollow = p.kind === 'hollow';
  return {
    contact: plug.interference / plug.outer,
    handbook,
    peak: hollow ? handbook * endFactor(p.wallThickness, plug.inner) : handbook,
    dimple: hollow ? dimpleStrain(p.wallThickness, bodyRadius(p, 0) - p.wallThickness / 2, poisson) : null,
  };
}

/** Length in mm of the plug that helps to bear the ribs, overlaps counted once. */
export function bearingLength(p: Values, poisson: number): number {
  const reach = bandReach(ribRadius(p), cavityRadius(p, lastRib(p)), poisson);
  let end = 0;
  return ribStarts(p).reduce((sum, start) => {
    const from = Math.max(end, start - reach, 0);
    end = Math.min(p.plugLength, start + p.ribWidth + reach);
    return sum + Math.max(0, end - from);
  }, 0);
}

interface Spread {
  readonly low: number;
  readonly value: number;
  readonly high: number;
}

export interface PlugForces {
  /** radial, all ribs */
  readonly radial: Spread;
  /** contact pressure under the ribs, MPa */
  readonly pressure: Spread;
  readonly push: Spread;
  readonly pull: Spread;
  /** pressure in MPa that pushes the plug out at the low end of everything */
  readonly ejection: number;
  readonly inRange: boolean;
}

/** Radial force between its strict bounds: free discs below, the whole body shrunk alike above. */
function radialForce(p: Values, modulus: number, poisson: number): Spread {
  const at = (height: number): SqueezedPlug => ({ ...squeezed(p, height, poisson), modulus });
  const low = ribForceLow(at(0), p.ribCount * p.ribWidth);
  const high = ribForceHigh(at(0), revolvedVolume(section(p), FINE));
  const estimate = ribForceLow(at(lastRib(p)), bearingLength(p, poisson));
  return { low, high, value: Math.min(high, Math.max(low, estimate)) };
}

/** Last rib over its lead-in while the others slide. */
const pushFactor = (p: Values, mu: number): number =>
  (wedgeFactor(mu, p.leadAngle) + (p.ribCount - 1) * mu) / p.ribCount;

/** Forces with the secant modulus at the peak strain; null where the modulus or the strain is out of reach. */
export function plugForces(p: Values, material: Material): PlugForces | null {
  const poisson = material.poisson.value;
  const { peak } = plugStrains(p, poisson);
  const secant = secantModulus(material, peak);
  if (!secant || peak > STRAIN_LIMIT) return null;
  const radial = radialForce(p, secant.value, poisson);
  const { low, value, high } = material.friction;
  const area = Math.PI * p.boreDiameter * p.ribCount * p.ribWidth;
  const spread = (factor: (mu: number) => number): Spread => ({
    low: radial.low * factor(low),
    value: radial.value * factor(value),
    high: radial.high * factor(high),
  });
  const pull = spread((mu) => mu);
  const discs = squeezePressure({ ...squeezed(p, 0, poisson), modulus: secant.value });
  return {
    radial,
    pressure: { low: discs, value: radial.value / area, high: radial.high / area },
    push: spread((mu) => pushFactor(p, mu)),
    pull,
    ejection: pull.low / ((Math.PI / 4) * p.boreDiameter ** 2),
    inRange: secant.inRange,
  };
}
