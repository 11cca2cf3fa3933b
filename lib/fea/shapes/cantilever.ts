import type { BendingModel, Width } from '../model';
import { type Corner, outline } from '../profile/outline';
import { type Root, type RootFillets, rootCorners, rootSupports } from './root';

/** A catch on the +x face. Angles rad from the arm's axis, mm otherwise. */
export interface Catch {
  readonly height: number;
  /** length of the flat that rides over the edge */
  readonly land: number;
  readonly lead: number;
  /** angle of the holding face; pi / 2 stands square to the arm */
  readonly back: number;
}

/** An arm along +y from its root at y = 0; its front face is straight, its back face tapers. */
export interface Cantilever {
  /** root to the edge of the catch that passes last, or to the tip where there is no catch */
  readonly length: number;
  readonly thickness: number;
  readonly tipThickness: number;
  readonly catch: Catch | null;
  readonly root: Root;
  readonly fillets: RootFillets;
  readonly width: Width;
  /** how far the land is pressed towards -x, mm */
  readonly deflection: number;
}

/**
 * Share of the catch's flat, from its edge, that is pressed: an arm strains most just before its edge slips past.
 */
const PRESSED = 0.2;

/** Reach of the sharp inner corner under the catch, in tip thicknesses: strain there says nothing on so sharp a corner. */
const SHADOW = 0.5;

/** Where a tapering back face reaches its tip thickness. */
function taperEnd({ length, thickness, tipThickness }: Cantilever): Corner[] {
  if (tipThickness === thickness) return [];
  return [{ at: [thickness / 2 - tipThickness, length], tag: 'back' }];
}

function tipCorners(arm: Cantilever): Corner[] {
  const { length, thickness, tipThickness, catch: hook } = arm;
  const front = thickness / 2;
  const back = front - tipThickness;
  if (!hook) {
    return [
      { at: [front, length], tag: 'land' },
      { at: [back, length], tag: 'back' },
    ];
  }
  const peak = front + hook.height;
  const foot = length - (hook.back >= Math.PI / 2 ? 0 : hook.height / Math.tan(hook.back));
  const end = length + hook.land + hook.height / Math.tan(hook.lead);
  return [
    { at: [front, Math.max(foot - SHADOW * tipThickness, foot / 2)], tag: 'under-catch' },
    { at: [front, foot], tag: 'return' },
    { at: [peak, length], tag: 'land' },
    { at: [peak, length + PRESSED * hook.land], tag: 'flat' },
    { at: [peak, length + hook.land], tag: 'lead' },
    { at: [front, end], tag: 'end' },
    { at: [back, end], tag: 'back' },
    ...taperEnd(arm),
  ];
}

/**
 * Bending of a cantilever pressed back at its catch (or tip). Plane stress: right for arms up to a few thicknesses
 * wide; wide arms on narrow roots take factors. Throws a RangeError when the roundings do not fit.
 */
export function cantileverModel(arm: Cantilever): BendingModel {
  const corners = [...rootCorners(arm.root, arm.thickness, arm.fillets), ...tipCorners(arm)];
  return {
    profile: { loops: [outline(corners)] },
    plane: 'plane-stress',
    width: arm.width,
    mirrored: false,
    supports: rootSupports(arm.root),
    drive: { kind: 'displacement', lands: [{ tag: 'land', direction: [-1, 0] }], value: arm.deflection },
    peakTags: arm.root.kind === 'base' ? ['front', 'back', 'front-fillet', 'back-fillet'] : ['front', 'back'],
    factors: [],
  };
}
