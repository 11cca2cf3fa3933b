import type { Kernel, Loop, NamedSolid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { arcPoints } from '@/lib/geometry/outline';
import { flexLength, pitchOf, rowPitch, totalLength, type Values } from './schema';

interface Row {
  /** middle of its slits across the bend, mm */
  readonly x: number;
  /** centre and length of every closed slit */
  readonly slits: readonly { readonly y: number; readonly length: number }[];
  /** depth of the slits that run out at both edges; 0: none */
  readonly notch: number;
}

/** Odd rows have whole slits, even rows are shifted by half a pitch and run out at the edges. */
export function rowsOf(p: Values): Row[] {
  const [pitch, half] = [pitchOf(p), p.panelWidth / 2];
  const first = -flexLength(p) / 2 + p.slitWidth / 2;
  return Array.from({ length: p.rows }, (_, row) => {
    const shifted = row % 2 === 1;
    const count = shifted ? p.columns - 1 : p.columns;
    const start = -half + (shifted ? pitch : pitch / 2);
    return {
      x: first + row * rowPitch(p),
      slits: Array.from({ length: count }, (_, i) => ({ y: start + i * pitch, length: pitch - p.bridge })),
      notch: shifted ? (pitch - p.bridge) / 2 : 0,
    };
  });
}

/** Segments of a turn at the slits' small ends. */
const endSegments = (segmentsPerTurn: number): number => Math.max(8, segmentsPerTurn / 4);

/** A slit with round ends, clockwise. */
function slitLoop(p: Values, x: number, y: number, length: number, segments: number): Vec2[] {
  const r = p.slitWidth / 2;
  const reach = length / 2 - r;
  const upper = arcPoints([x, y + reach], r, Math.PI, 0, segments);
  const lower = arcPoints([x, y - reach], r, 0, -Math.PI, segments);
  return [...upper, ...lower];
}

/** Slit that runs out at the edge y = -half, from its left to its right side, ends on the edge. */
function notchAt(p: Values, x: number, depth: number, segments: number): Vec2[] {
  const [r, half] = [p.slitWidth / 2, p.panelWidth / 2];
  const end = arcPoints([x, -half + depth - r], r, Math.PI, 0, segments);
  return [[x - r, -half], ...end, [x + r, -half]];
}

/** Outline and slits of the panel, x across the bend, y along it. */
export function panelLoops(p: Values, segmentsPerTurn: number): Loop[] {
  const segments = endSegments(segmentsPerTurn);
  const rows = rowsOf(p);
  const [end, half] = [totalLength(p) / 2, p.panelWidth / 2];
  const notches = rows.filter(({ notch }) => notch > 0);
  const lower = notches.flatMap(({ x, notch }) => notchAt(p, x, notch, segments));
  const upper = lower.map(([x, y]): Vec2 => [x, -y]).reverse();
  const outline: Vec2[] = [[-end, -half], ...lower, [end, -half], [end, half], ...upper, [-end, half]];
  const slits = rows.flatMap(({ x, slits: closed }) =>
    closed.map(({ y, length }) => slitLoop(p, x, y, length, segments)),
  );
  return [outline, ...slits];
}

/** One body "panel", flat on z = 0, the bend along y. */
export const build = (p: Values, kernel: Kernel): NamedSolid[] => [
  {
    name: 'panel',
    solid: kernel.extrude({ loops: panelLoops(p, kernel.quality.segmentsPerTurn) }, p.thickness),
  },
];

/** Volume of the faceted body, mm3. */
export const volumes = (p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> => ({
  panel: panelLoops(p, segmentsPerTurn).reduce((sum, loop) => sum + loopArea(loop), 0) * p.thickness,
});
