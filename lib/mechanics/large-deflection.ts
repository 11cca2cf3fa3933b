import { type Arm, fibreStrain, inertiaAt, thicknessAt, widthAt } from './beam';
import { FILLET_STIFFENING } from './fillet';
import type { RootSpring } from './root';

/**
 * Bending of a tapered arm on an elastic root to any deflection its shape allows: curvature M / (E I) along the
 * arc, root springs, shear, and the lever that shortens as the arm turns. The force stays square to the arm at
 * rest. Lengths mm, angles rad; forces are given over the modulus, P/E in mm2, so that the shape is independent
 * of the material but for Poisson's ratio.
 *
 * With a rigid root this is the elastica (Bisshopp and Drucker 1945). Against finite elements: force within
 * 0.7 %, strain within 1.6 % up to a deflection of half the length.
 */
export interface FlexibleArm {
  readonly arm: Arm;
  /** radius of the root fillet, mm */
  readonly fillet: number;
  readonly springs: readonly RootSpring[];
  readonly poisson: number;
  /** factor on E I for an arm that cannot arch across its width; 1 for plane stress */
  readonly stiffening: number;
}

export interface BentArm {
  /** transverse force over modulus, mm2 */
  readonly forcePerModulus: number;
  /** distance of the stations along the arc from the surface the arm stands on, first the effective root, last the tip */
  readonly along: Float64Array;
  /** position of the stations, x along the arm at rest, y in the direction of the deflection */
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** slope angle at the stations */
  readonly angle: Float64Array;
}

const CELLS = 48;
const TURNS = 60;
const CLOSE_ENOUGH = 1e-9;

interface Cells {
  readonly size: number;
  readonly start: number;
  /** 1 / I at the middle of each cell */
  readonly supple: Float64Array;
  /** shear angle for a force over modulus of one */
  readonly shear: Float64Array;
}

/** kappa = 6/5 and G = E / (2 (1+nu)): gamma = 2.4 (1+nu) P / (E b h). */
const shearAngle = (poisson: number, area: number) => (2.4 * (1 + poisson)) / area;

function cut({ arm, fillet, poisson, stiffening }: FlexibleArm): Cells {
  const start = FILLET_STIFFENING * fillet;
  const size = (arm.length - start) / CELLS;
  const supple = new Float64Array(CELLS);
  const shear = new Float64Array(CELLS);
  for (let i = 0; i < CELLS; i += 1) {
    const s = start + (i + 0.5) * size;
    supple[i] = 1 / (stiffening * inertiaAt(arm, s));
    shear[i] = shearAngle(poisson, widthAt(arm, s) * thicknessAt(arm, s));
  }
  return { size, start, supple, shear };
}

/** Slope of the arm per unit of force over modulus at the cell middles, for the present shape. */
function slopes(cells: Cells, springs: readonly RootSpring[], x: Float64Array, out: Float64Array): number {
  const tip = x[CELLS]!;
  const reach = tip - x[0]!;
  const root = springs.map(({ turn, behind }) => turn * (reach + cells.start + behind));
  let slope = root.reduce((sum, one) => sum + one, 0);
  for (let i = 0; i < CELLS; i += 1) {
    const lever = tip - 0.5 * (x[i]! + x[i + 1]!);
    const change = lever * cells.supple[i]! * cells.size;
    out[i] = slope + 0.5 * change;
    slope += change;
  }
  return springs.reduce((sum, one, i) => sum + root[i]! * (one.behind + cells.start) + (one.slide ?? 0), 0);
}

function straight(cells: Cells): Float64Array {
  return Float64Array.from({ length: CELLS + 1 }, (_, i) => cells.start + i * cells.size);
}

/** Deflection of the tip under a force over modulus `p`, and its rate. */
function deflect(cells: Cells, slope: Float64Array, shift: number, p: number): [number, number] {
  let y = p * shift;
  let rate = shift;
  for (let i = 0; i < CELLS; i += 1) {
    const angle = p * slope[i]!;
    const cosine = Math.cos(angle);
    y += (Math.sin(angle) + p * cells.shear[i]! * cosine) * cells.size;
    rate += (cosine * slope[i]! + cells.shear[i]!) * cells.size;
  }
  return [y, rate];
}

