import { internalThread, type ThreadBasics } from './thread';

/**
 * A point of the thread form in the plane of the axis: radius and height above the middle of the ridge, mm.
 * An outline runs from the lower root over the crest to the upper root.
 */
export type FormPoint = readonly [radius: number, height: number];

/** Where the outline leaves the core, as a share of the pitch above a full-radius root, so that turns do not touch. */
const ROOT_TRIM = 0.02;
const ARC_STEPS = 3;

interface Form {
  readonly pitch: number;
  /** half width on the pitch line */
  readonly halfWidth: number;
  /** distances from the pitch line to crest and root, both positive */
  readonly crest: number;
  readonly root: number;
  /** flank angles of the lower and the upper side, rad */
  readonly lower: number;
  readonly upper: number;
  readonly rounded: boolean;
}

/** Radius of an arc that touches both flanks and stands `height` beyond the line where the ridge is 2 w wide. */
const fullRadius = (halfWidth: number, height: number, flank: number): number =>
  (halfWidth / Math.tan(flank) - height) / (1 / Math.sin(flank) - 1);

/** One side of a ridge, root to crest: [distance beyond the pitch line, half width], straight flank. */
function straightSide(form: Form, flank: number): FormPoint[] {
  const half = (height: number) => form.halfWidth - Math.tan(flank) * height;
  return [
    [-form.root, half(-form.root)],
    [form.crest, half(form.crest)],
  ];
}

/** One side of a ridge with full-radius root and crest, root to crest, the root trimmed. */
function roundedSide(form: Form, flank: number): FormPoint[] {
  const crest = fullRadius(form.halfWidth, form.crest, flank);
  const root = fullRadius(form.pitch / 2 - form.halfWidth, form.root, flank);
  const tangent = Math.PI / 2 - flank;
  const trim = Math.acos(1 - (ROOT_TRIM * form.pitch) / root);
  const steps = Array.from({ length: ARC_STEPS + 1 }, (_, index) => index / ARC_STEPS);
  const low = steps.map((share): FormPoint => {
    const angle = trim + (tangent - trim) * share;
    return [root - form.root - root * Math.cos(angle), form.pitch / 2 - root * Math.sin(angle)];
  });
  const high = steps.map((share): FormPoint => {
    const angle = tangent * (1 - share);
    return [form.crest - crest + crest * Math.cos(angle), crest * Math.sin(angle)];
  });
  return [...low, ...high];
}

/** Outline in distances beyond the pitch line; the point in the middle of a round crest is given once. */
function outlineOf(form: Form): FormPoint[] {
  const side = form.rounded ? roundedSide : straightSide;
  const below = side(form, form.lower).map(([height, half]): FormPoint => [height, -half]);
  const above = side(form, form.upper).reverse();
  return form.rounded ? [...below, ...above.slice(1)] : [...below, ...above];
}

/** Outline of a ridge on the neck. Flat roots where the standard has a small radius; knuckle roots and crests round. */
export function neckOutline(thread: ThreadBasics): FormPoint[] {
  const pitchRadius = thread.pitchDiameter / 2;
  const outline = outlineOf({
    pitch: thread.pitch,
    halfWidth: thread.pitch / 4,
    crest: thread.majorDiameter / 2 - pitchRadius,
    root: pitchRadius - thread.rootDiameter / 2,
    lower: thread.loadFlank,
    upper: thread.freeFlank,
    rounded: thread.profile === 'knuckle',
  });
  return outline.map(([beyond, height]) => [pitchRadius + beyond, height]);
}

/** Outline of a ridge in the cap, which points inward: radius falls from the root to the crest. */
export function capOutline(thread: ThreadBasics, clearance: number): FormPoint[] {
  const pitchRadius = thread.pitchDiameter / 2;
  const cap = internalThread(thread, clearance);
  const outline = outlineOf({
    pitch: thread.pitch,
    halfWidth: thread.pitch / 4 - clearance,
    crest: pitchRadius - cap.minorDiameter / 2,
    root: cap.majorDiameter / 2 - pitchRadius,
    lower: thread.freeFlank,
    upper: thread.loadFlank,
    rounded: thread.profile === 'knuckle',
  });
  return outline.map(([beyond, height]) => [pitchRadius - beyond, height]);
}

/**
 * Largest sideways step in mm from one layer to the next on the side of a ridge that hangs in the print:
 * layer / tan(flank angle) on a straight flank taller than a layer, never more than the depth of the ridge.
 * `side` is given root first. Source: geometry.
 */
export function sidewaysStep(side: readonly FormPoint[], layer: number): number {
  const up = side.map(([radius, height]) => [Math.abs(radius - side[0]![0]), Math.abs(height - side[0]![1])]);
  const reach = (height: number): number => {
    if (height <= 0) return 0;
    const next = up.findIndex((point) => point[1]! >= height);
    if (next < 0) return up[up.length - 1]![0]!;
    const [r1, h1] = up[next]!;
    const [r0, h0] = up[Math.max(0, next - 1)]!;
    return h1 === h0 ? r1! : r0! + ((r1! - r0!) * (height - h0!)) / (h1! - h0!);
  };
  const levels = up.flatMap((point) => [point[1]!, point[1]! + layer]);
  return Math.max(...levels.map((level) => reach(level) - reach(level - layer)));
}

/** The side of a neck ridge that hangs when the neck stands on the bed, root first. */
export function neckHangingSide(thread: ThreadBasics): FormPoint[] {
  const outline = neckOutline(thread);
  return outline.slice(0, Math.ceil(outline.length / 2));
}

/** The side of a cap ridge that hangs when the cap lies on its top, root first. */
export function capHangingSide(thread: ThreadBasics, clearance: number): FormPoint[] {
  const outline = capOutline(thread, clearance).reverse();
  return outline.slice(0, Math.ceil(outline.length / 2));
}
