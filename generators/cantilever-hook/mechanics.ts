import { type Arm, guideStrain } from '@/lib/mechanics/beam';
import {
  type BentArm,
  bendArm,
  compliance,
  type FlexibleArm,
  highestStrain,
  strainAt,
} from '@/lib/mechanics/large-deflection';
import { cornerConcentration, panelSprings } from '@/lib/mechanics/panel';
import {
  blockSprings,
  type RootSection,
  type RootSpring,
  rootSection,
  wallSprings,
  widthStiffening,
} from '@/lib/mechanics/root';
import { MOST_DEFLECTION, standingConcentration } from '@/lib/mechanics/standing-arm';
import { wallStrain } from '@/lib/mechanics/thin-wall';
import { inPanel, slotWidth } from './dimensions';
import type { HookValues } from './schema';

export const armOf = (v: HookValues): Arm => ({
  length: v.armLength,
  rootThickness: v.rootThickness,
  tipThickness: v.tipThickness,
  rootWidth: v.rootWidth,
  tipWidth: v.tipWidth,
});

/** The fillet that thickens the arm; in a panel it lies in the plane and widens the foot instead. */
const thickeningFillet = (v: HookValues): number => (inPanel(v) ? 0 : v.rootFillet);

const sectionOf = (v: HookValues, poisson: number): RootSection => ({
  ...rootSection(armOf(v), thickeningFillet(v), poisson),
  fillet: v.rootFillet,
});

const wallOf = (v: HookValues) => ({ thickness: v.wallThickness, span: v.wallSpan, width: v.wallWidth });

const panelOf = (v: HookValues) => ({
  span: v.wallSpan,
  depth: v.wallWidth,
  slot: v.root === 'panel-slot' ? slotWidth(v) : null,
});

function springsOf(v: HookValues, poisson: number): readonly RootSpring[] {
  const section = sectionOf(v, poisson);
  if (v.root === 'wall') return wallSprings(wallOf(v), section);
  if (inPanel(v)) return panelSprings(panelOf(v), section);
  return blockSprings(v.baseWidth, section);
}

/** The arm on what it stands on, for a Poisson's ratio. */
export const flexibleArm = (v: HookValues, poisson: number): FlexibleArm => ({
  arm: armOf(v),
  fillet: thickeningFillet(v),
  springs: springsOf(v, poisson),
  poisson,
  stiffening: widthStiffening(armOf(v), poisson),
});

/** Strains of the arm bent by some deflection at its tip; all fractions, tension positive. */
export interface HookStrain {
  readonly deflection: number;
  readonly bent: BentArm;
  /** nominal outer-fibre strain where the root fillet ends: sets the working modulus */
  readonly nominal: number;
  /** the same with the concentration of the fillet */
  readonly fillet: number;
  /** highest on the arm: at the fillet or further along */
  readonly arm: number;
  /** at the fillet's end in the wall; null where the arm does not stand on a wall */
  readonly wall: number | null;
}

/** Peak over nominal strain where the fillet ends; infinite where there is none. */
function concentration(v: HookValues, flexible: FlexibleArm): number {
  if (!inPanel(v)) return standingConcentration(armOf(v), v.rootFillet, flexible.poisson);
  return flexible.stiffening * cornerConcentration(panelOf(v), sectionOf(v, flexible.poisson), v.armLength);
}

export function strainOf(v: HookValues, flexible: FlexibleArm, deflection: number): HookStrain {
  const bent = bendArm(flexible, deflection);
  const nominal = strainAt(flexible, bent, v.rootFillet);
  const atFillet = concentration(v, flexible) * nominal;
  const alongArm = highestStrain(flexible, bent, v.rootFillet);
  const wall =
    v.root === 'wall'
      ? wallStrain(wallOf(v), sectionOf(v, flexible.poisson), v.armLength, bent.forcePerModulus)
      : null;
  return { deflection, bent, nominal, fillet: atFillet, arm: Math.max(atFillet, alongArm), wall };
}

/** Infinite where the root is sharp. */
export const peakOf = (strain: HookStrain): number => Math.max(strain.arm, strain.wall ?? 0);

/** Deflection in mm at which the peak strain reaches `allowed`; null past the reach of the formulas. */
export function permissibleDeflection(v: HookValues, flexible: FlexibleArm, allowed: number): number | null {
  const furthest = MOST_DEFLECTION * v.armLength;
  let y = Math.min(allowed / guideStrain(armOf(v), 1), furthest);
  for (let turn = 0; turn < 12; turn += 1) {
    const next = Math.min((y * allowed) / peakOf(strainOf(v, flexible, y)), furthest);
    if (Math.abs(next - y) < 1e-6 * y) return next < furthest ? next : null;
    y = next;
  }
  return null;
}

/** Share of the tip's give that comes from the root turning, 0 to 1. */
export function rootShare(flexible: FlexibleArm): number {
  return 1 - compliance({ ...flexible, springs: [] }) / compliance(flexible);
}

/** The plain formulas are not used past this deflection over length (common practice). */
export const GUIDE_MOST_DEFLECTION = 0.3;

export const slenderness = (v: HookValues): number => v.armLength / v.rootThickness;
export const deflectionRatio = (v: HookValues): number => v.undercut / v.armLength;
