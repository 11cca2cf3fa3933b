import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { lidMechanics, lipOnCrest } from './mechanics';
import { lidBore, mouthHeight, skirtLength, type Values } from './schema';

const AIR = 8;

/** How much of the undercut is taken at a lift: all while the lip rides on the crest, none when home or clear. */
function shareAt(p: Values, lift: number): number {
  const crest = lipOnCrest(p);
  return Math.max(0, Math.min(1, 2 - (2 * Math.abs(lift - crest)) / crest));
}

/** Presses the lid straight down. Skirt and pot give while the lip passes the bead, most where they touch. */
export function motion(p: Values, material: Material): Motion {
  const mechanics = lidMechanics(p, material.poisson.value);
  const travel = skirtLength(p) + AIR;
  const lipHeight = mouthHeight(p) + p.lip / 2;
  const bead = p.potHeight - p.fromRim;
  const length = p.skirt === 'closed' ? Math.sqrt(lidBore(p) * p.lidWall) : skirtLength(p);

  function giveOf(body: string, height: number): { give: number; strain: number } {
    const isLid = body === 'lid';
    const away = Math.abs(height - (isLid ? lipHeight : bead));
    const fade = Math.max(0, 1 - away / length) ** 2;
    const covered = isLid ? height < p.potHeight : height > p.floor;
    if (!covered) return { give: 0, strain: 0 };
    return isLid
      ? { give: mechanics.lidGives * fade, strain: mechanics.lidStrain * fade }
      : { give: -mechanics.potGives * fade, strain: -mechanics.potStrain * fade };
  }

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const lift = (1 - t) * travel;
    const share = shareAt(p, lift);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const radius = Math.hypot(x, y);
      const { give, strain } = share > 0 ? giveOf(body, z) : { give: 0, strain: 0 };
      const grown = radius > 1e-6 ? 1 + (share * give) / radius : 1;
      out.positions[i] = x * grown;
      out.positions[i + 1] = y * grown;
      out.positions[i + 2] = z + (body === 'lid' ? lift : 0);
      out.strain[i / 3] = share * strain;
    }
  }

  const peakStrain = Math.max(mechanics.lidStrain, mechanics.potStrain);
  return { label: 'Close', from: 'apart', to: 'pressed on', peakStrain, pose };
}
