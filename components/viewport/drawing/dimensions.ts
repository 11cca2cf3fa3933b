import type { Callout } from '@/generators/contract';
import type { Vec3 } from '@/lib/geometry/kernel';
import { UNIT_SYMBOL } from '@/lib/units';
import type { Extent, Pixel, Project } from './views';

export interface Segment {
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
}

export interface DrawnDimension {
  readonly field: string;
  readonly text: string;
  /** SVG path of the dimension line or arc */
  readonly line: string;
  readonly extensions: readonly Segment[];
  /** SVG paths of filled arrowheads */
  readonly arrows: readonly string[];
  /** middle of the text */
  readonly label: { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
  readonly emphasised: boolean;
}

const ARROW = 8;
const LEG = 2 * ARROW;
const GAP = 3;
const OVERSHOOT = 5;
/** A dimension seen nearly end on, as a share of its true length, cannot be read and is left out. */
const END_ON = 0.16;
const LABEL_HEIGHT = 20;
const CHARACTER = 7.4;

export const SIGN: Readonly<Record<Callout['kind'], string>> = {
  length: '',
  diameter: '⌀\u202f',
  radius: 'R\u202f',
  angle: '',
};

/** To a hundredth, zeros at the end left out, as a drawing states it. */
export function textOf({ kind, value, unit }: Callout): string {
  const symbol = UNIT_SYMBOL[unit];
  return `${SIGN[kind]}${Number(value.toFixed(2))}${kind === 'angle' ? symbol : `\u202f${symbol}`}`;
}

const add = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];

interface Direction2 {
  readonly x: number;
  readonly y: number;
  readonly size: number;
}

function towards(from: Pixel, to: Pixel): Direction2 {
  const size = Math.hypot(to.x - from.x, to.y - from.y);
  return size < 1e-6
    ? { x: 0, y: 0, size: 0 }
    : { x: (to.x - from.x) / size, y: (to.y - from.y) / size, size };
}

function arrowhead(tip: Pixel, { x, y }: { x: number; y: number }): string {
  const back = { x: tip.x - ARROW * x, y: tip.y - ARROW * y };
  const half = ARROW * 0.32;
  return `M${round(tip.x)} ${round(tip.y)}L${round(back.x - half * y)} ${round(back.y + half * x)}L${round(back.x + half * y)} ${round(back.y - half * x)}Z`;
}

const round = (value: number): number => Math.round(value * 10) / 10;

function extension(measured: Pixel, end: Pixel): Segment[] {
  const way = towards(measured, end);
  if (way.size < GAP + 2) return [];
  return [
    {
      x1: round(measured.x + GAP * way.x),
      y1: round(measured.y + GAP * way.y),
      x2: round(end.x + OVERSHOOT * way.x),
      y2: round(end.y + OVERSHOOT * way.y),
    },
  ];
}

interface Laid {
  readonly callout: Callout;
  readonly a: Pixel;
  readonly b: Pixel;
  readonly along: Direction2;
  /** away from the part */
  readonly out: { readonly x: number; readonly y: number };
  readonly extensions: readonly Segment[];
}

/** Of a parallel projection: the three axes' lengths on the screen, squared, add up to twice the scale squared. */
function pixelsPerMm(project: Project): number {
  const origin = project([0, 0, 0]);
  const axes: Vec3[] = [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ];
  return Math.sqrt(axes.reduce((sum, axis) => sum + towards(origin, project(axis)).size ** 2, 0) / 2);
}

function lay(callout: Callout, project: Project, scale: number): Laid | null {
  const [from, to] = [project(callout.from), project(callout.to)];
  const [a, b] = [project(add(callout.from, callout.offset)), project(add(callout.to, callout.offset))];
  const along = towards(a, b);
  const length = Math.hypot(...[0, 1, 2].map((k) => callout.to[k]! - callout.from[k]!));
  if (along.size < Math.max(0.5, END_ON * length * scale)) return null;
  const away = towards(
    { ...from, x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 },
    {
      ...a,
      x: (a.x + b.x) / 2,
      y: (a.y + b.y) / 2,
    },
  );
  const side = away.size < 1 ? -1 : Math.sign(-along.y * away.x + along.x * away.y) || 1;
  return {
    callout,
    a,
    b,
    along,
    out: { x: -along.y * side, y: along.x * side },
    extensions: [...extension(from, a), ...extension(to, b)],
  };
}

