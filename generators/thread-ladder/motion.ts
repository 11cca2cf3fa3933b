import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { studOf } from './layout';
import { columnAt, type Values } from './schema';

/** Screws the stud into the widest hole from below, right-handed. Nothing strains. */
export function motion(p: Values, _material: Material): Motion {
  const { ridge, height } = studOf(p);
  const axis = columnAt(p, p.holes - 1);

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const down = body === 'stud' ? (1 - t) * (height + 2) : 0;
    const turned = (2 * Math.PI * down) / ridge.lead;
    const [cos, sin] = [Math.cos(turned), -Math.sin(turned)];
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y] = [rest[i]! - axis, rest[i + 1]!];
      out.positions[i] = axis + x * cos - y * sin;
      out.positions[i + 1] = x * sin + y * cos;
      out.positions[i + 2] = rest[i + 2]! - down;
    }
    out.strain.fill(0);
  }

  return { label: 'Screw in', from: 'apart', to: 'in the widest hole', peakStrain: 0, pose };
}
