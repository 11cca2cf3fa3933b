import type { Relation } from '../parameters';
import {
  catchFoot,
  engagement,
  footLength,
  footWidth,
  inPanel,
  leadInLength,
  plateBottom,
  slotWidth,
} from './dimensions';
import type { HookValues } from './schema';

const mm = (value: number) => `${Number(value.toFixed(2))} mm`;

const MARGIN = 0.2;

/** A fillet measures by the thickness it joins: of a standing arm its own, in a panel the width. */
const worthwhileFillet = (v: HookValues) => (inPanel(v) ? 0.1 * v.rootWidth : 0.5 * v.rootThickness);
const largestFillet = (v: HookValues) => (inPanel(v) ? v.rootWidth / 3 : v.rootThickness);

/** Least span of a panel: the arm with its fillets, or with its slots, and a thickness of panel on each side. */
const leastPanel = (v: HookValues): number => {
  const freed = v.root === 'panel-slot' ? v.rootWidth + 2 * slotWidth(v) : footWidth(v);
  return Math.max(1.6 * v.rootWidth, freed + 2 * v.rootThickness);
};

const refusals: readonly Relation<HookValues>[] = [
  {
    id: 'tip-not-thicker',
    field: 'tipThickness',
    severity: 'refuse',
    holds: (v) => v.tipThickness <= v.rootThickness,
    message: (v) => `Tip thickness must be at most the root thickness, ${mm(v.rootThickness)}`,
  },
  {
    id: 'tip-not-wider',
    field: 'tipWidth',
    severity: 'refuse',
    holds: (v) => v.tipWidth <= v.rootWidth,
    message: (v) => `Tip width must be at most the root width, ${mm(v.rootWidth)}`,
  },
  {
    id: 'fillet-leaves-an-arm',
    field: 'rootFillet',
    severity: 'refuse',
    holds: (v) => v.rootFillet <= v.armLength / 4,
    message: (v) => `Root fillet must be at most a quarter of the arm length, ${mm(v.armLength / 4)}`,
  },
  {
    id: 'undercut-in-reach',
    field: 'undercut',
    severity: 'refuse',
    holds: (v) => v.undercut <= v.armLength / 2,
    message: (v) => `Undercut must be at most half the arm length, ${mm(v.armLength / 2)}`,
  },
  {
    id: 'catch-engages',
    field: 'clearance',
    severity: 'refuse',
    holds: (v) => engagement(v) >= 0.1,
    message: (v) =>
      `Clearance must be at most ${mm(v.undercut - 0.1)}, else the catch passes by the window edge`,
  },
  {
    id: 'nose-in-proportion',
    field: 'leadInAngle',
    severity: 'refuse',
    holds: (v) => leadInLength(v) <= v.armLength,
    message: (v) =>
      `Lead-in angle must be at least ${Math.ceil((Math.atan(v.undercut / v.armLength) * 180) / Math.PI)}°, else the nose is longer than the arm, ${mm(v.armLength)}`,
  },
  {
    id: 'return-face-clears-the-fillet',
    field: 'returnAngle',
    severity: 'refuse',
    holds: (v) => catchFoot(v) >= v.rootFillet + MARGIN,
    message: (v) =>
      `Return face must leave the arm at least ${mm(v.rootFillet + MARGIN)} above the root; it leaves at ${mm(catchFoot(v))}. Use a steeper return angle`,
  },
  {
    id: 'block-carries-the-foot',
    field: 'baseLength',
    severity: 'refuse',
    holds: (v) => v.root !== 'block' || v.baseLength >= footLength(v) + MARGIN,
    message: (v) => `Base length must be at least ${mm(footLength(v) + MARGIN)}, the arm with its fillets`,
  },
  {
    id: 'block-carries-the-width',
    field: 'baseWidth',
    severity: 'refuse',
    holds: (v) => v.root !== 'block' || v.baseWidth >= v.rootWidth,
    message: (v) => `Base width must be at least the root width, ${mm(v.rootWidth)}`,
  },
  {
    id: 'wall-carries-the-foot',
    field: 'wallSpan',
    severity: 'refuse',
    holds: (v) => v.root !== 'wall' || v.wallSpan >= footLength(v) + v.rootThickness,
    message: (v) =>
      `Wall span must be at least ${mm(footLength(v) + v.rootThickness)}, the arm with its fillets and half a thickness on each side`,
  },
  {
    id: 'wall-carries-the-width',
    field: 'wallWidth',
    severity: 'refuse',
    holds: (v) => v.root !== 'wall' || v.wallWidth >= v.rootWidth,
    message: (v) => `Wall width must be at least the root width, ${mm(v.rootWidth)}`,
  },
  {
    id: 'panel-carries-the-arm',
    field: 'wallSpan',
    severity: 'refuse',
    holds: (v) => !inPanel(v) || v.wallSpan >= leastPanel(v),
    message: (v) => `Wall span must be at least ${mm(leastPanel(v))}, the arm and some panel on both sides`,
  },
  {
    id: 'panel-deep-enough',
    field: 'wallWidth',
    severity: 'refuse',
    holds: (v) => !inPanel(v) || v.wallWidth >= 0.3 * v.rootWidth,
    message: (v) => `Panel depth must be at least 0.3 of the root width, ${mm(0.3 * v.rootWidth)}`,
  },
  {
    id: 'plate-fits-under-the-catch',
    field: 'baseThickness',
    severity: 'refuse',
    holds: (v) => !v.receiver || v.root === 'panel-slot' || plateBottom(v) >= v.rootFillet + v.clearance,
    message: (v) =>
      `Base thickness, which is also the window plate's, must be at most ${mm(Math.max(0, v.baseThickness + plateBottom(v) - v.rootFillet - v.clearance))} to fit between root and catch`,
  },
];

