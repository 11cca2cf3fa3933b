import type { Material } from '@/lib/materials/types';
import {
  type BentArm,
  bendArm,
  type FlexibleArm,
  stationValue,
  strainAt,
} from '@/lib/mechanics/large-deflection';
import { pushArm, standingConcentration } from '@/lib/mechanics/standing-arm';
import type { Motion, Posed } from '../contract';
import { type Cell, cellsOf } from './layout';
import type { Values } from './schema';
import { flexibleArm } from './stops';

/** The concentration of the fillet holds where it ends and is gone one radius further. */
function crowding(p: Values, factor: number, s: number): number {
  const past = Math.max(0, s - p.rootFillet) / p.rootFillet;
  return 1 + (factor - 1) * Math.max(0, 1 - past);
}

/** Moves the points of one arm with it; the fillets of the root stay with the base. */
function poseArm(
  p: Values,
  { flexible, factor }: { flexible: FlexibleArm; factor: number },
  cell: Cell,
  bent: BentArm,
) {
  const middle = (cell.arm[0] + cell.arm[1]) / 2;
  return (x: number, y: number): readonly [number, number, number] => {
    const angle = stationValue(bent, bent.angle, y);
    const aside = x - middle;
    const along = stationValue(bent, bent.x, y) + Math.min(0, y - bent.along[0]!);
    const lever = Math.max(-1, Math.min(1, (-2 * aside) / p.armThickness));
    const strain = strainAt(flexible, bent, Math.max(y, p.rootFillet)) * crowding(p, factor, y) * lever;
    return [
      middle + stationValue(bent, bent.y, y) + aside * Math.cos(angle),
      along - aside * Math.sin(angle),
      strain,
    ];
  };
}

/** Every arm is pushed at its tip until it meets its stop. */
export function motion(p: Values, material: Material): Motion {
  const poisson = material.poisson.value;
  const flexible = flexibleArm(p, poisson);
  const arm = { flexible, factor: standingConcentration(flexible.arm, p.rootFillet, poisson) };
  const cells = cellsOf(p);
  const peakStrain = pushArm(flexible, cells.at(-1)!.stop).peak;

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const movers = cells.map((cell) => poseArm(p, arm, cell, bendArm(flexible, cell.stop * t)));
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const at = y > 0 ? cells.findIndex((cell) => x > cell.arm[0] - 1e-4 && x < cell.arm[1] + 1e-4) : -1;
      const [px, py, strain] = at < 0 || t === 0 ? [x, y, 0] : movers[at]!(x, y);
      out.positions.set([px, py, z], i);
      out.strain[i / 3] = strain;
    }
  }

  return { label: 'Push', from: 'as printed', to: 'every arm at its stop', peakStrain, pose };
}
