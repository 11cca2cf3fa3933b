import type { Vec3 } from '@/lib/geometry/kernel';
import type { Moved } from '../mesh/arrange';
import { faceNormals } from '../mesh/shading';
import { cssColour, type Rgb, strainColour } from './ramp';
import { dot, type Frame, type Pixel, type Project } from './views';

/** One stroke of the picture, far ones first: a filled patch or a crease. */
export interface Stroke {
  readonly kind: 'face' | 'crease';
  /** SVG path */
  readonly path: string;
  readonly fill: string;
}

export interface PaintedBody {
  readonly moved: Moved;
  readonly colour: Rgb;
  /** only its creases are drawn */
  readonly seeThrough: boolean;
}

const LIGHT: Vec3 = [-0.42, 0.65, 0.63];
/** Shades are rounded so that neighbours of like colour become one path. */
const SHADES = 28;
const COLOURS = 40;
/** Creases stand this much nearer, in mm, so that neighbouring faces do not paint over half of the line. */
const CREASE_LIFT = 0.5;

const round = (value: number): number => Math.round(value * 10) / 10;

interface Mark extends Stroke {
  readonly depth: number;
}

function brightness(normal: Vec3, frame: Frame): number {
  const seen: Vec3 = [dot(normal, frame.right), dot(normal, frame.up), dot(normal, frame.eye)];
  const lit = 0.62 + 0.38 * Math.max(0, dot(seen, LIGHT));
  return Math.round(lit * SHADES) / SHADES;
}

/**
 * A picture without WebGL: faces that look away are dropped, the others painted from far to near (painter's
 * algorithm), lit from the upper left. `scaleEnd` paints strain; null paints each body in its own colour.
 */
export function paintPicture(
  bodies: readonly PaintedBody[],
  frame: Frame,
  project: Project,
  scaleEnd: number | null,
): Stroke[] {
  const marks = bodies.flatMap((body) => {
    const { positions: p } = body.moved;
    const pixels = Array.from({ length: p.length / 3 }, (_, v) =>
      project([p[3 * v]!, p[3 * v + 1]!, p[3 * v + 2]!]),
    );
    const faces = body.seeThrough ? null : facesOf(body, frame, pixels, scaleEnd);
    return [...(faces?.values() ?? []), ...creasesOf(body.moved, pixels, faces)];
  });
  return joined(marks.sort((a, b) => a.depth - b.depth));
}

/** Faces that look at the eye, by triangle. */
function facesOf(
  { moved, colour }: PaintedBody,
  frame: Frame,
  pixels: readonly Pixel[],
  scaleEnd: number | null,
): Map<number, Mark> {
  const { indices } = moved.body.mesh;
  const normals = faceNormals({ positions: moved.positions, indices });
  const faces = new Map<number, Mark>();
  for (let side = 0; side < indices.length; side += 3) {
    const normal: Vec3 = [normals[side]!, normals[side + 1]!, normals[side + 2]!];
    if (dot(normal, frame.eye) <= 0) continue;
    const vertices = [indices[side]!, indices[side + 1]!, indices[side + 2]!];
    const corners = vertices.map((vertex) => pixels[vertex]!);
    const strain = vertices.reduce((sum, vertex) => sum + moved.strain[vertex]!, 0) / 3;
    faces.set(side / 3, {
      kind: 'face',
      path: `M${corners.map(({ x, y }) => `${round(x)} ${round(y)}`).join('L')}Z`,
      fill: fillOf(colour, strain, scaleEnd, brightness(normal, frame)),
      depth: corners.reduce((sum, { depth }) => sum + depth, 0) / 3,
    });
  }
  return faces;
}

/** Painted faces are shaded half as much, so that the colour can be read against the scale. */
function fillOf(own: Rgb, strain: number, scaleEnd: number | null, lit: number): string {
  const colour = scaleEnd === null ? own : strainColour(Math.round((COLOURS * strain) / scaleEnd) / COLOURS);
  const light = scaleEnd === null ? lit : (1 + lit) / 2;
  return cssColour(colour.map((channel) => channel * light) as unknown as Rgb);
}

/** Creases beside a face that is seen; all of them where faces are not drawn. */
function creasesOf(
  { body }: Moved,
  pixels: readonly Pixel[],
  faces: ReadonlyMap<number, Mark> | null,
): Mark[] {
  const { edges, beside } = body.shading;
  return Array.from({ length: edges.length / 2 }, (_, k) => k).flatMap((k) => {
    const [a, b] = [pixels[edges[2 * k]!]!, pixels[edges[2 * k + 1]!]!];
    const seen = [beside[2 * k]!, beside[2 * k + 1]!].flatMap((face) => faces?.get(face)?.depth ?? []);
    if (faces && seen.length === 0) return [];
    const path = `M${round(a.x)} ${round(a.y)}L${round(b.x)} ${round(b.y)}`;
    return [
      {
        kind: 'crease' as const,
        path,
        fill: 'none',
        depth: Math.max((a.depth + b.depth) / 2, ...seen) + CREASE_LIFT,
      },
    ];
  });
}

function joined(marks: readonly Mark[]): Stroke[] {
  const strokes: { kind: Stroke['kind']; path: string; fill: string }[] = [];
  for (const { kind, path, fill } of marks) {
    const last = strokes.at(-1);
    if (last && last.kind === kind && last.fill === fill) last.path += path;
    else strokes.push({ kind, path, fill });
  }
  return strokes;
}
