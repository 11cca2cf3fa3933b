import { cssColour, strainColour } from '@/components/viewport/drawing/ramp';
import type { BendingModel } from '@/lib/fea/model';
import { type Moment, momentAt } from '@/lib/fea/preview/between';
import type { Solved } from '@/lib/fea/solve/solution';

/** Paths of a mesh in mm, y downward. */
export interface MeshDrawing {
  readonly box: { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
  /** triangles by colour of their strain */
  readonly fills: readonly { readonly colour: string; readonly path: string }[];
  /** outline at rest */
  readonly rest: string;
  readonly held: string;
  readonly pushed: string;
  readonly peak: { readonly x: number; readonly y: number };
}

/** Colours are told apart in so many steps to each side. */
const SHADES = 24;
const DECIMALS = 3;

type Place = (node: number) => string;

function placesAt({ mesh }: Solved, { displacement }: Pick<Moment, 'displacement'>) {
  const x = (node: number) => mesh.nodes[2 * node]! + displacement[2 * node]!;
  const y = (node: number) => -(mesh.nodes[2 * node + 1]! + displacement[2 * node + 1]!);
  const text: Place = (node) => `${x(node).toFixed(DECIMALS)} ${y(node).toFixed(DECIMALS)}`;
  return { x, y, text };
}

/** Nodes of an element in order round it: corner, middle, corner, ... */
const ROUND = [0, 3, 1, 4, 2, 5] as const;

function trianglePath({ mesh }: Solved, element: number, place: Place): string {
  return `M${ROUND.map((k) => place(mesh.elements[6 * element + k]!)).join('L')}Z`;
}

/** Mean strain of an element's corners over the end of the scale, in whole shades. */
function shadeOf({ mesh }: Solved, strain: Float32Array, element: number, end: number): number {
  const corners = [0, 1, 2].map((k) => strain[mesh.elements[6 * element + k]!]!);
  const mean = corners.reduce((sum, one) => sum + one, 0) / 3;
  return Math.round(SHADES * Math.max(-1, Math.min(1, mean / end)));
}

function fillsOf(solution: Solved, moment: Moment, place: Place, end: number): MeshDrawing['fills'] {
  const byShade = new Map<number, string[]>();
  for (let element = 0; element < solution.mesh.elementCount; element++) {
    const shade = shadeOf(solution, moment.strain, element, end);
    byShade.set(shade, [...(byShade.get(shade) ?? []), trianglePath(solution, element, place)]);
  }
  return [...byShade].map(([shade, paths]) => ({
    colour: cssColour(strainColour(shade / SHADES)),
    path: paths.join(''),
  }));
}

function edgesPath({ mesh }: Solved, place: Place, wanted: (tag: string) => boolean): string {
  let path = '';
  for (let e = 0; e < mesh.edgeCount; e++) {
    const [start, middle, end, segment] = mesh.edges.subarray(4 * e, 4 * e + 4) as unknown as number[];
    if (wanted(mesh.tags[segment!]!)) path += `M${place(start!)}L${place(middle!)}L${place(end!)}`;
  }
  return path;
}

const heldTags = ({ supports }: BendingModel): string[] =>
  supports.flatMap((support) => ('tag' in support ? [support.tag] : []));

const pushedTags = ({ drive }: BendingModel): string[] =>
  drive.kind === 'rotation' ? [drive.tag] : drive.lands.map(({ tag }) => tag);

type Places = ReturnType<typeof placesAt>;

function boxOf({ mesh }: Solved, both: readonly Places[]): MeshDrawing['box'] {
  const [low, high] = [
    [Infinity, Infinity],
    [-Infinity, -Infinity],
  ] as [[number, number], [number, number]];
  for (const { x, y } of both) {
    for (let node = 0; node < mesh.nodeCount; node++) {
      [x(node), y(node)].forEach((at, axis) => {
        low[axis] = Math.min(low[axis]!, at);
        high[axis] = Math.max(high[axis]!, at);
      });
    }
  }
  const pad = 0.03 * Math.max(high[0] - low[0], high[1] - low[1]);
  return {
    x: low[0] - pad,
    y: low[1] - pad,
    width: high[0] - low[0] + 2 * pad,
    height: high[1] - low[1] + 2 * pad,
  };
}

/** The mesh at share `t` of the full movement, at true scale. `peak`: node of the marked strain. */
export function drawMesh(
  solution: Solved,
  model: BendingModel,
  { t, end, peak }: { readonly t: number; readonly end: number; readonly peak: number },
): MeshDrawing {
  const full = momentAt(solution, 1);
  const still: Moment = {
    displacement: new Float64Array(full.displacement.length),
    strain: new Float32Array(full.strain.length),
  };
  const moment = t === 0 ? still : momentAt(solution, t);
  const [rest, now, last] = [still, moment, full].map((one) => placesAt(solution, one)) as [
    Places,
    Places,
    Places,
  ];
  const [held, pushed] = [heldTags(model), pushedTags(model)];
  return {
    box: boxOf(solution, [rest, last]),
    fills: fillsOf(solution, moment, now.text, end),
    rest: edgesPath(solution, rest.text, () => true),
    held: edgesPath(solution, now.text, (tag) => held.includes(tag)),
    pushed: edgesPath(solution, now.text, (tag) => pushed.includes(tag)),
    peak: { x: now.x(peak), y: now.y(peak) },
  };
}
