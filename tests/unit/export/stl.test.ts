import geometry from '@jscad/modeling';
import { STLLoader } from 'three/examples/jsm/loaders/STLLoader.js';
import { describe, expect, it } from 'vitest';
import { stlBytes, writeStl } from '@/lib/export/stl';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY, type TriMesh } from '@/lib/geometry/kernel';
import { boundsOf, meshFaults, meshVolume, weld } from '@/lib/geometry/mesh-check';
import { admesh } from '@/tests/support/admesh';
import { boxMesh, FIXTURES } from '@/tests/support/kernel-fixtures';
import { serialize } from '@/tests/support/stl-serializer';

const host = await createKernelHost();
const bodiesOf = (name: string) => host.build(FIXTURES[name]!, QUALITY.preview);
const meshesOf = (name: string) => bodiesOf(name).map((body) => body.mesh);
const stl = (meshes: readonly TriMesh[]) => writeStl(meshes, 'Bendwell test part, mm');

/** The file as three's loader reads it, corners of each triangle apart. */
function read(bytes: Uint8Array<ArrayBuffer>) {
  const loaded = new STLLoader().parse(bytes.buffer);
  const positions = loaded.getAttribute('position').array as Float32Array;
  return { positions, normals: loaded.getAttribute('normal').array as Float32Array };
}

const indicesFor = (positions: Float32Array) => Array.from({ length: positions.length / 3 }, (_, at) => at);

/** Triangles as text, first corner the least, sorted: equal for equal sets of triangles. */
function triangles(positions: ArrayLike<number>): string[] {
  const corners = Array.from({ length: positions.length / 3 }, (_, at) =>
    [0, 1, 2].map((axis) => (positions[at * 3 + axis]! + 0).toFixed(4)).join(' '),
  );
  return Array.from({ length: corners.length / 3 }, (_, at) => {
    const three = corners.slice(at * 3, at * 3 + 3);
    const first = three.indexOf([...three].sort()[0]!);
    return [...three.slice(first), ...three.slice(0, first)].join(' / ');
  }).sort();
}

const cornersOf = ({ positions, indices }: TriMesh) =>
  [...indices].flatMap((vertex) => [...positions.slice(vertex * 3, vertex * 3 + 3)]);

describe('a binary STL file', () => {
  it('holds an 80-byte header, the count and 50 bytes a triangle', () => {
    const bytes = stl([boxMesh([1, 2, 3])]);
    expect(bytes).toHaveLength(84 + 50 * 12);
    expect(stlBytes(12)).toBe(bytes.length);
    expect(new TextDecoder().decode(bytes.slice(0, 22))).toBe('Bendwell test part, mm');
    expect(new DataView(bytes.buffer).getUint32(80, true)).toBe(12);
  });

  it('keeps the header to 80 plain characters', () => {
    const bytes = writeStl([boxMesh([1, 1, 1])], `Rüder ${'x'.repeat(200)}`);
    expect(new TextDecoder().decode(bytes.slice(0, 80))).toBe(`R?der ${'x'.repeat(74)}`);
    expect(new DataView(bytes.buffer).getUint32(80, true)).toBe(12);
  });

  it('refuses a header that readers would take for a text file', () => {
    expect(() => writeStl([boxMesh([1, 1, 1])], 'Solid part')).toThrow('must not begin with "solid"');
  });

  it('has the same bytes for the same part', () => {
    expect(Buffer.compare(stl(meshesOf('plate')), stl(meshesOf('plate')))).toBe(0);
  });

  it('has unit normals that look out of the body', () => {
    const { positions, normals } = read(stl([boxMesh([2, 2, 2])]));
    for (let at = 0; at < normals.length; at += 3) {
      const outward = [0, 1, 2].map((axis) => normals[at + axis]! * (positions[at + axis]! - 1));
      expect(Math.hypot(...normals.slice(at, at + 3))).toBeCloseTo(1, 6);
      expect(outward.reduce((sum, value) => sum + value)).toBeGreaterThan(0);
    }
  });
});

describe('an independent reader, the STL loader of three,', () => {
  for (const name of Object.keys(FIXTURES)) {
    it(`finds the ${name} closed, of the same volume and bounds`, () => {
      const meshes = meshesOf(name);
      const { positions } = read(stl(meshes));
      const welded = weld(positions, indicesFor(positions));
      const volume = meshes.reduce((sum, mesh) => sum + meshVolume(mesh), 0);
      expect(meshVolume(welded) / volume).toBeCloseTo(1, 6);
      if (meshes.length === 1) {
        expect(meshFaults(welded)).toEqual([]);
        expect(boundsOf(positions)).toEqual(boundsOf(meshes[0]!.positions));
      }
    });
  }
});

describe('an independent writer, the STL serializer of JSCAD,', () => {
  it('writes the same triangles of the same mesh', () => {
    const mesh = boxMesh([3, 4, 5]);
    const corners = cornersOf(mesh);
    const polygons = Array.from({ length: corners.length / 9 }, (_, at) =>
      geometry.geometries.poly3.create(
        [0, 3, 6].map((corner) => {
          const [x, y, z] = corners.slice(at * 9 + corner, at * 9 + corner + 3);
          return [x!, y!, z!] as [number, number, number];
        }),
      ),
    );
    const theirs = serialize({ binary: true }, geometry.geometries.geom3.create(polygons));
    const ours = stl([mesh]);
    expect(theirs).toHaveLength(ours.length);
    expect(triangles(read(theirs).positions)).toEqual(triangles(read(ours).positions));
  });
});

describe('admesh', () => {
  for (const name of Object.keys(FIXTURES)) {
    it(`finds nothing to mend in the ${name}`, () => {
      const bodies = bodiesOf(name);
      for (const { mesh, volume } of bodies) {
        const report = admesh(stl([mesh]));
        expect(report.mended).toEqual({});
        expect(report.facets).toBe(mesh.indices.length / 3);
        expect(report.volume / volume).toBeCloseTo(1, 4);
      }
    });
  }

  it('tells a file with a facet missing, so a sound report means something', () => {
    const mesh = boxMesh([2, 2, 2]);
    const report = admesh(stl([{ ...mesh, indices: mesh.indices.slice(3) }]));
    expect(report.mended).not.toEqual({});
  });
});
