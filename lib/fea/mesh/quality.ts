import type { Mesh } from './mesh';

/** Angle at a between the straight lines to b and c, rad. */
function angleAt(nodes: Float64Array, a: number, b: number, c: number): number {
  const ux = nodes[2 * b]! - nodes[2 * a]!;
  const uy = nodes[2 * b + 1]! - nodes[2 * a + 1]!;
  const vx = nodes[2 * c]! - nodes[2 * a]!;
  const vy = nodes[2 * c + 1]! - nodes[2 * a + 1]!;
  return Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy);
}

/** Smallest corner angle of any element, rad, measured between straight edges; negative if one is inverted. */
export function smallestAngle({ nodes, elements, elementCount }: Mesh): number {
  let smallest = Math.PI;
  for (let e = 0; e < elementCount; e++) {
    for (let k = 0; k < 3; k++) {
      const [a, b, c] = [k, (k + 1) % 3, (k + 2) % 3].map((i) => elements[6 * e + i]!);
      smallest = Math.min(smallest, angleAt(nodes, a!, b!, c!));
    }
  }
  return smallest;
}
