import { baseDepth, FINGER, postWidth, type Values } from './schema';
import { stopsOf } from './stops';

/** One arm with its stop: where along the row its edges are, mm from the left end of the base. */
export interface Cell {
  readonly arm: readonly [left: number, right: number];
  readonly post: readonly [left: number, right: number];
  readonly stop: number;
}

/** The cells from the mildest arm to the hardest. Every stop is known once the parameters are accepted. */
export function cellsOf(p: Values): Cell[] {
  let end = 0;
  return stopsOf(p).map((given) => {
    const stop = given ?? p.armLength / 2;
    const left = end + FINGER;
    const right = left + p.armThickness;
    const from = right + stop;
    end = from + postWidth(p);
    return { arm: [left, right], post: [from, end], stop };
  });
}

export const markAt = (p: Values, { arm, post }: Cell): [number, number] => [
  (arm[0] + post[1]) / 2,
  -baseDepth(p) / 2,
];
