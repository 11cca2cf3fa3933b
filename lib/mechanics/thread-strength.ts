import type { Material, Source } from '@/lib/materials/types';
import { flankSpread, internalThread, type ThreadBasics } from './thread';

export interface StrippingAreas {
  /** shear area of the neck's ridges at the cap's crest, mm2 */
  readonly external: number;
  /** shear area of the cap's ridges at the neck's crest, mm2 */
  readonly internal: number;
}

/**
 * Areas sheared when a thread strips, mm2, for an axial engaged length Le (mm):
 * As_s = pi/P Le D1 (P/2 + t (d2 - D1)), As_n = pi/P Le d (P/2 + t (d - D2)), t = (tan b1 + tan b2)/2,
 * with the true D1 and D2 of a cap opened by `clearance` per side. Clearance 0 gives the basic-size shortcuts,
 * 0.750 pi D1 Le and 0.875 pi d Le for the metric profile.
 * Never below zero: a cap that no longer reaches the neck shears nothing. Source: FED-STD-H28 (as quoted).
 */
export function strippingAreas(
  thread: ThreadBasics,
  clearance: number,
  engagedLength: number,
): StrippingAreas {
  const { pitch, majorDiameter: d, pitchDiameter: d2 } = thread;
  const cap = internalThread(thread, clearance);
  if (cap.minorDiameter >= d) return { external: 0, internal: 0 };
  const slope = flankSpread(thread) / 2;
  const ring = (Math.PI / pitch) * engagedLength;
  const external = ring * cap.minorDiameter * (pitch / 2 + slope * (d2 - cap.minorDiameter));
  const internal = ring * d * (pitch / 2 + slope * (d - cap.pitchDiameter));
  return { external: Math.max(0, external), internal: Math.max(0, internal) };
}

export interface LayerStrength {
  /** MPa */
  readonly value: number;
  readonly low: number;
  readonly because: string;
  readonly source: Source;
}

const WITHOUT_DATA: Source = {
  text: 'Strength between layers 0.3 of that along them where no figure is known',
  mark: 'common-practice',
};
/** Share of the strength along the layers that holds between them, without data. */
const LAYER_SHARE = 0.3;

/**
 * Tensile strength in MPa of a part pulled along its print axis: across the layers, or 0.3 of the strength along them
 * where that is not known; the tensile strength of a moulded part. Null when no strength is known.
 */
export function axialStrength(material: Material): LayerStrength | null {
  const { tensileStrength: along, tensileStrengthAcross: across, shortName } = material;
  if (material.process === 'printed' && across) {
    const because = `${shortName} bears ${across.value} MPa across the layers`;
    return { value: across.value, low: across.low ?? across.value, because, source: across.source };
  }
  if (!along) return null;
  const low = along.low ?? along.value;
  if (material.process === 'moulded') {
    const because = `moulded ${shortName} bears ${along.value} MPa`;
    return { value: along.value, low, because, source: along.source };
  }
  const because = `taken as ${LAYER_SHARE} of the ${along.value} MPa that ${shortName} bears along the layers`;
  return { value: LAYER_SHARE * along.value, low: LAYER_SHARE * low, because, source: WITHOUT_DATA };
}

/** Shear strength over tensile strength, distortion energy. */
const SHEAR_SHARE = 0.577;

/**
 * Shear strength in MPa of a thread whose axis stands on the bed, so that stripping slides one layer on the next:
 * 0.577 of the strength across the layers; where only the strength along them is known, 0.3 of it.
 */
export function threadShearStrength(material: Material): LayerStrength | null {
  const axial = axialStrength(material);
  if (!axial || axial.source === WITHOUT_DATA) return axial;
  const because = `0.577 of its tensile strength in shear: ${axial.because}`;
  return { ...axial, value: SHEAR_SHARE * axial.value, low: SHEAR_SHARE * axial.low, because };
}

/** Part of the shear area that holds in a print: voids, and a first turn that bears more than its share. */
export const PRINTED_THREAD_SHARE = { low: 0.5, value: 0.6, high: 0.7 } as const;

/** Knock-down on the shear area, 1 for moulded parts. */
export const threadShare = (material: Material) =>
  material.process === 'printed' ? PRINTED_THREAD_SHARE : { low: 1, value: 1, high: 1 };

/** Load in N at which the weaker of the two threads strips, before the knock-down. */
export const strippingLoad = (areas: StrippingAreas, shearStrength: number): number =>
  Math.min(areas.external, areas.internal) * shearStrength;

/**
 * Radial growth in mm of a cap wall when the load F (N) wedges the flanks apart: the flanks press outward with
 * F tan b in all, a hoop pull of F tan b / (2 pi) in the wall of section A (mm2), u = F tan b r / (2 pi E A).
 * Thin ring, no help from the cap's top (on the safe side). Source: equilibrium of a thin ring.
 */
export function capSpread(given: {
  readonly load: number;
  readonly flank: number;
  readonly meanRadius: number;
  readonly section: number;
  readonly modulus: number;
}): { readonly hoopStrain: number; readonly growth: number } {
  const hoopStrain = (given.load * Math.tan(given.flank)) / (2 * Math.PI * given.section * given.modulus);
  return { hoopStrain, growth: hoopStrain * given.meanRadius };
}