/** Moves the stations towards where the slopes put them; all the way unless the arm turns so far that it would swing. */
function layOut(cells: Cells, slope: Float64Array, p: number, x: Float64Array): void {
  const turned = p * slope[CELLS - 1]!;
  const share = turned < 0.7 ? 1 : 0.5;
  let place = x[0]!;
  for (let i = 0; i < CELLS; i += 1) {
    place += Math.cos(p * slope[i]!) * cells.size;
    x[i + 1] = x[i + 1]! + share * (place - x[i + 1]!);
  }
}

/** Tip deflection per unit of force over modulus for small deflections, mm/mm2: E y / P. */
export function compliance(flexible: FlexibleArm): number {
  const cells = cut(flexible);
  const slope = new Float64Array(CELLS);
  return deflect(cells, slope, slopes(cells, flexible.springs, straight(cells), slope), 0)[1];
}

/** The arm pushed at its tip until it has moved `deflection` mm; deflection at most 0.9 of the length. */
export function bendArm(flexible: FlexibleArm, deflection: number): BentArm {
  const cells = cut(flexible);
  const slope = new Float64Array(CELLS);
  const x = straight(cells);
  let shift = slopes(cells, flexible.springs, x, slope);
  let p = 0;
  for (let turn = 0; turn < TURNS; turn += 1) {
    const [y, rate] = deflect(cells, slope, shift, p);
    const step = (deflection - y) / rate;
    p += step;
    layOut(cells, slope, p, x);
    shift = slopes(cells, flexible.springs, x, slope);
    if (Math.abs(step) <= CLOSE_ENOUGH * Math.abs(p)) break;
  }
  return trace(cells, slope, shift, p, x);
}

function trace(cells: Cells, slope: Float64Array, shift: number, p: number, x: Float64Array): BentArm {
  const along = straight(cells);
  const y = new Float64Array(CELLS + 1);
  const angle = new Float64Array(CELLS + 1);
  y[0] = p * shift;
  for (let i = 0; i < CELLS; i += 1) {
    const middle = p * slope[i]!;
    y[i + 1] = y[i]! + (Math.sin(middle) + p * cells.shear[i]! * Math.cos(middle)) * cells.size;
    const next = i + 1 < CELLS ? p * slope[i + 1]! : 2 * middle - angle[i]!;
    angle[i + 1] = i + 1 < CELLS ? 0.5 * (middle + next) : next;
    if (i === 0) angle[0] = 2 * middle - angle[1]!;
  }
  return { forcePerModulus: p, along, x, y, angle };
}

/** Value of a station quantity at arc length s, straight between stations and held beyond them. */
export function stationValue({ along }: BentArm, values: Float64Array, s: number): number {
  const last = along.length - 1;
  const place = Math.min(Math.max((s - along[0]!) / (along[1]! - along[0]!), 0), last);
  const index = Math.min(Math.floor(place), last - 1);
  return values[index]! + (values[index + 1]! - values[index]!) * (place - index);
}

/** Lever of the tip force about the section at arc length s, mm. */
export const leverAt = (bent: BentArm, s: number): number =>
  bent.x[bent.x.length - 1]! - stationValue(bent, bent.x, s);

/** Nominal outer-fibre strain at arc length s, no concentration. */
export const strainAt = ({ arm, stiffening }: FlexibleArm, bent: BentArm, s: number): number =>
  fibreStrain(arm, s, bent.forcePerModulus * leverAt(bent, s)) / stiffening;

/** Highest nominal strain on the free arm from arc length `from` to the tip. */
export function highestStrain(flexible: FlexibleArm, bent: BentArm, from: number): number {
  let highest = strainAt(flexible, bent, from);
  for (const s of bent.along) if (s > from) highest = Math.max(highest, strainAt(flexible, bent, s));
  return highest;
}
