import type { Box } from '../profile/profile';

/** Cells along the longer side of the grid. */
const ACROSS = 96;

/**
 * Points sorted into square cells, to ask fast whether a disc is free of points.
 * Method: uniform bucket grid with linked lists. The box must hold every point put in.
 */
export class Buckets {
  private readonly cell: number;
  private readonly columns: number;
  private readonly rows: number;
  private readonly left: number;
  private readonly bottom: number;
  private readonly head: Int32Array;
  private readonly next: number[] = [];

  constructor(
    [left, bottom, right, top]: Box,
    private readonly x: readonly number[],
    private readonly y: readonly number[],
  ) {
    this.cell = Math.max(right - left, top - bottom) / ACROSS;
    this.columns = Math.ceil((right - left) / this.cell) + 3;
    this.rows = Math.ceil((top - bottom) / this.cell) + 3;
    this.left = left - this.cell;
    this.bottom = bottom - this.cell;
    this.head = new Int32Array(this.columns * this.rows).fill(-1);
  }

  private column(x: number): number {
    return Math.min(this.columns - 1, Math.max(0, Math.floor((x - this.left) / this.cell)));
  }

  private row(y: number): number {
    return Math.min(this.rows - 1, Math.max(0, Math.floor((y - this.bottom) / this.cell)));
  }

  put(point: number): void {
    const cell = this.column(this.x[point]!) + this.columns * this.row(this.y[point]!);
    this.next[point] = this.head[cell]!;
    this.head[cell] = point;
  }

  /** True where no point lies nearer than `radius`. */
  isFree(x: number, y: number, radius: number): boolean {
    const lastRow = this.row(y + radius);
    const firstColumn = this.column(x - radius);
    const lastColumn = this.column(x + radius);
    for (let row = this.row(y - radius); row <= lastRow; row++) {
      for (let column = firstColumn; column <= lastColumn; column++) {
        if (this.cellHolds(column + this.columns * row, x, y, radius * radius)) return false;
      }
    }
    return true;
  }

  private cellHolds(cell: number, x: number, y: number, within: number): boolean {
    for (let point = this.head[cell]!; point >= 0; point = this.next[point]!) {
      const dx = this.x[point]! - x;
      const dy = this.y[point]! - y;
      if (dx * dx + dy * dy < within) return true;
    }
    return false;
  }
}
