import { heldShare, plateGive } from './poisson';
import type { RootSection } from './root';

/** A wall plate held along two edges `span` apart in the bending direction of the arm standing on it. mm. */
export interface Wall {
  readonly thickness: number;
  readonly span: number;
  /** along the width of the arm */
  readonly width: number;
}

/** Free span lost under the arm's foot, in arm thicknesses and fillet radii. */
const FOOT = 2.05;
const FOOT_FILLET = 3.23;
/** How fast short waves of the load fade into the thickness of the foot. */
const FADING = 0.587;
const PLATE_SHARE = 0.848;
/** A waviness below this share of the whole no longer counts. */
const NEGLIGIBLE = 1e-5;
const MOST_WAVES = 400;

/**
 * Slope at a line moment of one in the middle of a strip held at both ends, for waves of number k across it, times
 * the plate stiffness: (sinh^2 K - K^2) / (4 k (sinh K cosh K - K)), K = k S / 2. S/16 as k goes to 0, 1/(4k) for
 * short waves. Exact for a thin plate.
 */
function waveTurn(k: number, span: number): number {
  const big = (k * span) / 2;
  if (big > 15) return 1 / (4 * k);
  const sinh = Math.sinh(big);
  return (sinh ** 2 - big ** 2) / (4 * k * (sinh * Math.cosh(big) - big));
}

/** The part of the load that is not even across the wall, summed over its waves. */
function spreading(span: number, width: number, b: number, foot: number): number {
  let sum = 0;
  for (let n = 1; n <= MOST_WAVES; n += 1) {
    const k = (2 * Math.PI * n) / width;
    const q = (Math.PI * n * b) / width;
    const size = 2 * waveTurn(k, span) * Math.exp(-FADING * k * foot);
    sum += size * (Math.sin(q) / q) ** 2;
    if (size / q ** 2 < NEGLIGIBLE * sum) break;
  }
  return sum;
}

/** A wall wide against its span cannot arch across its width and is stiffer; a narrow strip is a plain beam. */
const archingShare = ({ thickness, span }: Wall, width: number, poisson: number): number =>
  1 - (0.305 * heldShare(poisson) * width ** 2) / ((width + thickness) * (width + 0.447 * span));

/**
 * Turning of a thin plate, held along two edges, under the moment of an arm b wide and h thick with fillet R in its
 * middle, in 1/mm3 (x M / E is the angle). The moment, even over b, is split into cosine waves across the wall; the
 * even part bends the wall as a beam of span S - 2.05 h - 3.23 R.
 * Constants fitted to finite elements: tw/h 0.5 to 3, S/h 8 to 40, W/b 1 to 16; force within 3.2 %.
 */
export function plateTurn(wall: Wall, section: RootSection): number {
  const { thickness: h, width: b, fillet, poisson } = section;
  const { thickness: tw, span } = wall;
  const width = Math.max(wall.width, b);
  const even = Math.max(0, span - FOOT * h - FOOT_FILLET * fillet) / 16;
  const waves = spreading(span, width, b, h + (FOOT_FILLET / FOOT) * fillet);
  return (
    (12 * (even * archingShare(wall, width, poisson) + PLATE_SHARE * plateGive(poisson) * waves)) /
    (tw ** 3 * width)
  );
}
