import { type Arm, thicknessAt } from './beam';
import { FILLET_STIFFENING } from './fillet';
import { heldShare, plateGive } from './poisson';
import { plateTurn, type Wall } from './wall-plate';

/**
 * What an arm stands on gives way: the root turns under the moment and shear of the arm. Each spring turns by
 * `turn` x M / E radians (M in N mm about the spring's pivot, E in MPa) round a pivot `behind` mm inside the
 * surface the arm stands on; `slide` x P / E is a shift without turning. In the form E b y / P = phi (L/h + beta)^2:
 * turn = phi / (b h^2), behind = beta h.
 *
 * Constants fitted to finite elements of arms 0.5 to 6 times as wide as thick, sharp and filleted, on blocks and walls
 * of every width: force of 151 solid models within 3.2 %, of 144 plane ones with tapers within 4 %.
 */
export interface RootSpring {
  /** 1/mm3 */
  readonly turn: number;
  /** mm */
  readonly behind: number;
  /** 1/mm; left out where the root does not shift */
  readonly slide?: number;
}

/** Section of the arm where its root begins to give, the fillet between them, mm, and Poisson's ratio. */
export interface RootSection {
  readonly thickness: number;
  readonly width: number;
  readonly fillet: number;
  readonly poisson: number;
}

/** The section a tapered arm has where it begins to bend, a share of the fillet above its base. */
export const rootSection = (arm: Arm, fillet: number, poisson: number): RootSection => ({
  thickness: thicknessAt(arm, FILLET_STIFFENING * fillet),
  width: arm.rootWidth,
  fillet,
  poisson,
});

/** phi of an arm on a body no wider than itself, and on one wide to both sides. */
const PHI_STRIP = 5.07;
const phiWide = ({ thickness: h, width: b, poisson }: RootSection) =>
  plateGive(poisson) * ((4.5 * b) / (b + 0.28 * h));

/**
 * Turning of the body right under the arm. `bodyWidth` along the arm's width, mm; from the strip value to the wide
 * one as the load finds room to spread sideways. Same form as the elastic support of O'Donnell, J. Appl. Mech. 27
 * (1960) 461, whose wide value 5.3 (1 - nu^2) it meets.
 */
function localSpring(bodyWidth: number, section: RootSection): RootSpring {
  const { thickness: h, width: b, fillet } = section;
  const wide = phiWide(section);
  const confined = (b / Math.max(b, bodyWidth)) ** (2.8 * (b / h) ** 0.3);
  const phi = wide + (PHI_STRIP - wide) * confined;
  const rounded = Math.min(1, fillet / (0.1 * h));
  const beta = 0.039 + (0.516 - 0.353 * confined) * rounded;
  return { turn: phi / (b * h ** 2), behind: beta * h - FILLET_STIFFENING * fillet };
}

/** Arm on a body deep and long against its own thickness. */
export const blockSprings = (bodyWidth: number, section: RootSection): readonly RootSpring[] => [
  localSpring(bodyWidth, section),
];

/** Arm standing on a wall plate: the turning of the body under it and the bending of the plate. */
export const wallSprings = (wall: Wall, section: RootSection): readonly RootSpring[] => [
  localSpring(wall.width, section),
  { turn: plateTurn(wall, section), behind: wall.thickness / 2 },
];

/** How fast each side of an arm closes in from root to tip, mm per mm. */
export const narrowingSlope = (arm: Arm): number => (arm.rootWidth - arm.tipWidth) / (2 * arm.length);

/**
 * A wide arm held at its root cannot arch across its width there and bends as a stiffer one; sides that close in carry
 * less than plane sections say. Factor on E I: [1 + 0.14 (nu/0.35)^2 r / (r + 0.95)] / (1 + 0.5 m^2), r mean width over length up
 * to 2, m the slope of the sides up to 0.3. Fitted to finite elements, within 0.4 % at even width, 2 % with a taper.
 */
export function widthStiffening(arm: Arm, poisson: number): number {
  const ratio = (arm.rootWidth + arm.tipWidth) / (2 * arm.length);
  return (1 + (0.14 * heldShare(poisson) * ratio) / (ratio + 0.95)) / (1 + 0.5 * narrowingSlope(arm) ** 2);
}
