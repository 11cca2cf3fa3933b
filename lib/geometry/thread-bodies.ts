import type { Kernel, Loop, Solid, Vec2 } from './kernel';
import { loopArea } from './loops';
import { rotation } from './placement';
import { type FormPoint, type Ridge, ridgeMesh, ridgeVolume } from './thread';

/** Radius of the corners of a polygon of n sides whose sides touch a circle: holes are cut with it, so that they are no smaller than named. */
export const aroundCircle = (radius: number, segments: number): number =>
  radius / Math.cos(Math.PI / segments);

/** Turned by half a facet against the rings of a ridge: no vertex of the wall meets one of the thread. */
function turnedWall(kernel: Kernel, section: Loop): Solid {
  const { segmentsPerTurn } = kernel.quality;
  return kernel.place(kernel.revolve({ loops: [section] }), rotation('z', Math.PI / segmentsPerTurn));
}

/**
 * A body of revolution with an outward thread on it, joined to `further` solids; `section` is counter-clockwise in
 * (radius, height).
 */
export const threadedBody = (
  kernel: Kernel,
  section: Loop,
  ridge: Ridge,
  further: readonly Solid[] = [],
): Solid =>
  kernel.union([
    turnedWall(kernel, section),
    kernel.fromMesh(ridgeMesh(ridge, kernel.quality.segmentsPerTurn)),
    ...further,
  ]);

/** Volume of a revolved section with as many facets, mm3. */
export function revolvedVolume(section: Loop, segments: number): number {
  let moment = 0;
  for (let at = 0; at < section.length; at += 1) {
    const [r0, z0] = section[at]!;
    const [r1, z1] = section[(at + 1) % section.length]!;
    moment += ((r0 * r0 + r0 * r1 + r1 * r1) / 6) * (z1 - z0);
  }
  return segments * Math.sin((2 * Math.PI) / segments) * moment;
}

export const threadedVolume = (section: Loop, ridge: Ridge, segments: number): number =>
  revolvedVolume(section, segments) + ridgeVolume(ridge, segments);

export interface NeckShape {
  /** radii, mm */
  readonly core: number;
  readonly bore: number;
  readonly flange: number;
  /** shoulder at 0, rim at `height`, flange below the shoulder */
  readonly height: number;
  readonly flangeThickness: number;
  /** 45 degree chamfers of the rim, outside and in the bore */
  readonly rimChamfer: number;
  readonly boreChamfer: number;
}

/** Section of a neck on a flange, counter-clockwise from the lower corner of the bore. */
export function neckSection(neck: NeckShape, segments: number): Vec2[] {
  const bore = aroundCircle(neck.bore, segments);
  const { core, flange, height, flangeThickness, rimChamfer, boreChamfer } = neck;
  const entry: Vec2[] =
    boreChamfer > 0
      ? [
          [bore + boreChamfer, height],
          [bore, height - boreChamfer],
        ]
      : [[bore, height]];
  return [
    [bore, -flangeThickness],
    [flange, -flangeThickness],
    [flange, 0],
    [core, 0],
    [core, height - rimChamfer],
    [core - rimChamfer, height],
    ...entry,
  ];
}

/** What meets the rim under the top of a cap. Radii and lengths in mm. */
export type CapSeal =
  | { readonly kind: 'none' }
  | { readonly kind: 'land'; readonly inner: number; readonly outer: number; readonly height: number }
  | {
      readonly kind: 'plug';
      /** 0 for a solid plug */
      readonly inner: number;
      readonly outer: number;
      readonly length: number;
      readonly tipChamfer: number;
    };

export interface CapShape {
  /** outline of the outside, counter-clockwise */
  readonly outline: Loop;
  /** heights: mouth, the rim it comes to rest on, top */
  readonly mouth: number;
  readonly rim: number;
  readonly top: number;
  /** radius of the wall between the ridges */
  readonly bore: number;
  readonly mouthChamfer: number;
  readonly seal: CapSeal;
}

