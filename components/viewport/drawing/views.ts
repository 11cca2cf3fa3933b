import type { Vec3 } from '@/lib/geometry/kernel';
import { type Box, centreOf, cornersOf } from '../mesh/bounds';

export type ViewName = 'front' | 'back' | 'left' | 'right' | 'top' | 'below' | 'corner';

/** Where the eye stands, seen from the part: degrees about +z from the front (-y), and degrees above the bed. */
export interface Direction {
  readonly turn: number;
  readonly rise: number;
}

export interface StandardView extends Direction {
  readonly name: ViewName;
  readonly label: string;
  readonly key: string;
}

export const VIEWS: readonly StandardView[] = [
  { name: 'front', label: 'Front', key: '1', turn: 0, rise: 0 },
  { name: 'back', label: 'Back', key: '2', turn: 180, rise: 0 },
  { name: 'left', label: 'Left', key: '3', turn: -90, rise: 0 },
  { name: 'right', label: 'Right', key: '4', turn: 90, rise: 0 },
  { name: 'top', label: 'Top', key: '5', turn: 0, rise: 90 },
  { name: 'below', label: 'Below', key: '6', turn: 0, rise: -90 },
  { name: 'corner', label: 'Corner', key: '7', turn: 32, rise: 26 },
];

export const viewNamed = (name: ViewName): StandardView => VIEWS.find((view) => view.name === name)!;

/** What the buttons and keys ask of whichever picture is shown. */
export interface ViewCommands {
  fit(): void;
  look(name: ViewName): void;
  /** degrees */
  turn(turn: number, rise: number): void;
  /** above 1 comes closer */
  zoom(factor: number): void;
}

/** Unit vectors of a picture: to the right, upwards, and towards the eye. */
export interface Frame {
  readonly right: Vec3;
  readonly up: Vec3;
  readonly eye: Vec3;
}

export function frameOf({ turn, rise }: Direction): Frame {
  const [t, r] = [(turn * Math.PI) / 180, (rise * Math.PI) / 180];
  const [ct, st, cr, sr] = [Math.cos(t), Math.sin(t), Math.cos(r), Math.sin(r)];
  return {
    right: [ct, st, 0],
    up: [-st * sr, ct * sr, cr].map((v) => v + 0) as unknown as Vec3,
    eye: [st * cr, -ct * cr, sr],
  };
}

export const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

/** A point on the screen in pixels from the top left; `depth` grows towards the eye. */
export interface Pixel {
  readonly x: number;
  readonly y: number;
  readonly depth: number;
}

export type Project = (point: Vec3) => Pixel;

export interface Extent {
  readonly width: number;
  readonly height: number;
}

/** Parallel projection; `scale` in pixels per mm, the target in the middle. */
export function parallel(frame: Frame, target: Vec3, scale: number, size: Extent): Project {
  return (point) => {
    const from: Vec3 = [point[0] - target[0], point[1] - target[1], point[2] - target[2]];
    return {
      x: size.width / 2 + scale * dot(from, frame.right),
      y: size.height / 2 - scale * dot(from, frame.up),
      depth: dot(from, frame.eye),
    };
  };
}

/** Share of the picture the part fills, the rest is for dimensions. */
export const FILL = 0.84;

/** Heights in pixels covered by buttons and scales. */
export interface Insets {
  readonly top: number;
  readonly bottom: number;
}

export interface Fit {
  readonly target: Vec3;
  /** pixels per mm */
  readonly scale: number;
}

/** Target and scale that bring a box into the part of the picture left free. */
export function fitBox(box: Box, frame: Frame, size: Extent, insets: Insets): Fit {
  const corners = cornersOf(box);
  const spread = (axis: Vec3) => {
    const along = corners.map((corner) => dot(corner, axis));
    return Math.max(1e-3, Math.max(...along) - Math.min(...along));
  };
  const height = Math.max(size.height / 3, size.height - insets.top - insets.bottom);
  const scale = FILL * Math.min(size.width / spread(frame.right), height / spread(frame.up));
  const raise = (insets.top - insets.bottom) / 2 / scale;
  const target = centreOf(box).map((value, axis) => value + raise * frame.up[axis]!);
  return { target: target as unknown as Vec3, scale };
}
