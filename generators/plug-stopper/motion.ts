import type { Material } from '@/lib/materials/types';
import { bandReach } from '@/lib/mechanics/plug';
import { ringHoopStrain } from '@/lib/mechanics/seal';
import type { Motion, Posed } from '../contract';
import { plugStrains } from './mechanics';
import { cavityRadius, ribRadius, ribStarts, type Values } from './schema';

/** Share of a rib's squeeze once its front is `depth` mm inside the bore: it grows over the first millimetre. */
const entered = (depth: number): number => Math.max(0, Math.min(1, depth));

/**
 * Pushes the plug up into a bore whose mouth stands on the flange at t = 1. Each rib is squeezed as it enters; the
 * squeeze dies away from it over the reach of the wall.
 */
export function motion(p: Values, material: Material): Motion {
  const poisson = material.poisson.value;
  const crest = ribRadius(p);
  const strains = plugStrains(p, poisson);
  const starts = ribStarts(p);
  const travel = p.plugLength + 2;
  const bend = strains.peak / strains.handbook;

  function shareAt(height: number, lift: number): number {
    const reach = bandReach(crest, cavityRadius(p, starts.at(-1)!), poisson);
    return Math.max(
      ...starts.map((start) => {
        const end = start + p.ribWidth;
        const away = Math.max(0, start - height, height - end);
        return entered(end - lift) * Math.exp(-away / reach);
      }),
    );
  }

  function hoop(radius: number, height: number): number {
    const free = cavityRadius(p, Math.max(0, height));
    const at = { atContact: -strains.contact, contactRadius: crest, freeRadius: free, poisson };
    return ringHoopStrain({ ...at, radius: Math.max(radius, free, 1e-6) });
  }

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const lift = (1 - t) * travel;
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const height = z - p.flangeThickness;
      const squeezed = height > 0 ? shareAt(height, lift) : 0;
      const strain = squeezed > 0 ? squeezed * hoop(Math.hypot(x, y), height) : 0;
      out.positions[i] = x * (1 + strain);
      out.positions[i + 1] = y * (1 + strain);
      out.positions[i + 2] = z - lift;
      out.strain[i / 3] = Math.max(-strains.peak, strain * bend);
    }
  }

  return { label: 'Push in', from: 'before the bore', to: 'pushed in', peakStrain: strains.peak, pose };
}
