import type { Vec3 } from '@/lib/geometry/kernel';
import type { Moved } from '../mesh/arrange';
import { faceNormals } from '../mesh/shading';
import { cssColour, type Rgb, strainColour } from './ramp';
import { dot, type Frame, type Project } from './views';

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
  const marks = bodies.flatMap((body) => [
    ...(body.seeThrough ? [] : facesOf(body, frame, project, scaleEnd)),
    ...creasesOf(body.moved, project),
  ]);
  return joined(marks.sort((a, b) => a.depth - b.depth));
}

function facesOf({ moved, colour }: PaintedBody, frame: Frame, project: Project, scaleEnd: number | null) {
  const { positions: p, strain } = moved;
  const { indices } = moved.body.mesh;
  const normals = faceNormals({ positions: p, indices });
  const faces: Mark[] = [];
  for (let side = 0; side < indices.length; side += 3) {
    const normal: Vec3 = [normals[side]!, normals[side + 1]!, normals[side + 2]!];
    if (dot(normal, frame.eye) <= 0) continue;
    const vertices = [indices[side]!, indices[side + 1]!, indices[side + 2]!];
    const corners = vertices.map((v) => project([p[3 * v]!, p[3 * v + 1]!, p[3 * v + 2]!]));
    const mean = vertices.reduce((sum, v) => sum + strain[v]!, 0) / 3;
    const base = scaleEnd === null ? colour : strainColour(Math.round((24 * mean) / scaleEnd) / 24);
    const lit = brightness(normal, frame) * (scaleEnd === null ? 1 : 0.5) + (scaleEnd === null ? 0 : 0.5);
    faces.push({
      kind: 'face',
      path: `M${corners.map(({ x, y }) => `${round(x)} ${round(y)}`).join('L')}Z`,
      fill: cssColour(base.map((c) => c * lit) as unknown as Rgb),
      depth: corners.reduce((sum, { depth }) => sum + depth, 0) / 3,
    });
  }
  return faces;
}

/** Creases lie a little nearer than the faces they bound. */
const CREASE_LIFT = 0.05;

function creasesOf({ body, positions: p }: Moved, project: Project): Mark[] {
  const { edges } = body.shading;
  return Array.from({ length: edges.length / 2 }, (_, k) => {
    const [a, b] = [3 * edges[2 * k]!, 3 * edges[2 * k + 1]!].map((at) =>
      project([p[at]!, p[at + 1]!, p[at + 2]!]),
    ) as [ReturnType<Project>, ReturnType<Project>];
    return {
      kind: 'crease',
      path: `M${round(a.x)} ${round(a.y)}L${round(b.x)} ${round(b.y)}`,
      fill: 'none',
      depth: (a.depth + b.depth) / 2 + CREASE_LIFT,
    };
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
