import type { Placement, Vec3 } from './kernel';

export const IDENTITY: Placement = [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1];

export const translation = ([x, y, z]: Vec3): Placement => [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, x, y, z, 1];

/** Rotation by an angle in radians about an axis through the origin (right-hand rule). */
export function rotation(axis: 'x' | 'y' | 'z', angle: number): Placement {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  if (axis === 'x') return [1, 0, 0, 0, 0, c, s, 0, 0, -s, c, 0, 0, 0, 0, 1];
  if (axis === 'y') return [c, 0, -s, 0, 0, 1, 0, 0, s, 0, c, 0, 0, 0, 0, 1];
  return [c, s, 0, 0, -s, c, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1];
}

/** Placement that applies the last one first: compose(a, b) moves by b, then by a. */
export function compose(...placements: readonly Placement[]): Placement {
  return placements.reduce((left, right) => multiply(left, right), IDENTITY);
}

function multiply(a: Placement, b: Placement): Placement {
  const out: number[] = [];
  for (let column = 0; column < 4; column += 1) {
    for (let row = 0; row < 4; row += 1) {
      let sum = 0;
      for (let k = 0; k < 4; k += 1) sum += a[k * 4 + row]! * b[column * 4 + k]!;
      out.push(sum);
    }
  }
  return out;
}

export function movePoint(at: Placement, [x, y, z]: Vec3): Vec3 {
  return [
    at[0]! * x + at[4]! * y + at[8]! * z + at[12]!,
    at[1]! * x + at[5]! * y + at[9]! * z + at[13]!,
    at[2]! * x + at[6]! * y + at[10]! * z + at[14]!,
  ];
}

/** True for a rotation and translation: no scale, shear, mirror or perspective (to 1e-9). */
export function isRigid(at: Placement): boolean {
  if (at.length !== 16 || !at.every(Number.isFinite)) return false;
  const [x, y, z] = [0, 4, 8].map((start) => at.slice(start, start + 3) as unknown as Vec3);
  const dot = (a: Vec3, b: Vec3) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
  const products = [dot(x!, x!) - 1, dot(y!, y!) - 1, dot(z!, z!) - 1, dot(x!, y!), dot(y!, z!), dot(z!, x!)];
  const rest = [at[3]!, at[7]!, at[11]!, at[15]! - 1];
  const handed = x![0] * (y![1] * z![2] - y![2] * z![1]) - x![1] * (y![0] * z![2] - y![2] * z![0]);
  const determinant = handed + x![2] * (y![0] * z![1] - y![1] * z![0]);
  return determinant > 0 && [...products, ...rest].every((value) => Math.abs(value) < 1e-9);
}

/** The positions (xyz per vertex) of a moved body. */
export function movePositions(at: Placement, positions: Float32Array): Float32Array {
  const moved = new Float32Array(positions.length);
  for (let start = 0; start < positions.length; start += 3) {
    moved.set(movePoint(at, [positions[start]!, positions[start + 1]!, positions[start + 2]!]), start);
  }
  return moved;
}
