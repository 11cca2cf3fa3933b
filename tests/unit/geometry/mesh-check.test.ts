import { describe, expect, it } from 'vitest';
import { boundsOf, meshArea, meshFaults, meshVolume, weld } from '@/lib/geometry/mesh-check';
import { boxMesh } from '@/tests/support/kernel-fixtures';

const box = boxMesh([2, 3, 4]);
/** Every triangle with corners of its own, as an STL file holds it. */
const loose = () => {
  const positions = [...box.indices].flatMap((vertex) => [
    ...box.positions.slice(vertex * 3, vertex * 3 + 3),
  ]);
  return { positions, indices: positions.slice(0, positions.length / 3).map((_, at) => at) };
};

describe('a closed box', () => {
  it('has no fault, and its volume, area and bounds', () => {
    expect(meshFaults(box)).toEqual([]);
    expect(meshVolume(box)).toBe(24);
    expect(meshArea(box)).toBe(52);
    expect(boundsOf(box.positions)).toEqual([0, 0, 0, 2, 3, 4]);
  });
});

describe('welding', () => {
  it('turns loose triangles into a closed mesh', () => {
    const { positions, indices } = loose();
    expect(
      meshFaults({ positions: Float32Array.from(positions), indices: Uint32Array.from(indices) }),
    ).toEqual([{ kind: 'open-edge', count: 36 }]);
    const welded = weld(positions, indices);
    expect(welded.positions).toHaveLength(24);
    expect(meshFaults(welded)).toEqual([]);
  });

  it('takes 0 and -0 as one place', () => {
    const { positions, indices } = loose();
    const signed = positions.map((value, at) => (value === 0 && at % 2 === 0 ? -0 : value));
    const welded = weld(signed, indices);
    expect(meshFaults(welded)).toEqual([]);
    expect([...welded.positions].some((value) => Object.is(value, -0))).toBe(false);
  });

  it('joins points that differ only beyond float32', () => {
    const { positions, indices } = loose();
    expect(
      meshFaults(
        weld(
          positions.map((value) => value * (1 + 1e-12)),
          indices,
        ),
      ),
    ).toEqual([]);
  });

  it('drops a triangle that collapses, and stays closed', () => {
    // one top corner split in two by less than float32 resolves, with the sliver between them
    const positions = [1, 0, 0, 2, 0, 0, 1, 1, 0, 1, 0, 1, 1 + 1e-12, 0, 1];
    const indices = [0, 2, 1, 0, 1, 4, 0, 4, 3, 1, 2, 4, 4, 2, 3, 0, 3, 2];
    const welded = weld(positions, indices);
    expect(welded.indices).toHaveLength(12);
    expect(meshFaults(welded)).toEqual([]);
  });
});

describe('faults', () => {
  it('counts the open edges round a missing facet', () => {
    expect(meshFaults({ ...box, indices: box.indices.slice(3) })).toEqual([{ kind: 'open-edge', count: 3 }]);
  });

  it('tells a mesh turned inside out', () => {
    expect(meshFaults({ ...box, indices: box.indices.slice().reverse() })).toEqual([
      { kind: 'flipped', count: 1 },
    ]);
  });

  it('tells a single facet turned over', () => {
    const indices = box.indices.slice();
    indices.set([indices[1]!, indices[0]!], 0);
    expect(meshFaults({ ...box, indices })[0]).toEqual({ kind: 'overused-edge', count: 3 });
  });

  it('tells a facet used twice', () => {
    const indices = Uint32Array.from([...box.indices, ...box.indices.slice(0, 3)]);
    expect(meshFaults({ ...box, indices })).toEqual([{ kind: 'overused-edge', count: 3 }]);
  });

  it('tells a facet without height', () => {
    const positions = Float32Array.from([...box.positions, 1, 0, 0]);
    const indices = Uint32Array.from([...box.indices, 0, 8, 1]);
    expect(meshFaults({ positions, indices })).toContainEqual({ kind: 'degenerate', count: 1 });
  });

  it('tells a position that is not a number', () => {
    const positions = box.positions.slice();
    positions[4] = Number.NaN;
    expect(meshFaults({ ...box, positions })).toContainEqual({ kind: 'non-finite', count: 1 });
  });

  it('tells an empty mesh', () => {
    expect(meshFaults({ positions: new Float32Array(), indices: new Uint32Array() })).toEqual([
      { kind: 'empty', count: 1 },
    ]);
  });
});
