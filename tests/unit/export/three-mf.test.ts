// @vitest-environment happy-dom

import type { BufferGeometry, Mesh } from 'three';
import { ThreeMFLoader } from 'three/examples/jsm/loaders/3MFLoader.js';
import { describe, expect, it } from 'vitest';
import { writeThreeMf } from '@/lib/export/three-mf';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { meshFaults, meshVolume } from '@/lib/geometry/mesh-check';
import { FIXTURES } from '@/tests/support/kernel-fixtures';
import { readZip } from '@/tests/support/zip';

const CORE = 'http://schemas.microsoft.com/3dmanufacturing/core/2015/02';
const host = await createKernelHost();
const bodies = host.build(FIXTURES['crossed bars']!, QUALITY.preview);
const bytes = writeThreeMf({ title: 'Rig & clip <6 mm>', material: 'PETG', bodies });
const entries = readZip(bytes);
const xml = (text: string) => new DOMParser().parseFromString(text, 'text/xml');
const model = xml(entries[2]!.text).documentElement;
const indicesOf = (geometry: BufferGeometry): ArrayLike<number> =>
  geometry.getIndex()?.array ??
  Array.from({ length: geometry.getAttribute('position').count }, (_, at) => at);
const all = (name: string, under: Element = model) => [...under.getElementsByTagName(name)];

describe('a 3MF file', () => {
  it('is a zip of the content types, the relationship and the model, in that order', () => {
    expect(entries.map((entry) => entry.name)).toEqual([
      '[Content_Types].xml',
      '_rels/.rels',
      '3D/3dmodel.model',
    ]);
  });

  it('points from the relationship to the model', () => {
    const target = xml(entries[1]!.text).getElementsByTagName('Relationship')[0]!;
    expect(target.getAttribute('Target')).toBe('/3D/3dmodel.model');
    expect(target.getAttribute('Type')).toBe('http://schemas.microsoft.com/3dmanufacturing/2013/01/3dmodel');
  });

  it('states millimetres, title and material', () => {
    expect(model.getAttribute('unit')).toBe('millimeter');
    expect(model.getAttribute('xmlns')).toBe(CORE);
    const metadata = Object.fromEntries(
      all('metadata').map((one) => [one.getAttribute('name'), one.textContent]),
    );
    expect(metadata).toEqual({
      Title: 'Rig & clip <6 mm>',
      Description: 'Material: PETG',
      Application: 'Bendwell',
    });
    expect(all('base')[0]!.getAttribute('name')).toBe('PETG');
  });

  it('names each body and builds it where it stands, without a transform', () => {
    expect(all('object').map((object) => object.getAttribute('name'))).toEqual(['cross', 'plug']);
    const ids = all('object').map((object) => object.getAttribute('id'));
    expect(all('item').map((item) => item.getAttribute('objectid'))).toEqual(ids);
    expect(all('item').some((item) => item.hasAttribute('transform'))).toBe(false);
  });

  it('holds the very float32 vertices of the mesh, shared, and its triangles', () => {
    for (const [at, object] of all('object').entries()) {
      const { mesh } = bodies[at]!;
      const positions = all('vertex', object).flatMap((vertex) =>
        ['x', 'y', 'z'].map((axis) => Number(vertex.getAttribute(axis))),
      );
      const indices = all('triangle', object).flatMap((triangle) =>
        ['v1', 'v2', 'v3'].map((corner) => Number(triangle.getAttribute(corner))),
      );
      const read = { positions: Float32Array.from(positions), indices: Uint32Array.from(indices) };
      expect(read).toEqual(mesh);
      expect(meshFaults(read)).toEqual([]);
    }
  });

  it('is read by the 3MF loader of three with the same volumes', () => {
    const group = new ThreeMFLoader().parse(bytes.buffer);
    const meshes: Mesh[] = [];
    group.traverse((object) => {
      if ('isMesh' in object) meshes.push(object as Mesh);
    });
    const volumes = meshes.map(({ geometry }) =>
      meshVolume({
        positions: geometry.getAttribute('position').array as Float32Array,
        indices: Uint32Array.from(indicesOf(geometry)),
      }),
    );
    expect(volumes).toEqual(bodies.map((body) => expect.closeTo(body.volume, 3)));
  });

  it('has the same bytes each time, with the earliest date a zip can hold', () => {
    const again = writeThreeMf({ title: 'Rig & clip <6 mm>', material: 'PETG', bodies });
    expect(Buffer.compare(again, bytes)).toBe(0);
    const first = 1 + (1 << 5);
    expect(entries.map(({ date, time }) => [date, time])).toEqual([
      [first, 0],
      [first, 0],
      [first, 0],
    ]);
  });

  it('leaves the material out where none is chosen', () => {
    const text = readZip(writeThreeMf({ title: 'Clip', material: null, bodies }))[2]!.text;
    expect(text).not.toContain('basematerials');
    expect(text).not.toContain('pid=');
    expect(text).not.toContain('Description');
  });

  it('drops characters that XML cannot hold and cuts endless titles', () => {
    const title = `a\u0000b\uFFFE\uD800"${'x'.repeat(500)}`;
    const text = readZip(writeThreeMf({ title, material: null, bodies }))[2]!.text;
    const read = xml(text).getElementsByTagName('metadata')[0]!.textContent;
    expect(read).toBe(`ab"${'x'.repeat(197)}`);
  });
});
