import type { Material } from '@/lib/materials/types';
import { thicknessAt } from '@/lib/mechanics/beam';
import type { BentFlushArm } from '@/lib/mechanics/flush-arm';
import { stationValue, strainAt } from '@/lib/mechanics/large-deflection';
import type { Motion, Posed } from '../contract';
import { type BuckleLayout, entryTravel, layoutOf, squeezeTravel } from './layout';
import { buckleStrain, fingerReach } from './mechanics';
import type { Values } from './schema';

/** The housing goes this much further than the barbs need, mm. */
const AIR = 6;

/** A point of an arm, `out` from the middle of the plug: sections turn with the middle line of the bent arm. */
function bentPoint(
  p: Values,
  layout: BuckleLayout,
  arm: BentFlushArm,
  share: number,
  x: number,
  out: number,
) {
  const along = x - layout.root;
  const reach = fingerReach(p);
  const s = Math.min(Math.max(along, 0), reach);
  const { bent, flexible } = arm;
  const middle = layout.arm - thicknessAt(flexible.arm, s) / 2;
  const turned = share * stationValue(bent, bent.angle, s);
  const moved = share * stationValue(bent, bent.y, s);
  const shorter = share * share * (s - stationValue(bent, bent.x, s));
  const off = out - middle;
  const beyond = along - s;
  const inside = Math.max(-1, Math.min(1, off / (thicknessAt(flexible.arm, s) / 2)));
  const onBarb = out > layout.arm + 1e-3 ? 0 : 1;
  return {
    x: layout.root + s - shorter + off * Math.sin(turned) + beyond * Math.cos(turned),
    out: middle - moved + off * Math.cos(turned) - beyond * Math.sin(turned),
    // squeezed in, the outside of the arm is in tension
    strain: share * inside * onBarb * raised(p, arm, s),
  };
}

/** Strain along the arm, raised where the fillet ends. */
function raised(p: Values, { flexible, bent, nominal, peak }: BentFlushArm, s: number): number {
  const near = Math.max(0, 1 - Math.abs(s - p.rootFillet) / p.rootFillet) ** 2;
  return strainAt(flexible, bent, s) * (1 + (nominal > 0 ? peak / nominal - 1 : 0) * near);
}

function posePlug(p: Values, arm: BentFlushArm, share: number, rest: Float32Array, out: Posed): void {
  const layout = layoutOf(p);
  for (let i = 0; i < rest.length; i += 3) {
    const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
    const side = y < 0 ? -1 : 1;
    const isArm = x > layout.root + 1e-4;
    const moved = isArm
      ? bentPoint(p, layout, arm, share, x, Math.abs(y))
      : { x, out: Math.abs(y), strain: 0 };
    out.positions[i] = moved.x;
    out.positions[i + 1] = side * moved.out;
    out.positions[i + 2] = z;
    out.strain[i / 3] = moved.strain;
  }
}

/** Both pads are squeezed in; once the barbs clear the wall the housing is drawn off. */
export function motion(p: Values, material: Material): Motion {
  const { squeeze } = buckleStrain(p, material.poisson.value);
  const clear = entryTravel(p) / squeezeTravel(p);
  const { nose } = layoutOf(p);
  return {
    label: 'Squeeze',
    from: 'locked',
    to: 'squeezed and drawn off',
    peakStrain: squeeze.peak,
    pose(body, rest, t, out) {
      if (body === 'plug') return posePlug(p, squeeze, t, rest, out);
      const off = t <= clear ? 0 : ((t - clear) / (1 - clear)) * (nose + AIR);
      out.positions.set(rest);
      out.strain.fill(0);
      for (let i = 0; i < rest.length; i += 3) out.positions[i] = rest[i]! + off;
    },
  };
}
