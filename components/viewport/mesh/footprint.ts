import type { Box } from './bounds';

/** Shade on the floor under the part: `size` x `size` values 0 to 255 over a square of `width` mm about `centre`. */
export interface Footprint {
  readonly size: number;
  readonly shade: Uint8Array;
  readonly centre: readonly [number, number];
  readonly width: number;
}

export interface Cloud {
  readonly positions: Float32Array;
  readonly indices: Uint32Array;
}

const SIZE = 72;
const MARGIN = 0.22;

/**
 * A soft shadow without a shadow map: triangles are dropped straight down on a coarse grid, darker the nearer they
 * are to the floor, then blurred.
 */
export function footprint(clouds: readonly Cloud[], box: Box): Footprint {
  const span = Math.max(box.max[0] - box.min[0], box.max[1] - box.min[1]);
  const width = span * (1 + 2 * MARGIN);
  const centre = [(box.min[0] + box.max[0]) / 2, (box.min[1] + box.max[1]) / 2] as const;
  const cell = width / SIZE;
  const origin = [centre[0] - width / 2, centre[1] - width / 2] as const;
  const fade = 0.25 * span + 1e-6;
  const dark = new Float32Array(SIZE * SIZE);
  for (const { positions: p, indices } of clouds) {
    for (let k = 0; k < indices.length; k += 3) {
      const [a, b, c] = [3 * indices[k]!, 3 * indices[k + 1]!, 3 * indices[k + 2]!];
      const height = Math.min(p[a + 2]!, p[b + 2]!, p[c + 2]!) - box.min[2];
      const x = [a, b, c].map((at) => (p[at]! - origin[0]) / cell);
      const y = [a, b, c].map((at) => (p[at + 1]! - origin[1]) / cell);
      fill(dark, x, y, Math.exp(-height / fade));
    }
  }
  return { size: SIZE, centre, width, shade: toBytes(blur(blur(blur(dark)))) };
}

function fill(grid: Float32Array, x: readonly number[], y: readonly number[], value: number): void {
  const low = (v: readonly number[]) => Math.max(0, Math.floor(Math.min(...v)));
  const high = (v: readonly number[]) => Math.min(SIZE - 1, Math.floor(Math.max(...v)));
  for (let row = low(y); row <= high(y); row += 1) {
    for (let column = low(x); column <= high(x); column += 1) {
      if (touches(x, y, column + 0.5, row + 0.5)) {
        grid[row * SIZE + column] = Math.max(grid[row * SIZE + column]!, value);
      }
    }
  }
}

/** True where the cell centre lies in the triangle or within a cell of it, so that thin parts leave a trace. */
function touches(x: readonly number[], y: readonly number[], px: number, py: number): boolean {
  const turn = Math.sign((x[1]! - x[0]!) * (y[2]! - y[0]!) - (x[2]! - x[0]!) * (y[1]! - y[0]!) || 1);
  for (let k = 0; k < 3; k += 1) {
    const n = (k + 1) % 3;
    const [dx, dy] = [x[n]! - x[k]!, y[n]! - y[k]!];
    const beside = turn * (dx * (py - y[k]!) - dy * (px - x[k]!));
    if (beside < -0.7 * Math.hypot(dx, dy)) return false;
  }
  return true;
}

function blur(grid: Float32Array): Float32Array {
  return blurRows(blurRows(grid, 1, SIZE), SIZE, 1);
}

function blurRows(grid: Float32Array, step: number, stride: number): Float32Array {
  const out = new Float32Array(grid.length);
  const reach = 2;
  for (let line = 0; line < SIZE; line += 1) {
    for (let k = 0; k < SIZE; k += 1) {
      let sum = 0;
      for (let j = Math.max(0, k - reach); j <= Math.min(SIZE - 1, k + reach); j += 1) {
        sum += grid[line * stride + j * step]!;
      }
      out[line * stride + k * step] = sum / (2 * reach + 1);
    }
  }
  return out;
}

const toBytes = (grid: Float32Array): Uint8Array =>
  Uint8Array.from(grid, (value) => Math.round(255 * Math.min(1, value)));