const cautions: readonly Relation<HookValues>[] = [
  {
    id: 'tip-half-the-root',
    field: 'tipThickness',
    severity: 'warn',
    holds: (v) => v.tipThickness >= 0.5 * v.rootThickness - 1e-9,
    message: (v) =>
      `Below half the root thickness (${mm(v.rootThickness / 2)}) the highest strain leaves the root and moves up the arm`,
  },
  {
    id: 'arm-slender',
    field: 'armLength',
    severity: 'warn',
    holds: (v) => v.armLength >= 5 * v.rootThickness,
    message: (v) =>
      `An arm shorter than 5 thicknesses (${mm(5 * v.rootThickness)}) strains its root hard; 8 to 10 is better in print`,
  },
  {
    id: 'small-deflection',
    field: 'undercut',
    severity: 'warn',
    holds: (v) => v.undercut <= v.armLength / 8,
    message: (v) =>
      `Past an eighth of the arm length (${mm(v.armLength / 8)}) the plain formula drifts; see the corrected figure`,
  },
  {
    id: 'root-printable',
    field: 'rootThickness',
    severity: 'warn',
    holds: (v) => v.rootThickness >= 1.2,
    message: () => 'A root under 1.2 mm has fewer than three lines of a 0.4 mm nozzle',
  },
  {
    id: 'width-printable',
    field: 'rootWidth',
    severity: 'warn',
    holds: (v) => v.rootWidth >= 5,
    message: () => 'An arm narrower than 5 mm twists and breaks easily',
  },
  {
    id: 'fillet-worth-having',
    field: 'rootFillet',
    severity: 'warn',
    holds: (v) => v.rootFillet >= worthwhileFillet(v) - 1e-9,
    message: (v) => `A root fillet under ${mm(worthwhileFillet(v))} raises the strain at the root`,
  },
  {
    id: 'fillet-past-the-known',
    field: 'rootFillet',
    severity: 'warn',
    holds: (v) => v.rootFillet <= largestFillet(v) + 1e-9,
    message: (v) => `Past ${mm(largestFillet(v))} a larger root fillet only shortens the arm`,
  },
  {
    id: 'block-is-deep',
    field: 'baseThickness',
    severity: 'warn',
    holds: (v) => v.root !== 'block' || v.baseThickness >= 1.5 * v.rootThickness,
    message: (v) =>
      `A base under 1.5 root thicknesses (${mm(1.5 * v.rootThickness)}) bends like a wall; choose the wall plate to have that checked`,
  },
  {
    id: 'captive-land',
    field: 'landLength',
    severity: 'warn',
    holds: (v) => v.returnAngle < 80 || v.landLength >= 0.6,
    message: () => 'A catch that must hold needs a land of at least 0.6 mm',
  },
  {
    id: 'return-face-decides',
    field: 'returnAngle',
    severity: 'warn',
    holds: (v) => v.returnAngle <= 55 || v.returnAngle >= 80,
    message: () =>
      'Between 55° and 80° friction decides whether the hook opens by pulling; stay at or below 50° to open, use 90° to hold',
  },
  {
    id: 'catch-overlaps',
    field: 'clearance',
    severity: 'warn',
    holds: (v) => engagement(v) >= 0.5 * v.undercut,
    message: (v) => `The clearance leaves ${mm(engagement(v))} of overlap, less than half of the undercut`,
  },
];

export const relations: readonly Relation<HookValues>[] = [...refusals, ...cautions];