/** The part of the cavity's section below the top, from the wall inward to the axis. */
function ceiling({ rim, bore, seal }: CapShape, around: (radius: number) => number): Vec2[] {
  if (seal.kind === 'none') {
    return [
      [around(bore), rim],
      [0, rim],
    ];
  }
  if (seal.kind === 'land') {
    const roof = rim + seal.height;
    return [
      [around(bore), roof],
      [seal.outer, roof],
      [seal.outer, rim],
      [around(seal.inner), rim],
      [around(seal.inner), roof],
      [0, roof],
    ];
  }
  const tip = rim - seal.length;
  const inside: Vec2[] =
    seal.inner > 0
      ? [
          [around(seal.inner), tip],
          [around(seal.inner), rim],
          [0, rim],
        ]
      : [[0, tip]];
  return [
    [around(bore), rim],
    [seal.outer, rim],
    [seal.outer, tip + seal.tipChamfer],
    [seal.outer - seal.tipChamfer, tip],
    ...inside,
  ];
}

/** How far the cavity is cut past the mouth, so that no two faces lie in one plane. */
const PAST = 1;

/** Section of what is hollow in a cap, counter-clockwise from the axis below the mouth. */
function cavitySection(cap: CapShape, segments: number, past: number): Vec2[] {
  const around = (radius: number) => aroundCircle(radius, segments);
  const open = around(cap.bore) + cap.mouthChamfer;
  const below: Vec2[] =
    past > 0
      ? [
          [0, cap.mouth - past],
          [open, cap.mouth - past],
        ]
      : [[0, cap.mouth]];
  return [
    ...below,
    [open, cap.mouth],
    [around(cap.bore), cap.mouth + cap.mouthChamfer],
    ...ceiling(cap, around),
  ];
}

/** A cap: outline extruded, cavity cut, ridges joined: two booleans whatever the grip. */
export function capBody(kernel: Kernel, cap: CapShape, ridge: Ridge): Solid {
  const { segmentsPerTurn } = kernel.quality;
  const height = cap.top - cap.mouth;
  const block = kernel.place(kernel.extrude({ loops: [cap.outline] }, height), [
    1,
    0,
    0,
    0,
    0,
    1,
    0,
    0,
    0,
    0,
    1,
    0,
    0,
    0,
    cap.mouth,
    1,
  ]);
  const shell = kernel.subtract(block, [turnedWall(kernel, cavitySection(cap, segmentsPerTurn, PAST))]);
  return kernel.union([shell, kernel.fromMesh(ridgeMesh(ridge, segmentsPerTurn))]);
}

export const capVolume = (cap: CapShape, ridge: Ridge, segments: number): number =>
  loopArea(cap.outline) * (cap.top - cap.mouth) -
  revolvedVolume(cavitySection(cap, segments, 0), segments) +
  ridgeVolume(ridge, segments);

export type Grip = 'plain' | 'ribs' | 'knurl';

/** Spacing and height of grip ribs and of a straight knurl, mm, and the shape of one: [share of the spacing, of the height]. */
const GRIPS: Readonly<
  Record<Exclude<Grip, 'plain'>, { pitch: number; rise: number; shape: readonly Vec2[] }>
> = {
  ribs: {
    pitch: 3.6,
    rise: 0.8,
    shape: [
      [-0.3, 0],
      [-0.2, 0.75],
      [0, 1],
      [0.2, 0.75],
      [0.3, 0],
    ],
  },
  knurl: {
    pitch: 1.8,
    rise: 0.6,
    shape: [
      [-0.5, 0],
      [0, 1],
    ],
  },
};

/** How far a grip stands out of the wall, mm. */
export const gripRise = (grip: Grip): number => (grip === 'plain' ? 0 : GRIPS[grip].rise);

const onCircle = (radius: number, turn: number): FormPoint => [
  radius * Math.cos(2 * Math.PI * turn),
  radius * Math.sin(2 * Math.PI * turn),
];

/** Outline of a cap of a radius measured in the valleys: ribs and straight knurls are part of one loop. */
export function gripOutline(grip: Grip, radius: number, segments: number): Vec2[] {
  if (grip === 'plain') {
    const corner = aroundCircle(radius, segments);
    return Array.from({ length: segments }, (_, at) => onCircle(corner, at / segments));
  }
  const { pitch, rise, shape } = GRIPS[grip];
  const count = Math.max(12, Math.round((2 * Math.PI * radius) / pitch));
  return Array.from({ length: count }, (_, at) =>
    shape.map(([share, high]) => onCircle(radius + rise * high, (at + share) / count)),
  ).flat();
}
