import { ArmPath } from '@/lib/mechanics/curved-beam';
import { FILLET_STIFFENING } from '@/lib/mechanics/fillet';
import { meanBend, returnRun, type Values } from './schema';

/** Where the force acts: middle of the land, from the end of the bend, mm. */
export const loadOnLeg = (p: Values): number => p.freeLeg - returnRun(p) - p.landLength / 2;

export interface Centreline {
  readonly stations: ReturnType<ArmPath['build']>['stations'];
  readonly tip: { readonly x: number; readonly y: number };
  /** length of root leg that bends, mm: the fillet stiffens its foot */
  readonly rootLength: number;
}

/**
 * Centre line from the base to the point of the force. U: the base at y = 0, root leg up, free leg down beside it at
 * +x. L: the wall at x = 0, root leg along +x, free leg up. The force pushes towards -x.
 */
export function centreline(p: Values, fillet = true): Centreline {
  const skipped = fillet ? Math.min(FILLET_STIFFENING * p.rootFillet, p.rootLeg * 0.8) : 0;
  const rootLength = p.rootLeg - skipped;
  const thickness = () => p.thickness;
  const { stations, tip } =
    p.shape === 'u'
      ? new ArmPath(0, skipped, Math.PI / 2, thickness)
          .straight(rootLength, 24)
          .turn(-Math.PI, meanBend(p), 64)
          .straight(loadOnLeg(p), 24)
          .build()
      : new ArmPath(skipped, 0, 0, thickness)
          .straight(rootLength, 24)
          .turn(Math.PI / 2, meanBend(p), 40)
          .straight(loadOnLeg(p), 24)
          .build();
  return { stations, tip, rootLength };
}
