import type { BendingModel } from '../model';
import { outline } from '../profile/outline';
import { arc, line, type Segment } from '../profile/segment';
import { type Root, type RootFillets, rootCorners, rootSupports } from './root';

/** An arm that goes up from its root, round a half circle and down again, of even thickness. mm. */
export interface UArm {
  /** root to the start of the bend */
  readonly rise: number;
  /** bend to the free end */
  readonly fall: number;
  /** inner radius of the bend */
  readonly bend: number;
  readonly thickness: number;
  readonly root: Root;
  readonly fillets: RootFillets;
  readonly width: number;
  /** how far the free end is drawn away from the rising leg, mm; negative pushes it closer */
  readonly opening: number;
}

const CUT = 'cut';

/** Bend and falling leg, in place of the straight edge across the top of the rising leg. */
function upperPart({ rise, fall, bend, thickness }: UArm): Segment[] {
  const half = thickness / 2;
  const x = 2 * bend + thickness;
  const end = rise - fall;
  return [
    arc([x / 2, rise], bend, Math.PI, -Math.PI, 'bend-inside'),
    line([x - half, rise], [x - half, end], 'inside'),
    line([x - half, end], [x + half, end], 'land'),
    line([x + half, end], [x + half, rise], 'outside'),
    arc([x / 2, rise], bend + thickness, 0, Math.PI, 'bend-outside'),
  ];
}

/** Bending of a U-shaped arm pulled open, or pushed shut, at its free end. Throws a RangeError if roundings overlap. */
export function uArmModel(arm: UArm): BendingModel {
  const half = arm.thickness / 2;
  const straight = outline([
    ...rootCorners(arm.root, arm.thickness, arm.fillets),
    { at: [half, arm.rise], tag: CUT },
    { at: [-half, arm.rise], tag: 'back' },
  ]);
  const loop = straight.flatMap((segment) => (segment.tag === CUT ? upperPart(arm) : [segment]));
  return {
    profile: { loops: [loop] },
    plane: 'plane-stress',
    width: { kind: 'even', width: arm.width },
    mirrored: false,
    supports: rootSupports(arm.root),
    drive: { kind: 'displacement', lands: [{ tag: 'land', direction: [1, 0] }], value: arm.opening },
    peakTags: ['bend-inside', 'bend-outside', 'front-fillet', 'back-fillet'],
    factors: [],
  };
}
