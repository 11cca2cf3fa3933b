import jscad from '@jscad/modeling';
import { FAMILIES } from '@/generators/index';
import { stlBytes, writeStl } from '@/lib/export/stl';
import { writeThreeMf } from '@/lib/export/three-mf';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import { type BuiltBody, type Kernel, type NamedSolid, QUALITY, type TriMesh } from '@/lib/geometry/kernel';
import { meshFaults, weld } from '@/lib/geometry/mesh-check';
import { translation } from '@/lib/geometry/placement';
import { FIXTURES } from '../support/kernel-fixtures';
import { serialize } from '../support/stl-serializer';
import { medianMs, ms, printTable, ratio } from './measure';

const { booleans, transforms } = jscad;
/** its types name the module instead of the function */
const generalize = jscad.modifiers.generalize as unknown as (options: object, geometry: Geom3) => Geom3;
const { cuboid, cylinder, circle, rectangle } = jscad.primitives;
type Geom3 = ReturnType<typeof cuboid>;

const EYES = [-35, -25, -15, -5, 5, 15, 25];
const SEGMENTS = QUALITY.export.segmentsPerTurn;

/** A strap with seven eyes and a headed peg. */
function strap(kernel: Kernel): NamedSolid[] {
  const plate = kernel.box([90, 12, 2.4]);
  const bore = kernel.place(kernel.cylinder(3, 4), translation([0, 0, -2]));
  const eyes = EYES.map((x) => kernel.place(bore, translation([x, 0, 0])));
  const shank = kernel.place(kernel.cylinder(2.5, 6), translation([38, 0, 0]));
  const head = kernel.place(kernel.cylinder(3.6, 3, { topRadius: 2 }), translation([38, 0, 5]));
  return [{ name: 'strap', solid: kernel.union([kernel.subtract(plate, eyes), shank, head]) }];
}

/** The same strap by JSCAD, mended by its own generalize as its writers do. */
function strapByJscad(): Geom3 {
  const at = (center: [number, number, number], radius: number, height: number) =>
    cylinder({ radius, height, center, segments: SEGMENTS });
  const plate = cuboid({ size: [90, 12, 2.4] });
  const eyes = EYES.map((x) => at([x, 0, 0], 3, 4));
  const head = transforms.translate(
    [38, 0, 6.5],
    jscad.primitives.cylinderElliptic({
      height: 3,
      startRadius: [3.6, 3.6],
      endRadius: [2, 2],
      segments: SEGMENTS,
    }),
  );
  const joined = booleans.union(booleans.subtract(plate, ...eyes), at([38, 0, 3], 2.5, 6), head);
  return generalize({ snap: true, triangulate: true }, joined);
}

function meshOf(geometry: Geom3): TriMesh {
  const corners = jscad.geometries.geom3.toPolygons(geometry).flatMap(({ vertices }) => vertices.flat());
  return weld(
    corners,
    Array.from({ length: corners.length / 3 }, (_, at) => at),
  );
}

const openEdges = (mesh: TriMesh) =>
  meshFaults(mesh)
    .filter(({ kind }) => kind === 'open-edge' || kind === 'overused-edge')
    .reduce((sum, { count }) => sum + count, 0);

function benchBooleans(host: KernelHost): void {
  const ours = medianMs(() => host.build(strap, QUALITY.export));
  const theirs = medianMs(strapByJscad, { warm: 1, times: 3 });
  const mesh = host.build(strap, QUALITY.export)[0]!.mesh;
  printTable('Strap with seven eyes and a peg, export quality, closed and checked', [
    ['booleans by', 'time', 'against manifold', 'edges not closed'],
    ['manifold, tidied', ms(ours), ratio(1), String(openEdges(mesh))],
    ['JSCAD, generalized', ms(theirs), ratio(theirs / ours), String(openEdges(meshOf(strapByJscad())))],
  ]);
}

