import type { Web } from '@/lib/mechanics/web';
import { radians } from '@/lib/units';
import { LEAST_UNDER_MARK, markFields, markRoom, markWidth } from '../coupon';
import { angle, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  layerHeight: length({
    label: 'Layer height',
    min: 0.05,
    max: 0.4,
    step: 0.01,
    default: 0.2,
    group: 'web',
    help: 'Of your print. Webs grow by one layer each.',
  }),
  firstLayers: count({
    label: 'Layers of the first web',
    min: 1,
    max: 6,
    default: 2,
    group: 'web',
    help: 'Two layers hold together; one rarely does.',
  }),
  hinges: count({
    label: 'Hinges',
    min: 2,
    max: 8,
    default: 4,
    group: 'web',
    help: 'Each has one layer more in its web than the one before.',
  }),
  webLength: length({
    label: 'Web length',
    min: 0.6,
    max: 20,
    step: 0.1,
    default: 3,
    group: 'web',
    help: 'Across the fold, from leaf to leaf. Take that of the hinge you want to know about.',
  }),
  webFillet: length({
    label: 'Web fillet',
    min: 0,
    max: 3,
    step: 0.1,
    default: 0.4,
    group: 'web',
    help: 'Rounding where the web meets the leaves.',
  }),
  foldAngle: angle({
    label: 'Fold angle',
    min: 30,
    max: 180,
    step: 5,
    default: 180,
    group: 'web',
    help: 'How far each hinge is folded in the test.',
  }),
  leafLength: length({
    label: 'Leaf length',
    min: 6,
    max: 40,
    step: 0.5,
    default: 14,
    group: 'leaf',
    help: 'Of the free leaves, to fold them by.',
  }),
  leafWidth: length({
    label: 'Leaf width',
    min: 6,
    max: 40,
    step: 0.5,
    default: 12,
    group: 'leaf',
    help: 'Along the fold.',
  }),
  leafThickness: length({
    label: 'Leaf thickness',
    min: 1,
    max: 6,
    step: 0.1,
    default: 2.4,
    group: 'leaf',
    help: 'Stiff against the thickest web.',
  }),
  ...markFields,
};

export type Values = ValuesOf<typeof fields>;

/** Layers in each web. */
export const layersOf = (p: Values): number[] =>
  Array.from({ length: p.hinges }, (_, at) => p.firstLayers + at);
export const thicknessOf = (p: Values, layers: number): number => layers * p.layerHeight;
export const thickest = (p: Values): number => thicknessOf(p, layersOf(p).at(-1)!);

export const webOf = (p: Values, layers: number): Web => ({
  length: p.webLength,
  thickness: thicknessOf(p, layers),
  leafThickness: p.leafThickness,
  relief: 0,
  fillet: p.webFillet,
  foldTowards: 'flat-face',
});

export const foldOf = (p: Values, layers: number) => ({
  web: webOf(p, layers),
  angle: radians(p.foldAngle),
  pressedTo: null,
});

/** Between free leaves, so that each folds by itself, mm. */
export const SPACE = 1.5;
export const pitchOf = (p: Values): number => p.leafWidth + SPACE;
/** Depth of the leaf that all hinges share. */
export const backDepth = (p: Values): number => Math.max(8, markRoom(p) + 4);

export const parameters = defineParameters({
  fields,
  groups: { web: 'Webs', leaf: 'Leaves', marks: 'Marks' },
  applies: { markHeight: (p) => p.marks !== 'none' },
  relations: [
    {
      id: 'web-under-leaf',
      field: 'leafThickness',
      severity: 'refuse',
      holds: (p) => p.leafThickness >= 2 * thickest(p) - 1e-9,
      message: (p) =>
        `Leaf thickness must be at least ${(2 * thickest(p)).toFixed(2)} mm, twice the thickest web`,
    },
    {
      id: 'fillet-in-web',
      field: 'webFillet',
      severity: 'refuse',
      holds: (p) => p.webFillet <= Math.min(0.4 * p.webLength, p.leafThickness - thickest(p)) + 1e-9,
      message: (p) =>
        `Web fillet must be at most ${Math.min(0.4 * p.webLength, p.leafThickness - thickest(p)).toFixed(2)} mm, 0.4 of the web length and no higher than the leaf`,
    },
    {
      id: 'figures-fit',
      field: 'markHeight',
      severity: 'refuse',
      holds: (p) => markWidth(String(layersOf(p).at(-1)), p) <= pitchOf(p) + 1e-9,
      message: (p) =>
        `Height of the figures must be at most ${((p.markHeight * pitchOf(p)) / markWidth(String(layersOf(p).at(-1)), p)).toFixed(1)} mm, or they run into each other`,
    },
    {
      id: 'under-figures',
      field: 'leafThickness',
      severity: 'refuse',
      holds: (p) => p.marks !== 'cut' || p.leafThickness >= LEAST_UNDER_MARK + 0.6,
      message: () =>
        `Leaf thickness must be at least ${LEAST_UNDER_MARK + 0.6} mm under figures that are cut in`,
    },
    {
      id: 'one-layer',
      field: 'firstLayers',
      severity: 'warn',
      holds: (p) => p.firstLayers >= 2,
      message: () => 'Layers of the first web: a single layer has nothing to hold on to and often tears off',
    },
  ],
});

/** Middle of a hinge along the fold, mm. */
export const middleAt = (p: Values, index: number): number => (index - (p.hinges - 1) / 2) * pitchOf(p);
export const backWidth = (p: Values): number => p.hinges * pitchOf(p) - SPACE;
