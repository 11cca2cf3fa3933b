import type { BendingModel } from '../model';
import { outline } from '../profile/outline';

/** A round tube spread from inside by a ring of pressure. mm. */
export interface Tube {
  readonly innerRadius: number;
  readonly wall: number;
  readonly length: number;
  /** from the end at y = 0 to the middle of the pressed band */
  readonly pressedAt: number;
  /** height of the pressed band */
  readonly band: number;
  /** radial growth of the band */
  readonly growth: number;
}

/** Spreading of a tube by a bead. The force is the radial load summed round the turn. */
export function tubeModel(tube: Tube): BendingModel {
  const { innerRadius: inner, wall, length } = tube;
  const low = Math.max(0, tube.pressedAt - tube.band / 2);
  const high = low + tube.band;
  const below = low > 1e-6 * length ? [{ at: [inner, low] as const, tag: 'bore' }] : [];
  const corners = [
    { at: [inner, 0] as const, tag: 'end' },
    { at: [inner + wall, 0] as const, tag: 'outside' },
    { at: [inner + wall, length] as const, tag: 'far' },
    { at: [inner, length] as const, tag: 'bore' },
    { at: [inner, high] as const, tag: 'land', size: tube.band / 2 },
    ...below,
  ];
  return {
    profile: { loops: [outline(corners)] },
    plane: 'axisymmetric',
    width: { kind: 'even', width: 1 },
    mirrored: false,
    supports: [{ corner: [inner + wall, length], fix: 'y' }],
    drive: { kind: 'displacement', lands: [{ tag: 'land', direction: [1, 0] }], value: tube.growth },
    peakTags: ['bore', 'outside', 'end', 'land'],
    factors: [],
  };
}
