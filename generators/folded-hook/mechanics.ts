import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { type ArmSolution, type Elastic, solveArm } from '@/lib/mechanics/curved-beam';
import { filletConcentration } from '@/lib/mechanics/fillet';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { blockSprings } from '@/lib/mechanics/root';
import { type Centreline, centreline, loadOnLeg } from './path';
import { meanBend, type Values } from './schema';

/** Movement of the catch over the developed length of the arm up to which small deflection was taken. */
export const DEFLECTION_LIMIT = 0.2;

const INWARD = Math.PI;

export interface FoldedArm {
  readonly line: Centreline;
  readonly solved: ArmSolution;
  /** root turn per N, rad */
  readonly rootTurn: number;
  /** mm per N, root included */
  readonly compliance: number;
}

/** The arm on its yielding base under a unit force at the catch. */
export function solveFolded(p: Values, elastic: Elastic): FoldedArm {
  const line = centreline(p);
  const solved = solveArm(line.stations, line.tip, INWARD, elastic);
  const section = {
    thickness: p.thickness,
    width: elastic.width,
    fillet: p.rootFillet,
    poisson: elastic.poisson,
  };
  const turn = blockSprings(p.baseWidth, section).reduce((sum, spring) => sum + spring.turn, 0);
  const rootTurn = (turn * solved.rootMoment) / elastic.modulus;
  return { line, solved, rootTurn, compliance: solved.compliance + rootTurn * solved.rootMoment };
}

export interface FoldedStrain {
  /** largest on the inside of the bend, at the whole undercut */
  readonly bend: number;
  /** at the end of the root fillet */
  readonly root: number;
  readonly peak: number;
  readonly handbook: number;
  /** a straight arm of the same height with the same undercut, root fillet left out */
  readonly straight: number;
  /** movement of the catch over developed length */
  readonly slenderMove: number;
}

/** Exact thin-beam compliance of the handbook times E I, mm3, and lever of its largest moment, mm. */
function thinArm(p: Values): { compliance: number; lever: number } {
  const [l1, l2, r] = [p.rootLeg, loadOnLeg(p), meanBend(p)];
  if (p.shape === 'l') {
    const [leg, root] = [l2 + r, l1 + r];
    return { compliance: leg ** 2 * (leg / 3 + root), lever: leg };
  }
  const bend = r * (Math.PI * l2 ** 2 + 4 * l2 * r + (Math.PI * r ** 2) / 2);
  return { compliance: l2 ** 3 / 3 + bend + (l2 ** 3 - (l2 - l1) ** 3) / 3, lever: l2 + r };
}

const UNIT: Elastic = { modulus: 1, poisson: 0.35, width: 1 };

export function foldedStrain(p: Values): FoldedStrain {
  const elastic = { ...UNIT, width: p.armWidth };
  const { line, solved, compliance } = solveFolded(p, elastic);
  const force = p.undercut / compliance;
  const largest = solved.strain.reduce((most, { left, right }, i) => {
    const curved = line.stations[i]!.curvature !== 0;
    return curved ? Math.max(most, Math.abs(left), Math.abs(right)) : most;
  }, 0);
  const foot = solved.strain.find((_, i) => awayFromRoot(p, line, i) >= p.rootFillet)!;
  const nominal = Math.max(Math.abs(foot.left), Math.abs(foot.right));
  const ratio = Math.min(1, Math.max(0.1, p.rootFillet / p.thickness));
  const bend = largest * force;
  const root = nominal * force * filletConcentration(ratio);
  const thin = thinArm(p);
  const height = p.shape === 'u' ? p.rootLeg + meanBend(p) : loadOnLeg(p) + meanBend(p);
  const developed = line.stations.reduce((sum, { ds }) => sum + ds, 0);
  return {
    bend,
    root,
    peak: Math.max(bend, root),
    handbook: (p.undercut * thin.lever * p.thickness) / (2 * thin.compliance),
    straight: (1.5 * p.thickness * p.undercut) / height ** 2,
    slenderMove: p.undercut / developed,
  };
}

/** Distance of a station from the surface of the base, mm. */
function awayFromRoot(p: Values, line: Centreline, index: number): number {
  const station = line.stations[index]!;
  return p.shape === 'u' && index < 24 ? station.y : index < 24 ? station.x : Number.POSITIVE_INFINITY;
}

export interface Banded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

export interface FoldedForces {
  readonly across: number;
  readonly handbookAcross: number;
  readonly mating: Banded;
  readonly handbookMating: number;
  readonly separation: Banded;
  readonly handbookSeparation: number;
  readonly inRange: boolean;
}

/** Forces with the secant modulus at the peak strain; null where the modulus is not known. */
export function foldedForces(p: Values, material: Material): FoldedForces | null {
  const secant = secantModulus(material, foldedStrain(p).peak);
  if (!secant) return null;
  const elastic = { modulus: secant.value, poisson: material.poisson.value, width: p.armWidth };
  const across = p.undercut / solveFolded(p, elastic).compliance;
  const inertia = (p.armWidth * p.thickness ** 3) / 12;
  const handbookAcross = (p.undercut * secant.value * inertia) / thinArm(p).compliance;
  const { value, low, high } = material.friction;
  const along = (angle: number): Banded => ({
    value: across * wedgeFactor(value, angle),
    low: across * wedgeFactor(low, angle),
    high: across * wedgeFactor(high, angle),
  });
  return {
    across,
    handbookAcross,
    mating: along(p.leadInAngle),
    handbookMating: handbookAcross * wedgeFactor(value, p.leadInAngle),
    separation: along(p.returnAngle),
    handbookSeparation: handbookAcross * wedgeFactor(value, p.returnAngle),
    inRange: secant.inRange,
  };
}
