import type { Family } from '@/generators/contract';
import { choice, count, defineParameters, length, toggle } from '@/generators/parameters';
import { judgedFigure, plainFigure, report } from '@/generators/report';
import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Quantity, Source } from '@/lib/materials/types';
import type { Unit } from '@/lib/units';

const source: Source = { text: 'made for tests', mark: 'given' };
const quantity = (value: number, unit: Unit): Quantity => ({ value, unit, source });
const judgement = { rating: 'unknown', because: 'not looked at', source } as const;

/** A made-up plastic with round numbers: once 4 %, often 2.4 %. */
export const ROUND_PLASTIC: Material = {
  id: 'round',
  name: 'Round plastic',
  shortName: 'RP',
  process: 'printed',
  summary: 'round numbers',
  flexuralModulus: quantity(1000, 'MPa'),
  tensileModulus: null,
  tensileModulusAcross: null,
  secant: { kind: 'constant', slope: 0, validTo: 0.04, assumed: false, source },
  poisson: quantity(0.4, 'ratio'),
  yieldStrain: null,
  tensileStrength: null,
  tensileStrengthAcross: null,
  allowableOnce: quantity(0.04, 'strain'),
  allowableOften: quantity(0.024, 'strain'),
  allowableAcross: null,
  friction: { value: 0.3, low: 0.2, high: 0.4, unit: 'ratio', source },
  density: quantity(1, 'g/cm3'),
  heatDeflection: null,
  glassTransition: null,
  continuousService: null,
  thermalExpansion: null,
  shrinkage: null,
  print: null,
  weather: judgement,
  chemicals: judgement,
  gluing: judgement,
  foldEndurance: { class: 'unknown', because: 'not looked at', source },
  drawsWhenFolded: false,
  price: null,
};

export const STIFF_PLASTIC: Material = {
  ...ROUND_PLASTIC,
  id: 'stiff',
  name: 'Stiff plastic',
  shortName: 'SP',
  allowableOnce: quantity(0.01, 'strain'),
  allowableOften: quantity(0.006, 'strain'),
};

const parameters = defineParameters({
  groups: { arm: 'Arm', catch: 'Catch' },
  fields: {
    armLength: length({
      label: 'Arm length',
      group: 'arm',
      help: 'Free length.',
      min: 4,
      max: 60,
      step: 0.5,
      default: 18,
    }),
    thickness: length({
      label: 'Thickness',
      group: 'arm',
      help: 'At the root.',
      min: 0.8,
      max: 6,
      step: 0.1,
      default: 2,
    }),
    tip: length({
      label: 'Tip thickness',
      group: 'arm',
      help: 'At the tip.',
      min: 0.4,
      max: 6,
      step: 0.1,
      default: 2,
    }),
    undercut: length({
      label: 'Undercut',
      group: 'catch',
      help: 'How far it catches.',
      min: 0.2,
      max: 6,
      step: 0.1,
      default: 1.2,
    }),
    arms: count({
      label: 'Arms',
      group: 'catch',
      help: 'How many arms.',
      min: 1,
      max: 8,
      default: 2,
    }),
    shape: choice({
      label: 'Catch shape',
      group: 'catch',
      help: 'Sharp or round.',
      options: [
        { value: 'sharp', label: 'sharp' },
        { value: 'round', label: 'round' },
      ],
      default: 'sharp',
    }),
    noseRadius: length({
      label: 'Nose radius',
      group: 'catch',
      help: 'Of the round catch.',
      min: 0.1,
      max: 2,
      step: 0.1,
      default: 0.5,
    }),
    receiver: toggle({ label: 'Receiver', group: 'catch', help: 'With the window plate.', default: true }),
  },
  applies: { noseRadius: ({ shape }) => shape === 'round' },
  relations: [
    {
      id: 'tip-thicker',
      field: 'tip',
      severity: 'refuse',
      holds: ({ tip, thickness }) => tip <= thickness,
      message: ({ thickness }) => `Tip thickness must be at most the thickness, ${thickness} mm`,
    },
    {
      id: 'thin-tip',
      field: 'tip',
      severity: 'warn',
      holds: ({ tip }) => tip >= 0.8,
      message: () => 'Tip thickness under 0.8 mm prints as one line',
    },
  ],
});

/** Strain of a straight arm of constant thickness, 1.5 y t / L2. */
export const tinyStrain = (values: { undercut: number; thickness: number; armLength: number }): number =>
  (1.5 * values.undercut * values.thickness) / values.armLength ** 2;

/** A straight arm with few dimensions, whose every number can be worked out by hand. */
export const TINY: Family = {
  about: {
    id: 'tiny',
    kind: 'clips',
    name: 'Tiny hook',
    summary: 'A straight arm.',
    rightWhen: 'a test needs it',
    wrongWhen: 'a person does',
    bendsBy: 'bending',
  },
  parameters,
  presets: [
    {
      id: 'lid',
      name: 'Lid hook',
      purpose: 'a lid',
      material: 'round',
      use: { opening: 'often', layers: 'along', temperature: 23 },
      values: { armLength: 20 },
    },
    {
      id: 'short',
      name: 'Short hook',
      purpose: 'a short space',
      material: 'stiff',
      use: { opening: 'once', layers: 'along', temperature: 23 },
      values: { armLength: 10 },
    },
  ],
  check(values, material, use) {
    const allowable = allowableStrain(material, use);
    const value = tinyStrain(values);
    return report({
      governing: 'peak-strain',
      headline: ['mating-force'],
      allowable,
      curves: [],
      figures: [
        judgedFigure({
          id: 'peak-strain',
          label: 'Peak strain',
          unit: 'strain',
          value,
          handbook: value,
          limit: allowable.value,
          because: 'at the root',
          source,
        }),
        plainFigure({
          id: 'mating-force',
          label: 'Force to close',
          unit: 'N',
          value: values.arms * values.undercut,
          because: 'each arm',
          source,
        }),
        judgedFigure({
          id: 'room',
          label: 'Room',
          unit: 'mm',
          value: values.armLength,
          limit: 40,
          because: 'the case is small',
          source,
        }),
      ],
    });
  },
  build: () => [],
  volumes: () => null,
  motion: (values) => ({
    label: 'Flex',
    from: 'at rest',
    to: 'past the edge',
    peakStrain: tinyStrain(values),
    pose: () => {},
  }),
  callouts: () => [],
  stances: () => [],
};
