import type { Placement, Vec3 } from '@/lib/geometry/kernel';
import type { Extent, Insets, Project, ViewCommands } from './drawing/views';
import type { Moved } from './mesh/arrange';
import type { Box } from './mesh/bounds';
import type { Axis } from './mesh/slice';
import type { Palette } from './palette';
import type { Paint } from './types';

export type BodyStyle = 'solid' | 'see-through' | 'hidden';

export interface Section {
  readonly axis: Axis;
  /** mm */
  readonly at: number;
}

export interface BedLook {
  /** layer lines shown every so many mm */
  readonly layerStep: number;
  readonly placements: Readonly<Record<string, Placement>>;
}

/** What a picture of the part is made from, with or without WebGL. */
export interface PictureProps {
  readonly moved: readonly Moved[];
  readonly styles: Readonly<Record<string, BodyStyle>>;
  readonly palette: Palette;
  readonly paint: Paint;
  readonly scaleEnd: number;
  readonly allowable: number | null;
  readonly section: Section | null;
  readonly bed: BedLook | null;
  /** creases of the part at rest, drawn faintly while it is bent */
  readonly ghost: readonly Moved[];
  /** the part at both ends of its motion, which the picture makes room for when it moves */
  readonly box: Box;
  /** the part as it stands */
  readonly now: Box;
  readonly insets: Insets;
  /** the picture is fitted afresh when this changes */
  readonly fitKey: string;
  readonly onCommands: (commands: ViewCommands | null) => void;
  /** called with each frame: where points of the part are on the screen, and where the eye stands */
  readonly onFrame: (project: Project, size: Extent, eye: Vec3) => void;
}
