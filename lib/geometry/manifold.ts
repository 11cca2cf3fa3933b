import load, { type CrossSection, type Manifold, type ManifoldToplevel } from 'manifold-3d';
import type { Loop, Vec2 } from './kernel';

/** A C++ vector: it and every element handed out live on the WebAssembly heap until deleted. */
interface Heaped<T> {
  push_back(value: T): void;
  size(): number;
  get(at: number): T;
  delete(): void;
}
type Points = Heaped<{ x: number; y: number }>;
type Polygons = Heaped<Points>;

/**
 * The bindings under the package's convenience functions. Those leave the vectors they make from loops on the heap
 * for good (seen in 3.5.4), so loops are handed over and taken back here instead.
 */
interface Bindings extends ManifoldToplevel {
  readonly Vector_vec2: new () => Points;
  readonly Vector2_vec2: new () => Polygons;
  _Extrude(
    polygons: Polygons,
    height: number,
    divisions: number,
    twist: number,
    scaleTop: { x: number; y: number },
  ): Manifold;
  _Revolve(polygons: Polygons, segments: number, degrees: number): Manifold;
}
type RawCrossSection = new (polygons: Polygons, fillRule: number) => CrossSection;
const NON_ZERO = 1;

export interface ManifoldModule {
  readonly Manifold: ManifoldToplevel['Manifold'];
  readonly Mesh: ManifoldToplevel['Mesh'];
  /** z from 0 to height */
  extrude(loops: readonly Loop[], height: number): Manifold;
  /** about the loops' y, which becomes z */
  revolve(loops: readonly Loop[], segments: number): Manifold;
  /** Region that the loops wind round, less the region that `cutters` wind round, grown by `growth`. */
  region(
    loops: readonly Loop[],
    options?: { cutters?: readonly Loop[]; growth?: number; segments?: number },
  ): Loop[];
}

function withPolygons<T>(module: Bindings, loops: readonly Loop[], use: (polygons: Polygons) => T): T {
  const polygons = new module.Vector2_vec2();
  try {
    for (const loop of loops) {
      const points = new module.Vector_vec2();
      for (const [x, y] of loop) points.push_back({ x, y });
      polygons.push_back(points);
      points.delete();
    }
    return use(polygons);
  } finally {
    polygons.delete();
  }
}

function loopsOf(section: CrossSection): Loop[] {
  const polygons = (section as unknown as { _ToPolygons(): Polygons })._ToPolygons();
  const loops = Array.from({ length: polygons.size() }, (_, at) => {
    const points = polygons.get(at);
    const loop = Array.from({ length: points.size() }, (_, k): Vec2 => {
      const { x, y } = points.get(k);
      return [x + 0, y + 0];
    });
    points.delete();
    return loop;
  });
  polygons.delete();
  return loops;
}

/** Frees every section made on the way from loops to loops. */
function regionOf(module: Bindings, Raw: RawCrossSection): ManifoldModule['region'] {
  return (loops, { cutters = [], growth = 0, segments = 0 } = {}) => {
    const made: CrossSection[] = [];
    const keep = (section: CrossSection) => {
      made.push(section);
      return section;
    };
    const section = (of: readonly Loop[]) =>
      keep(withPolygons(module, of, (polygons) => new Raw(polygons, NON_ZERO)));
    try {
      let result = section(loops);
      if (cutters.length > 0) result = keep(result.subtract(section(cutters)));
      if (growth !== 0) result = keep(result.offset(growth, 'Round', 2, segments));
      return loopsOf(result);
    } finally {
      for (const one of made) one.delete();
    }
  };
}

let loaded: Promise<ManifoldModule> | null = null;

async function start(): Promise<ManifoldModule> {
  const module = (await load()) as Bindings;
  const Raw = module.CrossSection as unknown as RawCrossSection;
  module.setup();
  return {
    Manifold: module.Manifold,
    Mesh: module.Mesh,
    extrude: (loops, height) =>
      withPolygons(module, loops, (polygons) => module._Extrude(polygons, height, 0, 0, { x: 1, y: 1 })),
    revolve: (loops, segments) =>
      withPolygons(module, loops, (polygons) => module._Revolve(polygons, segments, 360)),
    region: regionOf(module, Raw),
  };
}

/** The kernel's WebAssembly module, loaded once a thread. It finds manifold.wasm beside its own file. */
export function loadManifold(): Promise<ManifoldModule> {
  loaded ??= start();
  return loaded;
}
