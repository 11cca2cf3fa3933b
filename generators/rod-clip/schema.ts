import { radians } from '@/lib/units';
import { angle, choice, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  rodDiameter: length({
    label: 'Rod diameter',
    min: 1.5,
    max: 80,
    step: 0.1,
    default: 12,
    group: 'ring',
    help: 'Outside diameter of what is held, measured.',
  }),
  play: length({
    label: 'Play of the rod',
    min: -1,
    max: 2,
    step: 0.05,
    default: 0,
    group: 'ring',
    help: 'Bore less rod. 0 holds without strain; negative grips, and the grip fades as the plastic relaxes.',
  }),
  wallThickness: length({
    label: 'Wall at the back',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'ring',
    help: 'Thickness of the ring where it leaves the stem. Strain grows with it.',
  }),
  tipThickness: length({
    label: 'Wall at the lips',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'ring',
    help: 'A wall that thins towards the lips bends more evenly.',
  }),
  wrapAngle: angle({
    label: 'Wrap angle',
    min: 190,
    max: 320,
    step: 1,
    default: 240,
    group: 'ring',
    help: 'How much of the rod the ring goes round. More holds better and strains more.',
  }),
  clipWidth: length({
    label: 'Width along the rod',
    min: 2,
    max: 80,
    step: 0.5,
    default: 10,
    group: 'ring',
    help: 'Forces grow with it, strain does not.',
  }),
  flareAngle: angle({
    label: 'Lead-in flare angle',
    min: 15,
    max: 60,
    step: 1,
    default: 40,
    group: 'mouth',
    help: 'Between the flare and the direction of pushing. Smaller pushes on more easily.',
  }),
  flareLength: length({
    label: 'Lead-in flare length',
    min: 0.5,
    max: 20,
    step: 0.5,
    default: 3,
    group: 'mouth',
    help: 'How far the lips spread outward beyond the mouth.',
  }),
  stemWidth: length({
    label: 'Stem width',
    min: 1,
    max: 40,
    step: 0.5,
    default: 6,
    group: 'foot',
    help: 'The part of the ring over the stem does not bend: a wide stem strains the rest more.',
  }),
  stemHeight: length({
    label: 'Stem height',
    min: 1,
    max: 40,
    step: 0.5,
    default: 2,
    group: 'foot',
    help: 'From the foot to the lowest point of the ring.',
  }),
  stemFillet: length({
    label: 'Fillet at the stem',
    min: 0.3,
    max: 6,
    step: 0.1,
    default: 1,
    group: 'foot',
    help: 'Radius where the ring leaves the stem.',
  }),
  footThickness: length({
    label: 'Foot thickness',
    min: 0.8,
    max: 12,
    step: 0.2,
    default: 3,
    group: 'foot',
    help: 'Whole layers print best.',
  }),
  footOverhang: length({
    label: 'Foot beyond the stem',
    min: 2,
    max: 60,
    step: 0.5,
    default: 12,
    group: 'foot',
    help: 'How far the foot reaches out from the outermost stems, for screws, a strap or tape.',
  }),
  fastening: choice({
    label: 'Held down by',
    options: [
      { value: 'screws', label: 'Screws', help: 'A hole at each end of the foot.' },
      { value: 'strap', label: 'Strap', help: 'A slot at each end of the foot.' },
      { value: 'tape', label: 'Tape or glue', help: 'A plain flat underside.' },
    ],
    default: 'screws',
    group: 'foot',
    help: 'How the foot is fixed.',
  }),
  holeDiameter: length({
    label: 'Screw hole diameter',
    min: 1.5,
    max: 10,
    step: 0.1,
    default: 3.4,
    group: 'foot',
    help: 'Clearance hole for the screw.',
  }),
  slotLength: length({
    label: 'Slot length',
    min: 2,
    max: 60,
    step: 0.5,
    default: 6,
    group: 'foot',
    help: 'Along the rod: the width of the strap and some play.',
  }),
  slotWidth: length({
    label: 'Slot width',
    min: 1,
    max: 10,
    step: 0.1,
    default: 2.5,
    group: 'foot',
    help: 'Thickness of the strap and some play.',
  }),
  clipCount: count({
    label: 'Clips in a row',
    min: 1,
    max: 8,
    default: 1,
    group: 'row',
    help: 'Rings side by side on one foot.',
  }),
  spacing: length({
    label: 'Spacing of the rods',
    min: 4,
    max: 200,
    step: 0.5,
    default: 30,
    group: 'row',
    help: 'Centre to centre.',
  }),
};

export type Values = ValuesOf<typeof fields>;

export const boreOf = (p: Values): number => p.rodDiameter + p.play;
export const halfArcOf = (p: Values): number => radians(p.wrapAngle) / 2;
const outerOf = (p: Values): number => boreOf(p) / 2 + p.wallThickness;

/** Half the free mouth between the rounded lips at rest, mm. */
export function mouthHalf(p: Values): number {
  const lip = (boreOf(p) / 2 + p.tipThickness) * Math.sin(halfArcOf(p));
  return lip - p.tipThickness;
}

