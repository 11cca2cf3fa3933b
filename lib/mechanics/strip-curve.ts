/**
 * The space curve of an inextensible strip from its bending and twist. The frame at arc length 0 is fixed: tangent +x,
 * face normal +z, width +y. Curvature 1/mm is positive where the strip bends towards its normal; twist rad/mm is
 * positive where the strip turns right-handed about its tangent. The strip never bends edgewise.
 */
export interface StripCurve {
  /** arc length of the first node and the spacing of the nodes, mm */
  readonly from: number;
  readonly step: number;
  /** per node: position, tangent, width, normal, 12 numbers */
  readonly nodes: Float64Array;
}

export type Along = (arcLength: number) => number;

const SIZE = 12;
const START = [0, 0, 0, 1, 0, 0, 0, 1, 0, 0, 0, 1] as const;

/** Turns the three axes of a frame about a rotation vector (rad), given in the frame's own axes. */
function turnFrame(node: Float64Array, aboutTangent: number, aboutWidth: number): void {
  const angle = Math.hypot(aboutTangent, aboutWidth);
  if (angle < 1e-15) return;
  const axis = [0, 1, 2].map((i) => (aboutTangent * node[3 + i]! + aboutWidth * node[6 + i]!) / angle) as [
    number,
    number,
    number,
  ];
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  for (let at = 3; at < SIZE; at += 3) {
    const [x, y, z] = [node[at]!, node[at + 1]!, node[at + 2]!];
    const dot = (axis[0] * x + axis[1] * y + axis[2] * z) * (1 - c);
    node[at] = x * c + (axis[1] * z - axis[2] * y) * s + axis[0] * dot;
    node[at + 1] = y * c + (axis[2] * x - axis[0] * z) * s + axis[1] * dot;
    node[at + 2] = z * c + (axis[0] * y - axis[1] * x) * s + axis[2] * dot;
  }
}

/** One step of arc length: half the turn, the straight move, the other half. Second order, frame stays orthonormal. */
function advance(node: Float64Array, at: number, step: number, curvature: Along, twist: Along): void {
  const middle = at + step / 2;
  const roll = (twist(middle) * step) / 2;
  const pitch = (-curvature(middle) * step) / 2;
  turnFrame(node, roll, pitch);
  for (let i = 0; i < 3; i += 1) node[i] = node[i]! + step * node[3 + i]!;
  turnFrame(node, roll, pitch);
}

/** Follows the strip from arc length 0 both ways, to `from` (at most 0) and `to`, in steps of at most `spacing` mm. */
export function followStrip(
  from: number,
  to: number,
  spacing: number,
  curvature: Along,
  twist: Along,
): StripCurve {
  const before = Math.ceil(-from / spacing);
  const after = Math.ceil(to / spacing);
  const nodes = new Float64Array(SIZE * (before + after + 1));
  for (const direction of [-1, 1]) {
    const node = Float64Array.from(START);
    nodes.set(node, SIZE * before);
    const count = direction < 0 ? before : after;
    for (let at = 1; at <= count; at += 1) {
      advance(node, direction * (at - 1) * spacing, direction * spacing, curvature, twist);
      nodes.set(node, SIZE * (before + direction * at));
    }
  }
  return { from: -before * spacing, step: spacing, nodes };
}

/** Position and frame at an arc length, between nodes by straight interpolation; written to `out` (12 numbers). */
export function stripFrame({ from, step, nodes }: StripCurve, arcLength: number, out: Float64Array): void {
  const last = nodes.length / SIZE - 1;
  const place = (arcLength - from) / step;
  const at = Math.min(Math.max(Math.floor(place), 0), last - 1);
  const share = place - at;
  const base = at * SIZE;
  for (let i = 0; i < SIZE; i += 1) {
    const a = nodes[base + i]!;
    out[i] = a + share * (nodes[base + SIZE + i]! - a);
  }
}
