import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { barrelRadius, type Values } from './schema';

/** Folds the bored leaf over the pinned one, about the pin. Nothing strains. */
export function motion(p: Values, _material: Material): Motion {
  const axis = barrelRadius(p);

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const angle = body === 'bored' ? Math.PI * t : 0;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    for (let i = 0; i < rest.length; i += 3) {
      const [x, up] = [rest[i]!, rest[i + 2]! - axis];
      out.positions[i] = x * c - up * s;
      out.positions[i + 1] = rest[i + 1]!;
      out.positions[i + 2] = axis + x * s + up * c;
    }
    out.strain.fill(0);
  }

  return { label: 'Turn', from: 'open, as printed', to: 'folded shut', peakStrain: 0, pose };
}