/** Farthest the flared lips reach from the middle of a ring, opened for the rod, mm. */
export function reach(p: Values): number {
  const lip = (boreOf(p) / 2 + p.tipThickness) * Math.sin(halfArcOf(p));
  const flare = lip + p.flareLength * Math.sin(radians(p.flareAngle)) + p.tipThickness;
  return Math.max(outerOf(p), flare) + p.rodDiameter / 2 - mouthHalf(p);
}

/** How deep the fillet's centre lies above the foot, mm; it must not reach below it. */
const filletRoom = (p: Values): number => {
  const away = p.stemWidth / 2 + p.stemFillet;
  const span = outerOf(p) + p.stemFillet;
  return outerOf(p) + p.stemHeight - Math.sqrt(Math.max(0, span ** 2 - away ** 2));
};

const footRoom = (p: Values): number => (p.fastening === 'screws' ? p.holeDiameter : p.slotWidth) + 3;

export const parameters = defineParameters({
  fields,
  groups: { ring: 'Ring', mouth: 'Mouth', foot: 'Foot', row: 'Row' },
  applies: {
    spacing: (p) => p.clipCount > 1,
    holeDiameter: (p) => p.fastening === 'screws',
    slotLength: (p) => p.fastening === 'strap',
    slotWidth: (p) => p.fastening === 'strap',
  },
  relations: [
    {
      id: 'bore-positive',
      field: 'play',
      severity: 'refuse',
      holds: (p) => boreOf(p) >= 1,
      message: (p) =>
        `Play must be at least ${(1 - p.rodDiameter).toFixed(1)} mm, which leaves a bore of 1 mm`,
    },
    {
      id: 'tip-not-thicker',
      field: 'tipThickness',
      severity: 'refuse',
      holds: (p) => p.tipThickness <= p.wallThickness,
      message: (p) => `Wall at the lips must be at most ${p.wallThickness} mm, the wall at the back`,
    },
    {
      id: 'wall-in-ring',
      field: 'wallThickness',
      severity: 'refuse',
      holds: (p) => p.wallThickness <= 0.45 * boreOf(p),
      message: (p) =>
        `Wall at the back must be at most ${(0.45 * boreOf(p)).toFixed(2)} mm, 0.45 of the bore`,
    },
    {
      id: 'mouth-open',
      field: 'wrapAngle',
      severity: 'refuse',
      holds: (p) => mouthHalf(p) >= 0.15,
      message: () => 'Wrap angle leaves a mouth under 0.3 mm: reduce it or the wall at the lips',
    },
    {
      id: 'mouth-holds',
      field: 'wrapAngle',
      severity: 'refuse',
      holds: (p) => mouthHalf(p) < p.rodDiameter / 2 - 0.02,
      message: () => 'Wrap angle must be larger: the mouth is as wide as the rod and holds nothing',
    },
    {
      id: 'stem-in-ring',
      field: 'stemWidth',
      severity: 'refuse',
      holds: (p) => p.stemWidth / 2 + p.stemFillet <= 0.8 * outerOf(p),
      message: (p) =>
        `Stem width must be at most ${(1.6 * outerOf(p) - 2 * p.stemFillet).toFixed(1)} mm for this ring and fillet`,
    },
    {
      id: 'fillet-above-foot',
      field: 'stemHeight',
      severity: 'refuse',
      holds: (p) => filletRoom(p) >= 0,
      message: (p) =>
        `Stem height must be at least ${(p.stemHeight - filletRoom(p)).toFixed(2)} mm for this fillet`,
    },
    {
      id: 'fastening-in-foot',
      field: 'footOverhang',
      severity: 'refuse',
      holds: (p) => p.fastening === 'tape' || p.footOverhang >= footRoom(p),
      message: (p) =>
        `Foot beyond the stem must be at least ${footRoom(p).toFixed(1)} mm for its hole or slot`,
    },
    {
      id: 'hole-in-width',
      field: 'holeDiameter',
      severity: 'refuse',
      holds: (p) => p.fastening !== 'screws' || p.holeDiameter + 2 <= p.clipWidth,
      message: (p) =>
        `Screw hole diameter must be at most ${(p.clipWidth - 2).toFixed(1)} mm, 2 mm less than the width`,
    },
    {
      id: 'slot-in-width',
      field: 'slotLength',
      severity: 'refuse',
      holds: (p) => p.fastening !== 'strap' || p.slotLength + 2 <= p.clipWidth,
      message: (p) =>
        `Slot length must be at most ${(p.clipWidth - 2).toFixed(1)} mm, 2 mm less than the width`,
    },
    {
      id: 'rods-apart',
      field: 'spacing',
      severity: 'refuse',
      holds: (p) => p.clipCount === 1 || p.spacing >= 2 * reach(p) + 0.5,
      message: (p) =>
        `Spacing of the rods must be at least ${(2 * reach(p) + 0.5).toFixed(1)} mm, so that neighbours clear each other when opened`,
    },
    {
      id: 'driver-clears',
      field: 'footOverhang',
      severity: 'warn',
      holds: (p) =>
        p.fastening !== 'screws' || p.stemWidth / 2 + p.footOverhang - footRoom(p) / 2 >= outerOf(p),
      message: (p) =>
        `Foot beyond the stem under ${(outerOf(p) + footRoom(p) / 2 - p.stemWidth / 2).toFixed(1)} mm leaves the screw under the ring, out of a driver's reach`,
    },
  ],
});