/** True where arrows and line fit between the extension lines; else arrows point in from outside legs. */
const isRoomy = ({ along }: Laid): boolean => along.size > 3.2 * ARROW;

type Label = DrawnDimension['label'];

const overlap = (p: Label, q: Label): number =>
  Math.max(0, (p.width + q.width) / 2 - Math.abs(p.x - q.x)) *
  Math.max(0, (p.height + q.height) / 2 - Math.abs(p.y - q.y));

const outside = ({ x, y, width, height }: Label, size: Extent): number =>
  Math.max(0, width / 2 - x) +
  Math.max(0, x + width / 2 - size.width) +
  Math.max(0, height / 2 - y) +
  Math.max(0, y + height / 2 - size.height);

function* beyondEnds({ a, b, along }: Laid, box: Pick<Label, 'width' | 'height'>): Generator<Label> {
  const off = Math.abs(along.x) * (box.width / 2) + Math.abs(along.y) * (box.height / 2) + LEG + 1;
  yield { x: b.x + off * along.x, y: b.y + off * along.y, ...box };
  yield { x: a.x - off * along.x, y: a.y - off * along.y, ...box };
}

/** Places for a text, the preferred first: beside the line, or beyond its ends where the line is short. */
function* places(laid: Laid, width: number): Generator<Label> {
  const { a, b, out } = laid;
  const box = { width, height: LABEL_HEIGHT };
  if (!isRoomy(laid)) yield* beyondEnds(laid, box);
  const reach = Math.abs(out.x) * (width / 2) + Math.abs(out.y) * (LABEL_HEIGHT / 2) + 3;
  for (const step of [0, 1, 2, 3]) {
    const off = reach + step * (LABEL_HEIGHT + 2);
    for (const share of [0.5, 0.3, 0.7, 0, 1]) {
      const x = a.x + share * (b.x - a.x) + off * out.x;
      const y = a.y + share * (b.y - a.y) + off * out.y;
      yield { x, y, ...box };
    }
  }
  yield* beyondEnds(laid, box);
}

function placed(laid: Laid, text: string, taken: readonly Label[], size: Extent): Label {
  const width = text.length * CHARACTER + 10;
  let best: Label | null = null;
  let least = Infinity;
  for (const place of places(laid, width)) {
    const cost = taken.reduce((sum, other) => sum + overlap(place, other), 0) + 1000 * outside(place, size);
    if (cost === 0) return place;
    if (cost < least) [best, least] = [place, cost];
  }
  return best!;
}

function arrowsOf(laid: Laid): { arrows: string[]; line: string } {
  const { callout, a, b, along } = laid;
  const roomy = isRoomy(laid);
  const back = { x: -along.x, y: -along.y };
  const reach = roomy ? 0 : LEG;
  const [start, end] = [
    { x: a.x - reach * along.x, y: a.y - reach * along.y },
    { x: b.x + reach * along.x, y: b.y + reach * along.y },
  ];
  const line = `M${round(start.x)} ${round(start.y)}L${round(end.x)} ${round(end.y)}`;
  const second = arrowhead(b, roomy ? along : back);
  return {
    line,
    arrows: callout.kind === 'radius' ? [second] : [arrowhead(a, roomy ? back : along), second],
  };
}

/**
 * Dimension lines as a drawing office sets them (ISO 129-1, from memory): extension lines stand off the part, arrows
 * point outward, or inward from outside where there is no room, the text stands clear of the line. Texts give way
 * to each other; the emphasised one is set first.
 */
export function drawDimensions(
  callouts: readonly Callout[],
  project: Project,
  size: Extent,
  emphasis: string | null,
): DrawnDimension[] {
  const order = [...callouts].sort((a, b) => Number(b.field === emphasis) - Number(a.field === emphasis));
  const taken: Label[] = [];
  const scale = pixelsPerMm(project);
  return order.flatMap((callout) => {
    const laid = lay(callout, project, scale);
    if (!laid) return [];
    const text = textOf(callout);
    const label = placed(laid, text, taken, size);
    taken.push(label);
    const emphasised = callout.field === emphasis;
    return [
      { field: callout.field, text, label, emphasised, extensions: laid.extensions, ...arrowsOf(laid) },
    ];
  });
}
