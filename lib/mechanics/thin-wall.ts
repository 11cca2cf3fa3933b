import { filletConcentration } from './fillet';
import type { RootSection, Wall } from './root';

/**
 * Strain of a wall plate at the end of the root fillet, where it overtakes the arm's for walls thinner than about
 * 0.7 of the arm: 1.1 Kt(R/tw) 6 M / (E b tw^2), M = P (L + tw/2)/2 (1 - 3 (h/2 + R)/S), each side of the arm
 * carrying half the moment. `length` mm, `forcePerModulus` P/E in mm2. Wall as wide as the arm; safe side for a
 * wider one. Fitted to finite elements, within about 4 %.
 */
export function wallStrain(
  wall: Wall,
  section: RootSection,
  length: number,
  forcePerModulus: number,
): number {
  const { thickness: tw, span } = wall;
  const { thickness: h, width, fillet } = section;
  const shareAtFoot = Math.max(0, 1 - (3 * (h / 2 + fillet)) / span);
  const moment = (forcePerModulus * (length + tw / 2) * shareAtFoot) / 2;
  return (1.1 * filletConcentration(fillet / tw) * 6 * moment) / (width * tw ** 2);
}
