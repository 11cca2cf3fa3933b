import { filletConcentration } from './fillet';
import { plateGive } from './poisson';
import type { RootSection } from './root';
import type { Wall } from './wall-plate';

const MOST_WAVES = 60;
const PLATE_SHARE = 0.9;
/** The ends of a wide foot take more than their share where the wall goes on past them. */
const FOOT_ENDS = 0.2;

/**
 * Bending moment of the wall along the end of the arm's foot, per unit of width, for a moment of one carried by that
 * side: 1/b in a wall as wide as the arm, less where the load spreads sideways. Cosine waves across a thin plate, a
 * wave of number k falling as (1 - k x/2) e^(-k x) from the middle; derived here.
 */
function momentAtFoot(wall: Wall, { thickness, width: b, fillet, poisson }: RootSection): number {
  const foot = thickness / 2 + fillet;
  const width = Math.max(wall.width, b);
  const spread = 1 - b / width;
  const give = plateGive(poisson);
  let sum = Math.max(0, 1 - (3 * foot) / wall.span) * (1 + (give - 1) * spread);
  for (let n = 1; n <= MOST_WAVES; n += 1) {
    const far = (2 * Math.PI * n * foot) / width;
    if (far > 12) break;
    const q = (Math.PI * n * b) / width;
    sum += 2 * PLATE_SHARE * give * (Math.sin(q) / q) * (1 - far / 2) * Math.exp(-far);
  }
  const ends = 1 + FOOT_ENDS * Math.max(0, 1 - (1.5 * (b / width)) ** 2);
  return (Math.max(0, sum) * ends) / width;
}

/**
 * Strain of a wall plate at the end of the root fillet, where it overtakes the arm's in walls thinner than about 0.7
 * of the arm: 1.1 Kt(R/tw) 6 m / (E tw^2), m = P (L + tw/2)/2 x the moment at the foot per unit of width. `length` mm,
 * `forcePerModulus` P/E in mm2. Fitted to finite elements: within 9 %, from strips to walls eight times as wide as the arm.
 */
export function wallStrain(
  wall: Wall,
  section: RootSection,
  length: number,
  forcePerModulus: number,
): number {
  const { thickness: tw } = wall;
  const { fillet } = section;
  const carried = (forcePerModulus * (length + tw / 2)) / 2;
  const moment = carried * momentAtFoot(wall, section);
  return (1.1 * filletConcentration(fillet / tw) * 6 * moment) / tw ** 2;
}
