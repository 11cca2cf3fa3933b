import type { BuiltBody } from '@/lib/geometry/kernel';

/** A mesh as it travels inside a page. */
export interface PlainBody {
  readonly name: string;
  readonly positions: readonly number[];
  readonly indices: readonly number[];
  readonly volume: number;
  readonly bounds: BuiltBody['bounds'];
}

const rounded = (value: number): number => Math.round(1e4 * value) / 1e4;

export const plainBody = ({ name, mesh, volume, bounds }: BuiltBody): PlainBody => ({
  name,
  volume,
  bounds,
  positions: Array.from(mesh.positions, rounded),
  indices: [...mesh.indices],
});

export const bodyFrom = ({ positions, indices, ...rest }: PlainBody): BuiltBody => ({
  ...rest,
  mesh: { positions: Float32Array.from(positions), indices: Uint32Array.from(indices) },
});
