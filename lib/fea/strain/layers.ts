import type { Mesh } from '../mesh/mesh';
import type { Point } from '../profile/segment';
import type { SurfaceStrain } from './surface';

/** Allowable strains of a printed plastic as fractions; null: not known. */
export interface LayerAllowable {
  readonly along: number | null;
  readonly across: number | null;
  /** direction across the layers, rad from x */
  readonly normal: number;
}

/**
 * Allowable strain at an angle (rad) between the strain and the layer normal:
 * along x across / (along cos^2 + across sin^2); equals `across` at 0 and `along` at 90 degrees.
 * Source: Hankinson's formula for strength at an angle to the grain (Wood Handbook, from memory), taken over to
 * layers without a test of its own: an assumption. Valid for across <= along.
 */
export function allowableAtAngle(along: number, across: number, angle: number): number {
  const c = Math.cos(angle) ** 2;
  return (along * across) / (along * c + across * (1 - c));
}

/** Where the tension uses up most of what the layers allow in its direction. */
export interface LayerVerdict {
  readonly strain: number;
  readonly allowable: number;
  /** strain / allowable */
  readonly share: number;
  readonly place: Point;
  /** angle between the strain and the layer normal, rad, 0 to pi / 2 */
  readonly angle: number;
}

/**
 * Worst tension against the direction-dependent allowable, over the searched edges. Null when an allowable is not
 * known. Compression presses the layers together and is not counted.
 */
export function layerVerdict(
  mesh: Mesh,
  strain: SurfaceStrain,
  allowed: LayerAllowable,
): LayerVerdict | null {
  const { along, across, normal } = allowed;
  if (along === null || across === null) return null;
  let worst: LayerVerdict | null = null;
  for (let node = 0; node < mesh.nodeCount; node++) {
    const here = strain.along[node]!;
    if (!(here > 0)) continue;
    const cosine =
      Math.cos(normal) * strain.tangent[2 * node]! + Math.sin(normal) * strain.tangent[2 * node + 1]!;
    const angle = Math.acos(Math.min(1, Math.abs(cosine)));
    const allowable = allowableAtAngle(along, across, angle);
    const share = here / allowable;
    if (worst && share <= worst.share) continue;
    worst = {
      strain: here,
      allowable,
      share,
      place: [mesh.nodes[2 * node]!, mesh.nodes[2 * node + 1]!],
      angle,
    };
  }
  return worst;
}
