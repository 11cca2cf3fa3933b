/** Steps along the loop; positions between them are straight. */
const STEPS = 96;
const ROUNDS = 12;

/** Where the middle line of a band goes from its start, heading -x and curling towards -y, in mm and rad. */
export interface LoopPath {
  readonly length: number;
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly heading: Float64Array;
}

export interface LoopShape {
  /** mm */
  readonly length: number;
  /** 0 as printed, 1 closed */
  readonly closed: number;
  readonly a: number;
  readonly b: number;
  /** curvature as printed, 1/mm */
  readonly printed: number;
}

/**
 * A loop between its printed and its closed shape. Closed, its heading is pi + 2 pi u + a sin 2 pi u + b (1 - cos 2 pi u),
 * u from 0 to 1: a and b open it by the straight head and raise its end.
 */
export function pathOf({ length, closed, a, b, printed }: LoopShape): LoopPath {
  const x = new Float64Array(STEPS + 1);
  const y = new Float64Array(STEPS + 1);
  const heading = new Float64Array(STEPS + 1);
  const at = (u: number) =>
    Math.PI +
    (1 - closed) * printed * length * u +
    closed * (2 * Math.PI * u + a * Math.sin(2 * Math.PI * u) + b * (1 - Math.cos(2 * Math.PI * u)));
  heading[0] = Math.PI;
  for (let i = 1; i <= STEPS; i += 1) {
    const middle = at((i - 0.5) / STEPS);
    x[i] = x[i - 1]! + (Math.cos(middle) * length) / STEPS;
    y[i] = y[i - 1]! + (Math.sin(middle) * length) / STEPS;
    heading[i] = at(i / STEPS);
  }
  return { length, x, y, heading };
}

/** a and b of the closed loop that ends at (dx, dy) from its start, by Newton. */
export function closedLoop(length: number, dx: number, dy: number): readonly [number, number] {
  let [a, b] = [(2 * dx) / length, (2 * dy) / length];
  const miss = (p: number, q: number): readonly [number, number] => {
    const { x, y } = pathOf({ length, closed: 1, a: p, b: q, printed: 0 });
    return [x[STEPS]! - dx, y[STEPS]! - dy];
  };
  const h = 1e-5;
  for (let round = 0; round < ROUNDS; round += 1) {
    const [ex, ey] = miss(a, b);
    if (Math.hypot(ex, ey) < 1e-9) break;
    const [ax, ay] = miss(a + h, b).map((value, i) => (value - [ex, ey][i]!) / h) as [number, number];
    const [bx, by] = miss(a, b + h).map((value, i) => (value - [ex, ey][i]!) / h) as [number, number];
    const det = ax * by - ay * bx;
    a -= (ex * by - ey * bx) / det;
    b -= (ax * ey - ay * ex) / det;
  }
  return [a, b];
}

/** Place and heading at arc length s; past the end the path goes straight on. */
export function along(path: LoopPath, s: number): { x: number; y: number; heading: number } {
  const place = Math.max(0, Math.min(STEPS, (s / path.length) * STEPS));
  const i = Math.min(STEPS - 1, Math.floor(place));
  const mix = (values: Float64Array) => values[i]! + (values[i + 1]! - values[i]!) * (place - i);
  const heading = mix(path.heading);
  const beyond = Math.max(0, s - path.length);
  return {
    x: mix(path.x) + beyond * Math.cos(heading),
    y: mix(path.y) + beyond * Math.sin(heading),
    heading,
  };
}
