/** A wall plate held along two edges `span` apart in the bending direction of the arm standing on it. mm. */
export interface Wall {
  readonly thickness: number;
  readonly span: number;
  /** along the width of the arm */
  readonly width: number;
}

/** Free span lost under the arm's foot, in arm thicknesses and fillet radii. */
const FOOT = 2.15;
const FOOT_FILLET = 3.22;
/** How fast short waves of the load fade into the thickness of the foot. */
const FADING = 0.6;
const PLATE_SHARE = 0.875;
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

/**
 * Turning of a thin plate, held along two edges, under the moment of an arm b wide and h thick with fillet R in its
 * middle, in 1/mm3 (x M / E is the angle). The moment, even over b, is split into cosine waves across the wall; the
 * even part bends the wall as a beam of span S - 2.15 h - 3.22 R.
 * Constants fitted to finite elements: tw/h 0.5 to 3, S/h 8 to 40, W/b 1 to 16; force within 2 %.
 */
export function plateTurn(wall: Wall, b: number, h: number, fillet: number): number {
  const { thickness: tw, span } = wall;
  const width = Math.max(wall.width, b);
  const even = Math.max(0, span - FOOT * h - FOOT_FILLET * fillet) / 16;
  const heldWidth = 1 - (0.468 * width) / (width + 1.05 * span);
  const waves = spreading(span, width, b, h + (FOOT_FILLET / FOOT) * fillet);
  return (12 * (even * heldWidth + PLATE_SHARE * waves)) / (tw ** 3 * width);
}
