/**
 * Elastica of a hinge web folded by 180 degrees between parallel leaves whose faces force the two web exits to a
 * separation s. Inextensible web of length L, thin beam, no self-contact.
 *
 * With the squeezing force along the separation the first integral is kappa^2 = a + b sin(theta), theta from 0 to pi
 * along the web, so L = int dtheta/kappa and s = int sin(theta) dtheta/kappa. Three branches in the shape parameter:
 * wider than the free fold (b < 0), squeezed (b > 0) and squeezed with inflections at the exits (theta starts at
 * -alpha). Free fold: b = 0, s/L = 2/pi. Source: Euler's elastica, derived here; against the tabulated elastica of the
 * finite-element reference within 2 %.
 */

/** Curvatures in units of pi/L, the free fold's own. */
export interface FoldShape {
  readonly middle: number;
  readonly exit: number;
}

/** s/L of the fold that bends evenly. */
export const FREE_SEPARATION = 2 / Math.PI;

const POINTS = 48;

interface Integrals {
  readonly length: number;
  readonly separation: number;
}

/** Midpoint rule over half the web, from the exit to the middle. */
function halfWeb(from: number, to: number, curvature: (theta: number) => number): Integrals {
  const step = 1 / POINTS;
  let length = 0;
  let separation = 0;
  for (let i = 0; i < POINTS; i += 1) {
    // theta = from + (to - from) x^2 takes the square-root singularity of an inflection out of the integrand
    const x = (i + 0.5) * step;
    const theta = from + (to - from) * x * x;
    const weight = (2 * x * (to - from) * step) / curvature(theta);
    length += weight;
    separation += Math.sin(theta) * weight;
  }
  return { length, separation };
}

interface Trial {
  readonly ratio: number;
  readonly shape: FoldShape;
}

/** p in (-1, 1]: kappa = sqrt(1 + p (sin theta - [p > 0])), every web without inflection. */
function withoutInflection(p: number): Trial {
  const floor = p > 0 ? 1 - p : 1;
  const curvature = (theta: number) => Math.sqrt(floor + p * Math.sin(theta));
  const { length, separation } = halfWeb(0, Math.PI / 2, curvature);
  const scale = (2 * length) / Math.PI;
  return {
    ratio: separation / length,
    shape: { middle: curvature(Math.PI / 2) * scale, exit: curvature(0) * scale },
  };
}

/** The web leaves its leaves curving outward by alpha before it turns back. */
function withInflection(alpha: number): Trial {
  const curvature = (theta: number) => Math.sqrt(Math.max(1e-12, Math.sin(theta) + Math.sin(alpha)));
  const outward = halfWeb(-alpha, 0, curvature);
  const inward = halfWeb(-alpha, Math.PI / 2, curvature);
  const length = outward.length + inward.length;
  const scale = (2 * length) / Math.PI;
  return {
    ratio: (outward.separation + inward.separation) / length,
    shape: { middle: curvature(Math.PI / 2) * scale, exit: curvature(0) * scale },
  };
}

/** Separation over length grows as `at` falls. */
function bisect(at: (x: number) => Trial, low: number, high: number, ratio: number): FoldShape {
  let [from, to] = [low, high];
  for (let i = 0; i < 40; i += 1) {
    const middle = (from + to) / 2;
    if (at(middle).ratio > ratio) from = middle;
    else to = middle;
  }
  return at((from + to) / 2).shape;
}

const TOUCHING = withoutInflection(1).ratio;
const WIDEST_P = -0.999;
const WIDEST = withoutInflection(WIDEST_P).ratio;
const STEEPEST = Math.PI / 2 - 0.01;

/**
 * Curvature at the middle and at the exits of a web folded shut, in units of pi/L.
 * `ratio` is s/L, separation of the exits measured at mid-thickness over web length. Null where no such fold exists
 * without the web touching itself or the leaves standing wider than the web can bridge.
 */
export function shutFold(ratio: number): FoldShape | null {
  if (!(ratio > 0) || ratio > WIDEST) return null;
  if (ratio >= TOUCHING) return bisect(withoutInflection, WIDEST_P, 1, ratio);
  return bisect(withInflection, 0, STEEPEST, ratio);
}
