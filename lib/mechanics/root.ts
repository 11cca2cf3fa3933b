import { FILLET_STIFFENING } from './fillet';

/**
 * What an arm stands on gives way: the root turns under the moment and shear of the arm. Each spring turns by
 * `turn` x M / E radians (M in N mm about the spring's pivot, E in MPa) round a pivot `behind` mm inside the
 * surface the arm stands on. In the form of the finite-element fits, E b y / P = phi (L/h + beta)^2:
 * turn = phi / (b h^2), behind = beta h.
 */
export interface RootSpring {
  /** 1/mm3 */
  readonly turn: number;
  /** mm */
  readonly behind: number;
}

/** Section of the arm where it meets the root, and the fillet between them. mm. */
export interface RootSection {
  readonly thickness: number;
  readonly width: number;
  readonly fillet: number;
}

/** A wall plate the arm stands on, held along two edges `span` apart in the bending direction. mm. */
export interface Wall {
  readonly thickness: number;
  readonly span: number;
  /** along the width of the arm */
  readonly width: number;
}

const spring = (phi: number, beta: number, { thickness, width }: RootSection, raised = 0): RootSpring => ({
  turn: phi / (width * thickness ** 2),
  behind: beta * thickness - raised,
});

/** From this wall width over arm width on, the load spreads sideways into the wall. */
const SPREADS_FROM = 1.25;

const isStrip = (wallWidth: number, section: RootSection) => wallWidth < SPREADS_FROM * section.width;

/** How far from the arm's foot a fillet reaches into the wall's span, in radii for each side taken together. */
const FOOT_FILLET = 3.23;
const STRIP_FOOT = 2.13;
const PLATE_FOOT = 2.41;

/** Arm on a body deep and long against its own thickness; `width` of that body along the arm's width, mm. */
export function blockSprings(width: number, section: RootSection): readonly RootSpring[] {
  const raised = FILLET_STIFFENING * section.fillet;
  return isStrip(width, section)
    ? [spring(4.992, 0.294, section, raised)]
    : [spring(2.7126, 0.45, section, raised)];
}

function stripWall(wall: Wall, section: RootSection): RootSpring {
  const { thickness: h, fillet } = section;
  const free = Math.max(0, wall.span - STRIP_FOOT * h - FOOT_FILLET * fillet);
  return spring((0.75 * free * h ** 2) / wall.thickness ** 3, wall.thickness / (2 * h), section);
}

function plateWall(wall: Wall, section: RootSection): RootSpring {
  const { thickness: h, width: b, fillet } = section;
  const foot = h + (FOOT_FILLET / STRIP_FOOT) * fillet;
  const slender = h ** 2 / wall.thickness ** 3;
  const spreading = 0.84 * b * slender * Math.log(wall.span / (0.6722 * b + 1.3629 * foot));
  const acrossSpan = 0.75 * (wall.span - PLATE_FOOT * foot) * slender * (b / wall.width);
  return spring(Math.max(0, spreading, acrossSpan), 0.45, section);
}

/** Arm standing on a wall plate: the local turning of a block plus the bending of the plate. */
export function wallSprings(wall: Wall, section: RootSection): readonly RootSpring[] {
  const bending = isStrip(wall.width, section) ? stripWall(wall, section) : plateWall(wall, section);
  return [...blockSprings(wall.width, section), bending];
}
