import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { foldedStrain, solveFolded } from './mechanics';
import { centreline } from './path';
import type { Values } from './schema';

interface Moved {
  readonly x: Float64Array;
  readonly z: Float64Array;
  readonly turn: Float64Array;
}

/** Movement of the centre line at the whole undercut, by integrating the bending along the arm. */
function movedLine(p: Values): Moved {
  const elastic = { modulus: 1, poisson: 0.35, width: p.armWidth };
  const { line, rootTurn, compliance } = solveFolded(p, elastic);
  const force = p.undercut / compliance;
  const inertia = (p.armWidth * p.thickness ** 3) / 12;
  const n = line.stations.length;
  const moved: Moved = { x: new Float64Array(n), z: new Float64Array(n), turn: new Float64Array(n) };
  let [x, z, turn] = [0, 0, rootTurn * force];
  line.stations.forEach((station, i) => {
    const moment = (line.tip.y - station.y) * force;
    turn += (moment / inertia) * station.ds;
    x -= turn * Math.sin(station.heading) * station.ds;
    z += turn * Math.cos(station.heading) * station.ds;
    moved.x[i] = x;
    moved.z[i] = z;
    moved.turn[i] = turn;
  });
  return moved;
}

/**
 * Bends the arm until the catch has given way by the undercut, while the edge passes. Every point follows the
 * nearest place on the centre line; strain grows with the distance from it.
 */
export function motion(p: Values, _material: Material): Motion {
  const { stations } = centreline(p);
  const moved = movedLine(p);
  const strain = foldedStrain(p);
  const elastic = { modulus: 1, poisson: 0.35, width: p.armWidth };
  const { solved, compliance } = solveFolded(p, elastic);
  const force = p.undercut / compliance;
  const scale = -p.undercut / moved.x[moved.x.length - 1]!;
  const outer = Math.max(...stations.map(({ x }) => x)) + p.thickness / 2 + p.undercut + 1;

  const onArm = (x: number, z: number): boolean => (p.shape === 'u' ? z > 1e-6 : x > 1e-6) && x < outer;

  function nearest(x: number, z: number): number {
    let best = 0;
    let least = Number.POSITIVE_INFINITY;
    stations.forEach((station, i) => {
      const away = (station.x - x) ** 2 + (station.y - z) ** 2;
      if (away < least) [least, best] = [away, i];
    });
    return best;
  }

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const share = t * scale;
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      if (body !== 'hook' || !onArm(x, z)) {
        out.positions.set([x, y, z], i);
        out.strain[i / 3] = 0;
      } else {
        const at = nearest(x, z);
        const station = stations[at]!;
        const turn = moved.turn[at]! * share;
        const [c, s] = [Math.cos(turn), Math.sin(turn)];
        const [dx, dz] = [x - station.x, z - station.y];
        out.positions[i] = station.x + moved.x[at]! * share + dx * c - dz * s;
        out.positions[i + 1] = y;
        out.positions[i + 2] = station.y + moved.z[at]! * share + dx * s + dz * c;
        out.strain[i / 3] = t * surface(at, dx, dz);
      }
    }
  }

  function surface(at: number, dx: number, dz: number): number {
    const station = stations[at]!;
    const left = -dx * Math.sin(station.heading) + dz * Math.cos(station.heading);
    const across = Math.max(-1, Math.min(1, (2 * left) / p.thickness));
    const { left: onLeft, right: onRight } = solved.strain[at]!;
    return force * ((onLeft * (1 + across)) / 2 + (onRight * (1 - across)) / 2);
  }

  return { label: 'Flex', from: 'at rest', to: 'past the edge', peakStrain: strain.peak, pose };
}
