import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import type { Values } from './schema';

/** Pin and tongue come down into the widest holes. Nothing strains. */
export function motion(p: Values, _material: Material): Motion {
  const lift = p.depth + 3;

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const up = body === 'plate' ? 0 : lift * (1 - t);
    out.positions.set(rest);
    for (let i = 2; i < rest.length; i += 3) out.positions[i] = rest[i]! + up;
    out.strain.fill(0);
  }

  return { label: 'Try', from: 'lifted out', to: 'in the widest holes', peakStrain: 0, pose };
}
