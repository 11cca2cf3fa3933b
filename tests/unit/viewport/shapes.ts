import type { TriMesh } from '@/lib/geometry/kernel';

/** A box from the origin, twelve triangles looking outward. */
export function boxMesh(x: number, y: number, z: number): TriMesh {
  const positions = new Float32Array(
    [0, 1, 2, 3, 4, 5, 6, 7].flatMap((k) => [k & 1 ? x : 0, k & 2 ? y : 0, k & 4 ? z : 0]),
  );
  const quads = [
    [0, 2, 3, 1],
    [4, 5, 7, 6],
    [0, 1, 5, 4],
    [2, 6, 7, 3],
    [0, 4, 6, 2],
    [1, 3, 7, 5],
  ];
  const indices = quads.flatMap(([a, b, c, d]) => [a!, b!, c!, a!, c!, d!]);
  return { positions, indices: Uint32Array.from(indices) };
}

/** A tube about z: outer and inner radius, height, facets a turn. */
export function tubeMesh(outer: number, inner: number, height: number, facets: number): TriMesh {
  const rings = [
    [outer, 0],
    [outer, height],
    [inner, height],
    [inner, 0],
  ] as const;
  const positions = rings.flatMap(([radius, z]) =>
    Array.from({ length: facets }, (_, k) => [
      radius * Math.cos((2 * Math.PI * k) / facets),
      radius * Math.sin((2 * Math.PI * k) / facets),
      z,
    ]).flat(),
  );
  const at = (ring: number, k: number) => (ring % 4) * facets + (k % facets);
  const indices = rings.flatMap((_, ring) =>
    Array.from({ length: facets }, (_, k) => [
      at(ring, k),
      at(ring, k + 1),
      at(ring + 1, k + 1),
      at(ring, k),
      at(ring + 1, k + 1),
      at(ring + 1, k),
    ]).flat(),
  );
  return { positions: new Float32Array(positions), indices: Uint32Array.from(indices) };
}

/** mm3, positive where triangles look outward. */
export function volumeOf({ positions: p, indices }: TriMesh): number {
  let sum = 0;
  for (let k = 0; k < indices.length; k += 3) {
    const [a, b, c] = [3 * indices[k]!, 3 * indices[k + 1]!, 3 * indices[k + 2]!];
    sum +=
      p[a]! * (p[b + 1]! * p[c + 2]! - p[b + 2]! * p[c + 1]!) +
      p[a + 1]! * (p[b + 2]! * p[c]! - p[b]! * p[c + 2]!) +
      p[a + 2]! * (p[b]! * p[c + 1]! - p[b + 1]! * p[c]!);
  }
  return sum / 6;
}

/** Directed sides that are not met by exactly one opposite side. */
export function openSides({ indices }: TriMesh): number {
  const count = new Map<string, number>();
  for (let k = 0; k < indices.length; k += 1) {
    const next = k % 3 === 2 ? k - 2 : k + 1;
    const key = `${indices[k]}>${indices[next]}`;
    count.set(key, (count.get(key) ?? 0) + 1);
  }
  return [...count].filter(([key, times]) => {
    const [a, b] = key.split('>');
    return times !== 1 || count.get(`${b}>${a}`) !== 1;
  }).length;
}
