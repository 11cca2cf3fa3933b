import type { Material } from '@/lib/materials/types';
import { meanRadius, ringShape } from '@/lib/mechanics/open-ring';
import type { Motion, Posed } from '../contract';
import { clipMechanics } from './mechanics';
import { centreHeight, centres, ringOf } from './ring';
import { boreOf, type Values } from './schema';

/** Value between stations at a share of the arm, 0 at the root and 1 at the lip. */
function sample(values: Float64Array, share: number): number {
  const at = Math.max(0, Math.min(values.length - 1.000001, share * values.length - 0.5));
  const i = Math.floor(at);
  return values[i]! + (values[i + 1]! - values[i]!) * (at - i);
}

/** Spreads the lips of every ring as far as the rod needs: cross-sections of the arm move and turn as the curved bar does. */
export function motion(p: Values, _material: Material): Motion {
  const ring = ringOf(p);
  const shape = ringShape(ring);
  const radius = meanRadius(ring);
  const { spread, strain: peak } = clipMechanics(p);
  const height = centreHeight(p);
  const outer = boreOf(p) / 2 + p.wallThickness;
  const middles = centres(p);
  const nearest = (x: number) =>
    middles.reduce((best, middle) => (Math.abs(x - middle) < Math.abs(x - best) ? middle : best));

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    for (let i = 0; i < rest.length; i += 3) {
      const middle = nearest(rest[i]!);
      const side = rest[i]! < middle ? -1 : 1;
      const x = Math.abs(rest[i]! - middle);
      const z = rest[i + 2]! - height;
      const moved = arm(x, z, spread * t);
      out.positions[i] = rest[i]! + side * moved.x;
      out.positions[i + 1] = rest[i + 1]!;
      out.positions[i + 2] = rest[i + 2]! + moved.z;
      out.strain[i / 3] = moved.strain;
    }
  }

  /** Movement and strain of a point of the right half, from the middle of the ring. */
  function arm(x: number, z: number, opened: number): { x: number; z: number; strain: number } {
    const away = Math.hypot(x, z);
    const angle = Math.atan2(x, -z);
    const bends = angle > shape.from && (away <= outer + 1e-3 || z > 0);
    if (!bends) return { x: 0, z: 0, strain: 0 };
    const share = Math.min(1, (angle - shape.from) / (shape.to - shape.from));
    const at = Math.min(angle, shape.to);
    const turn = sample(shape.rotation, share) * opened * Math.min(1, share * 20);
    const [ox, oz] = [x - radius * Math.sin(at), z + radius * Math.cos(at)];
    const [c, s] = [Math.cos(turn), Math.sin(turn)];
    return {
      x: sample(shape.x, share) * opened + ox * c + oz * s - ox,
      z: sample(shape.z, share) * opened - ox * s + oz * c - oz,
      strain: angle > shape.to ? 0 : surface(share, away) * opened,
    };
  }

  function surface(share: number, away: number): number {
    const wall = p.wallThickness + (p.tipThickness - p.wallThickness) * share;
    const across = Math.max(0, Math.min(1, (away - boreOf(p) / 2) / wall));
    return sample(shape.inner, share) * (1 - across) + sample(shape.outer, share) * across;
  }

  return { label: 'Push on', from: 'at rest', to: 'rod in the mouth', peakStrain: peak, pose };
}
