/**
 * Square column of a rubber-like plastic between two stiff plates that hold its ends fast.
 *
 * Handbook: bonded block, k = E A (1 + 2 S^2) / h with the shape factor S = loaded over free area = a / (4 h) (Gent &
 * Lindley, Proc. Instn. Mech. Engrs. 173 (1959) 111, from memory; published for short blocks). Shear as a beam held at
 * both ends, h^3 / (12 E I) + 1.2 h / (G A) (Timoshenko).
 *
 * Corrected: the held ends take 0.163 a out of the height that is squeezed, 0.119 a out of that which bends and 0.045 a
 * out of that which shears; fits of solid finite elements made for this project (tests/reference/rubber-column) at Poisson's
 * ratio 0.465: within 2 % for h 0.5 to 6 a. Linear, for strains up to a tenth or so.
 * Lengths mm, modulus MPa, forces N, strain as a fraction.
 */
export interface Column {
  readonly side: number;
  readonly height: number;
}

export interface Rubber {
  readonly modulus: number;
  readonly poisson: number;
}

const SQUEEZED = 0.163;
const BENT = 0.119;
const SHEARED = 0.045;
const SHEAR_AREA = 5 / 6;

const area = ({ side }: Column): number => side ** 2;
const inertia = ({ side }: Column): number => side ** 4 / 12;
const shearModulus = ({ modulus, poisson }: Rubber): number => modulus / (2 * (1 + poisson));

/** Loaded over free area. */
export const shapeFactor = ({ side, height }: Column): number => side / (4 * height);

/** Why the fits do not cover the column; null where they do. */
export function columnFault({ side, height }: Column, poisson: number): string | null {
  if (poisson < 0.44 || poisson > 0.49) {
    return "columns are covered for rubber-like plastics only, Poisson's ratio 0.44 to 0.49";
  }
  const slim = height / side;
  return slim < 0.5 || slim > 6 ? 'columns must be half to six times as high as thick' : null;
}

/** N/mm, as published for bonded blocks. */
export const bondedStiffness = (column: Column, { modulus }: Rubber): number =>
  ((modulus * area(column)) / column.height) * (1 + 2 * shapeFactor(column) ** 2);

/** Height that is squeezed, mm. */
export const squeezedHeight = ({ side, height }: Column): number => height - SQUEEZED * side;

/** N/mm, corrected. */
export const columnStiffness = (column: Column, { modulus }: Rubber): number =>
  (modulus * area(column)) / squeezedHeight(column);

/** N/mm against a sideways movement of the upper plate, which does not turn; with the fits, or plain. */
export function columnSway(column: Column, rubber: Rubber, ends: 'fitted' | 'plain' = 'fitted'): number {
  const { side, height } = column;
  const [bent, sheared] =
    ends === 'fitted' ? [height - BENT * side, height - SHEARED * side] : [height, height];
  const bending = bent ** 3 / (12 * rubber.modulus * inertia(column));
  return 1 / (bending + sheared / (SHEAR_AREA * shearModulus(rubber) * area(column)));
}

/**
 * Load at which a column gives way sideways, its ends held but the plate free to shift: Euler, pi^2 E I / h^2, with the
 * give in shear added as Engesser does (on the safe side for rubber springs).
 */
export function bucklingLoad(column: Column, rubber: Rubber): number {
  const bent = column.height - BENT * column.side;
  const euler = (Math.PI ** 2 * rubber.modulus * inertia(column)) / bent ** 2;
  const shear = SHEAR_AREA * shearModulus(rubber) * area(column);
  return 1 / (1 / euler + 1 / shear);
}