function benchOutlines(host: KernelHost): void {
  const centers = Array.from({ length: 40 }, (_, at): [number, number] => [
    (at % 10) * 20 - 90,
    Math.floor(at / 10) * 25 - 37,
  ]);
  let ours = 0;
  host.build((kernel) => {
    const { circle: disc, rectangle: plate, subtract } = kernel.outlines;
    const holes = centers.map((center) => disc(2, { center }));
    ours = medianMs(() => subtract(plate(200, 100), holes));
    return [{ name: 'any', solid: kernel.box([1, 1, 1]) }];
  }, QUALITY.export);
  const holes = centers.map((center) => circle({ radius: 2, center, segments: SEGMENTS }));
  const theirs = medianMs(() => booleans.subtract(rectangle({ size: [200, 100] }), ...holes), {
    warm: 1,
    times: 3,
  });
  printTable('Outline of a plate with 40 holes', [
    ['cut by', 'time', 'against the clipper'],
    ['polygon clipper', ms(ours), ratio(1)],
    ['JSCAD', ms(theirs), ratio(theirs / ours)],
  ]);
}

/** A mesh of about 100,000 triangles: the fixture's, over and over, moved apart. */
function largeMeshes(host: KernelHost): TriMesh[] {
  const { mesh } = host.build(FIXTURES['ribbed grip']!, QUALITY.export)[0]!;
  const copies = Math.ceil(100_000 / (mesh.indices.length / 3));
  return Array.from({ length: copies }, () => mesh);
}

function benchWriters(host: KernelHost): void {
  const meshes = largeMeshes(host);
  const triangles = meshes.reduce((sum, mesh) => sum + mesh.indices.length / 3, 0);
  const source = new Uint8Array(stlBytes(triangles)).fill(7);
  const copy = medianMs(() => source.slice());
  const stl = medianMs(() => writeStl(meshes, 'bench'));
  const bodies = [{ name: 'grip', mesh: meshes[0]! }];
  const threeMf = medianMs(() => writeThreeMf({ title: 'bench', material: 'PETG', bodies }));
  const strapGeometry = strapByJscad();
  const strapMesh = host.build(strap, QUALITY.export)[0]!.mesh;
  const serializer = medianMs(() => serialize({ binary: true }, strapGeometry), { warm: 1, times: 3 });
  const sameStrap = medianMs(() => writeStl([strapMesh], 'bench'));
  printTable(`Files of ${triangles} triangles (STL), ${bodies[0]!.mesh.indices.length / 3} (3MF)`, [
    ['written by', 'time', 'ratio'],
    ['plain copy of as many bytes', ms(copy), ratio(1)],
    ['STL writer', ms(stl), `${ratio(stl / copy)} the copy`],
    ['3MF writer', ms(threeMf), ''],
    ['STL writer, the strap', ms(sameStrap), ratio(1)],
    ['STL serializer of JSCAD, the strap', ms(serializer), `${ratio(serializer / sameStrap)} the writer`],
  ]);
}

function buildRow(name: string, build: (quality: 'preview' | 'export') => BuiltBody[]): string[] {
  const triangles = build('export').reduce((sum, body) => sum + body.mesh.indices.length / 3, 0);
  return [name, ms(medianMs(() => build('preview'))), ms(medianMs(() => build('export'))), String(triangles)];
}

async function benchParts(host: KernelHost): Promise<void> {
  const rows = [['part', 'preview', 'export', 'triangles at export']];
  for (const [name, make] of Object.entries(FIXTURES)) {
    rows.push(buildRow(name, (quality) => host.build(make, QUALITY[quality])));
  }
  for (const { about, load } of FAMILIES) {
    const family = await load();
    const values = family.parameters.defaults;
    rows.push(
      buildRow(about.id, (quality) => host.build((kernel) => family.build(values, kernel), QUALITY[quality])),
    );
  }
  printTable('Warm build of defaults: solids, tidying, welding and the closed-mesh check', rows);
}

export async function run(): Promise<void> {
  const start = performance.now();
  const host = await createKernelHost();
  host.build(FIXTURES.plate!, QUALITY.preview);
  console.log(`\nCold start of the kernel with a first build: ${ms(performance.now() - start)}`);
  benchBooleans(host);
  benchOutlines(host);
  benchWriters(host);
  await benchParts(host);
}
