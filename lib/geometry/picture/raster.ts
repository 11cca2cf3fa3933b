import type { Size } from './camera';

/** Triangles of one body in pixels, as `fitTo` leaves them. */
export interface Projected {
  readonly points: Float32Array;
  readonly indices: Uint32Array;
}

/** What is seen at each pixel. Faces are numbered from 1 over all bodies; 0 is the background. */
export interface Raster extends Size {
  readonly face: Uint32Array;
  readonly depth: Float32Array;
  /** by face: unit normal with y down and z towards the eye, then the slope of depth along x and y */
  readonly normals: Float32Array;
  readonly slopes: Float32Array;
  /** body of each face */
  readonly body: Uint16Array;
}

interface Triangle {
  readonly a: readonly [number, number, number];
  readonly b: readonly [number, number, number];
  readonly c: readonly [number, number, number];
}

const pointAt = (points: Float32Array, index: number): readonly [number, number, number] => [
  points[3 * index]!,
  points[3 * index + 1]!,
  points[3 * index + 2]!,
];

/** Normal with length twice the area, z positive towards the eye. With y down, an outward triangle runs clockwise. */
function normalOf({ a, b, c }: Triangle): readonly [number, number, number] {
  const [ux, uy, uz] = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  const [vx, vy, vz] = [c[0] - a[0], c[1] - a[1], c[2] - a[2]];
  return [-(uy * vz - uz * vy), -(uz * vx - ux * vz), -(ux * vy - uy * vx)];
}

/** Fills the pixels whose middle lies in the triangle, where it is nearest to the eye. */
function fill(raster: Raster, face: number, { a, b, c }: Triangle, slope: readonly [number, number]): void {
  const { width, height, depth } = raster;
  const x0 = Math.max(0, Math.ceil(Math.min(a[0], b[0], c[0]) - 0.5));
  const x1 = Math.min(width - 1, Math.floor(Math.max(a[0], b[0], c[0]) - 0.5));
  const y0 = Math.max(0, Math.ceil(Math.min(a[1], b[1], c[1]) - 0.5));
  const y1 = Math.min(height - 1, Math.floor(Math.max(a[1], b[1], c[1]) - 0.5));
  const [abX, abY, bcX, bcY, caX, caY] = [
    b[0] - a[0],
    b[1] - a[1],
    c[0] - b[0],
    c[1] - b[1],
    a[0] - c[0],
    a[1] - c[1],
  ];
  for (let y = y0; y <= y1; y += 1) {
    const [ay, by, cy] = [y + 0.5 - a[1], y + 0.5 - b[1], y + 0.5 - c[1]];
    for (let x = x0; x <= x1; x += 1) {
      const px = x + 0.5;
      if (abX * ay > abY * (px - a[0]) || bcX * by > bcY * (px - b[0]) || caX * cy > caY * (px - c[0]))
        continue;
      const z = a[2] + slope[0] * (px - a[0]) + slope[1] * ay;
      const at = y * width + x;
      if (raster.face[at] !== 0 && z <= depth[at]!) continue;
      depth[at] = z;
      raster.face[at] = face;
    }
  }
}

/** Draws one face unless it looks away or is seen edge on. */
function drawFace(raster: Raster, face: number, triangle: Triangle): void {
  const [nx, ny, nz] = normalOf(triangle);
  const length = Math.hypot(nx, ny, nz);
  if (nz <= 1e-9 * length || length === 0) return;
  raster.normals.set([nx / length, ny / length, nz / length], 3 * face);
  const slope = [-nx / nz, -ny / nz] as const;
  raster.slopes.set(slope, 2 * face);
  fill(raster, face, triangle, slope);
}

/** Which face is nearest to the eye at each pixel: closed bodies, so faces that look away are left out. */
export function rasterise(bodies: readonly Projected[], { width, height }: Size): Raster {
  const faces = 1 + bodies.reduce((sum, { indices }) => sum + indices.length / 3, 0);
  const raster: Raster = {
    width,
    height,
    face: new Uint32Array(width * height),
    depth: new Float32Array(width * height),
    normals: new Float32Array(3 * faces),
    slopes: new Float32Array(2 * faces),
    body: new Uint16Array(faces),
  };
  let face = 0;
  bodies.forEach(({ points, indices }, body) => {
    for (let at = 0; at < indices.length; at += 3) {
      face += 1;
      raster.body[face] = body;
      const [a, b, c] = [indices[at]!, indices[at + 1]!, indices[at + 2]!].map((one) => pointAt(points, one));
      drawFace(raster, face, { a: a!, b: b!, c: c! });
    }
  });
  return raster;
}
