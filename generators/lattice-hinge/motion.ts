import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { latticeStrain, twistOf } from './mechanics';
import { flexLength, overlapOf, pitchOf, rowPitch, type Values } from './schema';

interface Place {
  /** axis of the strip before bending and after, mm */
  readonly rest: number;
  readonly x: number;
  readonly z: number;
}

/** Axes of the strips at a twist of each link; 0 is the plain panel before the first row. */
function strips(p: Values, twist: number): Place[] {
  const pitch = rowPitch(p);
  const first = -flexLength(p) / 2 - p.linkWidth / 2;
  const places: Place[] = [{ rest: first, x: first, z: 0 }];
  for (let row = 0; row < p.rows; row += 1) {
    const { rest, x, z } = places[row]!;
    const angle = row * twist;
    places.push({ rest: rest + pitch, x: x + pitch * Math.cos(angle), z: z + pitch * Math.sin(angle) });
  }
  return places;
}

/**
 * Bends the panel up. Every row of bridges turns by the same step more than the one before; between two bridges a strip
 * turns evenly. Strain: the twist of the links, even along them, none where bridges hold.
 */
export function motion(p: Values, material: Material): Motion {
  const strain = latticeStrain(p, material.poisson.value);
  const [pitch, overlap, half] = [pitchOf(p), overlapOf(p), p.panelWidth / 2];
  const mid = p.thickness / 2;
  const first = -flexLength(p) / 2;

  /** 0 at the bridges of the odd rows (first, third), 1 at those of the even rows. */
  function along(y: number): number {
    const from = (((y + half) % pitch) + pitch) % pitch;
    return Math.max(0, Math.min(1, (Math.min(from, pitch - from) - p.bridge / 2) / overlap));
  }

  /** Strip a place belongs to; the slit before it counts half to either side. */
  const stripAt = (x: number): number =>
    Math.max(0, Math.min(p.rows, Math.floor((x - first + p.linkWidth + p.slitWidth / 2) / rowPitch(p))));

  const turnsAt = (strip: number, share: number): number => {
    if (strip === 0) return 0;
    if (strip === p.rows) return p.rows - 1;
    return strip - 1 + (strip % 2 === 1 ? share : 1 - share);
  };

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const twist = twistOf(p) * t;
    const places = strips(p, twist);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const strip = stripAt(x);
      const share = along(y);
      const angle = turnsAt(strip, share) * twist;
      const place = places[strip]!;
      const [c, s] = [Math.cos(angle), Math.sin(angle)];
      out.positions[i] = place.x + (x - place.rest) * c - (z - mid) * s;
      out.positions[i + 1] = y;
      out.positions[i + 2] = mid + place.z + (x - place.rest) * s + (z - mid) * c;
      const onLink = strip > 0 && strip < p.rows && Math.abs(x - place.rest) <= p.linkWidth / 2 + 1e-4;
      out.strain[i / 3] = onLink ? t * strain.peak * Math.min(1, 8 * share, 8 * (1 - share)) : 0;
    }
  }

  return { label: 'Bend', from: 'flat', to: `bent by ${p.bendAngle}°`, peakStrain: strain.peak, pose };
}
