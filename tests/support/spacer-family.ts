import type { Family } from '@/generators/contract';
import { choice, count, defineParameters, length, toggle, type ValuesOf } from '@/generators/parameters';
import { translation } from '@/lib/geometry/placement';
import { polygonArea } from './kernel-fixtures';

const fields = {
  diameter: length({
    label: 'Diameter',
    group: 'size',
    help: 'Outside.',
    min: 4,
    max: 60,
    step: 0.5,
    default: 20,
  }),
  bore: length({ label: 'Bore', group: 'size', help: 'Inside.', min: 1, max: 50, step: 0.5, default: 8 }),
  height: length({
    label: 'Height',
    group: 'size',
    help: 'Along z.',
    min: 0.4,
    max: 40,
    step: 0.2,
    default: 5,
  }),
  pieces: count({ label: 'Pieces', group: 'size', help: 'How many.', min: 1, max: 3, default: 2 }),
  shape: choice({
    label: 'Shape',
    group: 'size',
    help: 'Outline.',
    options: [
      { value: 'round', label: 'Round' },
      { value: 'square', label: 'Square' },
    ],
    default: 'round',
  }),
  bored: toggle({ label: 'Bored', group: 'size', help: 'With the bore.', default: true }),
};
type Spacer = ValuesOf<typeof fields>;

/** A family of plain spacers for tests of what serves every family. */
export const spacerFamily: Family<Spacer> = {
  about: {
    id: 'spacer',
    kind: 'mounts',
    name: 'Spacer',
    summary: 'A bored disc.',
    rightWhen: 'two parts stand apart',
    wrongWhen: 'it must bend',
    bendsBy: 'nothing',
  },
  parameters: defineParameters({
    fields,
    groups: { size: 'Size' },
    relations: [
      {
        id: 'wall',
        field: 'bore',
        severity: 'refuse',
        holds: ({ bore, diameter }) => bore <= diameter - 2,
        message: ({ diameter }) => `Bore must be at most ${diameter - 2} mm, the diameter less 2 mm`,
      },
    ],
  }),
  presets: [],
  check: () => {
    throw new Error('a spacer is not checked');
  },
  build: ({ diameter, bore, height, pieces, shape, bored }, kernel) => {
    const { circle, rectangle, subtract } = kernel.outlines;
    const outside = shape === 'round' ? circle(diameter / 2) : rectangle(diameter, diameter);
    const outline = bored ? subtract(outside, [circle(bore / 2)]) : outside;
    return Array.from({ length: pieces }, (_, at) => ({
      name: `spacer-${at + 1}`,
      solid: kernel.place(kernel.extrude(outline, height), translation([0, 0, at * (height + 1)])),
    }));
  },
  volumes: ({ diameter, bore, height, pieces, shape, bored }, segments) => {
    const outside = shape === 'round' ? polygonArea(diameter / 2, segments) : diameter ** 2;
    const volume = (outside - (bored ? polygonArea(bore / 2, segments) : 0)) * height;
    return Object.fromEntries(Array.from({ length: pieces }, (_, at) => [`spacer-${at + 1}`, volume]));
  },
  motion: () => ({ label: 'None', from: 'rest', to: 'rest', peakStrain: 0, pose: () => undefined }),
  callouts: () => [],
  stances: () => [{ id: 'flat', label: 'Flat', because: 'widest face down', layers: 'along', orient: {} }],
};
