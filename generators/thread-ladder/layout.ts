import type { FormPoint, Ridge } from '@/lib/geometry/thread';
import { capOutline, neckOutline } from '@/lib/mechanics/thread-outline';
import { mouthChamfer, threadOf, type Values } from './schema';

/** Ridges fade over this share of a turn past their half-height points. */
const FADE_HALF = 0.125;
/** Below the first turn of the stud, and past its last, mm. */
const UNDER = 0.3;
const PAST = 1;

const below = (form: readonly FormPoint[]): number => -form[0]![1];
const above = (form: readonly FormPoint[]): number => form.at(-1)![1];

/** Head at z < 0, thread upward from its shoulder at z = 0. */
export interface Stud {
  readonly ridge: Ridge;
  readonly core: number;
  readonly height: number;
  readonly chamfer: number;
}

/** The thread is a turn longer than the plate is thick, so that it comes out on the other side. */
export function studOf(p: Values): Stud {
  const thread = threadOf(p);
  const outline = neckOutline(thread);
  const turns = p.plateThickness / thread.lead + 0.5;
  const base = UNDER + below(outline) + thread.lead * FADE_HALF;
  const height = base + thread.lead * (turns + FADE_HALF) + above(outline) + PAST;
  const core = outline[0]![0];
  const ridge: Ridge = {
    outline,
    facing: 'outward',
    lead: thread.lead,
    starts: p.starts,
    turns,
    base,
    phase: 0,
  };
  return { ridge, core, height, chamfer: Math.min(0.6, core / 4) };
}

/** Height of the underside of the plate over the stud's shoulder when it is screwed in, mm. */
export const plateFrom = (p: Values): number => studOf(p).ridge.lead * 0.25 + 0.5;

/** Ridge of a hole, half a pitch under the stud's, from chamfer to chamfer; about the axis of the stud. */
export function holeRidge(p: Values, clearance: number): Ridge {
  const thread = threadOf(p);
  const outline = capOutline(thread, clearance);
  const from = plateFrom(p) + mouthChamfer(p);
  const to = plateFrom(p) + p.plateThickness - mouthChamfer(p);
  const start = studOf(p).ridge.base - thread.pitch / 2;
  const base = from + below(outline) + thread.lead * FADE_HALF;
  const phase = (base - start) / thread.lead;
  const turns = (to - from - below(outline) - above(outline)) / thread.lead - 2 * FADE_HALF;
  return { outline, facing: 'inward', lead: thread.lead, starts: p.starts, turns, base, phase };
}
