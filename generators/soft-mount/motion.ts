import type { Material } from '@/lib/materials/types';
import { type SpringShape, springShape } from '@/lib/mechanics/s-spring';
import type { Motion, Posed } from '../contract';
import { carriedBy, LINEAR_SHARE, mountFault, stiffnessOf } from './mechanics';
import { columnsX, freeHeight, onColumns, springOf, springOffset, type Values } from './schema';

/** Sideways swing over travel, for the picture. */
const SWING = 0.6;
/** Places this near a plate belong to it, mm. */
const EDGE = 1e-3;

interface Moved {
  readonly x: number;
  readonly z: number;
  readonly strain: number;
}

/** Movement of a place between the plates when the upper one has sunk by `sink` and shifted by `shift`, mm. */
type Soft = (x: number, z: number, sink: number, shift: number) => Moved;

function columnsMove(p: Values, poisson: number): Soft {
  const h = p.columnHeight;
  const middles = columnsX(p);
  const strainPerMm = stiffnessOf(p, { modulus: 1, poisson }).axialStrain;
  return (x, z, sink, shift) => {
    const middle = middles.reduce((near, one) => (Math.abs(one - x) < Math.abs(near - x) ? one : near));
    const up = z / h;
    const bulge = (poisson * sink * 6 * up * (1 - up)) / h;
    const clear = Math.min(1, Math.min(z, h - z) / Math.max(p.fillet, 0.2));
    return {
      x: (x - middle) * bulge + shift * up * up * (3 - 2 * up),
      z: -sink * up,
      strain: -strainPerMm * sink * clear,
    };
  };
}

interface Near {
  readonly station: number;
  /** mm2 */
  readonly far: number;
}

/** The station nearest to a place. */
function nearest(stations: SpringShape['stations'], x: number, y: number): Near {
  let best = 0;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i < stations.length; i += 1) {
    const far = (stations[i]!.x - x) ** 2 + (stations[i]!.y - y) ** 2;
    if (far < least) {
      least = far;
      best = i;
    }
  }
  return { station: best, far: least };
}

/** A place carried by its station: moved and turned with it, strained as far out as it lies. */
function carriedAlong(
  shape: SpringShape,
  i: number,
  [x, y]: readonly [number, number],
  thickness: number,
): Moved {
  const station = shape.stations[i]!;
  const [dx, dy] = [x - station.x, y - station.y];
  const out = -Math.sin(station.heading) * dx + Math.cos(station.heading) * dy;
  const side = out > 0 ? shape.left[i]! : shape.right[i]!;
  return {
    x: shape.x[i]! - shape.turn[i]! * dy,
    z: shape.y[i]! + shape.turn[i]! * dx,
    strain: side * Math.min(1, (2 * Math.abs(out)) / thickness),
  };
}

function springsMove(p: Values, poisson: number): Soft {
  const spring = springOf(p);
  const h = freeHeight(p);
  const sinking = springShape(spring, poisson, [0, -1]);
  const shifting = springShape(spring, poisson, [1, 0]);
  return (x, z, sink, shift) => {
    const side = x >= 0 ? 1 : -1;
    const local = side * x - springOffset(p);
    const [below, above] = [nearest(sinking.stations, local, z), nearest(sinking.stations, -local, h - z)];
    const upper = above.far < below.far;
    const place = upper ? ([-local, h - z] as const) : ([local, z] as const);
    const { station } = upper ? above : below;
    const a = carriedAlong(sinking, station, place, p.stripThickness);
    const b = carriedAlong(shifting, station, place, p.stripThickness);
    const dx = a.x * sink + b.x * shift * side;
    const dz = a.z * sink + b.z * shift * side;
    const strain = a.strain * sink;
    return upper ? { x: side * (shift * side - dx), z: -sink - dz, strain } : { x: side * dx, z: dz, strain };
  };
}

/** Sinks as under the knock and sways once to either side on the way. */
export function motion(p: Values, material: Material): Motion {
  const poisson = material.poisson.value;
  const h = freeHeight(p);
  const carried = mountFault(p, material) ? null : carriedBy(p, material);
  const travel = Math.min(carried?.knock ?? Number.POSITIVE_INFINITY, LINEAR_SHARE * h);
  const soft = onColumns(p) ? columnsMove(p, poisson) : springsMove(p, poisson);
  const peakStrain = travel * stiffnessOf(p, { modulus: 1, poisson }).axialStrain;

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const sink = travel * t;
    const shift = SWING * travel * Math.sin(2 * Math.PI * t);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const moved =
        z <= EDGE
          ? { x: 0, z: 0, strain: 0 }
          : z >= h - EDGE
            ? { x: shift, z: -sink, strain: 0 }
            : soft(x, z, sink, shift);
      out.positions[i] = x + moved.x;
      out.positions[i + 1] = y;
      out.positions[i + 2] = z + moved.z;
      out.strain[i / 3] = moved.strain;
    }
  }

  return { label: 'Load', from: 'unloaded', to: 'at the knock', peakStrain, pose };
}
