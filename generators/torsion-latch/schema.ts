import { angle, choice, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  catchArm: length({
    label: 'Arm to the nose',
    min: 4,
    max: 60,
    step: 0.5,
    default: 14,
    group: 'rocker',
    help: 'From the bars to the holding face of the nose. Longer turns the bars less.',
  }),
  tailArm: length({
    label: 'Arm to the tail',
    min: 4,
    max: 60,
    step: 0.5,
    default: 14,
    group: 'rocker',
    help: 'From the bars to where the finger presses. Longer needs less force.',
  }),
  rockerWidth: length({
    label: 'Rocker width',
    min: 4,
    max: 60,
    step: 0.5,
    default: 10,
    group: 'rocker',
    help: 'Across the rocker, between the bars.',
  }),
  panelThickness: length({
    label: 'Panel thickness',
    min: 1.2,
    max: 8,
    step: 0.1,
    default: 3,
    group: 'rocker',
    help: 'Thickness of rocker and frame; the bars may be thinner.',
  }),
  barShape: choice({
    label: 'Bar section',
    options: [
      { value: 'rectangular', label: 'Rectangular', help: 'Prints flat without support.' },
      { value: 'round', label: 'Round', help: 'Twists evenly; its underside sags a little in print.' },
    ],
    default: 'rectangular',
    group: 'bars',
    help: 'Section of the twisting bars.',
  }),
  barLength: length({
    label: 'Bar length',
    min: 2,
    max: 40,
    step: 0.5,
    default: 8,
    group: 'bars',
    help: 'Each bar, from the rocker to the frame. Longer strains less.',
  }),
  barWidth: length({
    label: 'Bar width',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'bars',
    help: 'Along the panel, in whole line widths.',
  }),
  barThickness: length({
    label: 'Bar thickness',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'bars',
    help: 'Across the panel. The smaller of width and thickness decides the strain.',
  }),
  barDiameter: length({
    label: 'Bar diameter',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'bars',
    help: 'Of a round bar.',
  }),
  barFillet: length({
    label: 'Fillet at the bar ends',
    min: 0.2,
    max: 4,
    step: 0.1,
    default: 1,
    group: 'bars',
    help: 'Radius where a rectangular bar meets rocker and frame: at least half its thickness.',
  }),
  undercut: length({
    label: 'Undercut',
    min: 0.2,
    max: 8,
    step: 0.1,
    default: 1,
    group: 'catch',
    help: 'How far the nose reaches over the edge, and so how far it has to move.',
  }),
  leadInAngle: angle({
    label: 'Lead-in angle',
    min: 15,
    max: 60,
    step: 1,
    default: 30,
    group: 'catch',
    help: 'Between the sloping front of the nose and the direction of closing.',
  }),
  returnAngle: angle({
    label: 'Return angle',
    min: 30,
    max: 90,
    step: 1,
    default: 85,
    group: 'catch',
    help: 'Of the holding face; near 90 degrees it opens only by the tail.',
  }),
  landLength: length({
    label: 'Land',
    min: 0.4,
    max: 6,
    step: 0.1,
    default: 0.8,
    group: 'catch',
    help: 'Flat top of the nose.',
  }),
  railWidth: length({
    label: 'Frame width',
    min: 2,
    max: 20,
    step: 0.5,
    default: 5,
    group: 'frame',
    help: 'Width of the frame the bars stand on.',
  }),
  gap: length({
    label: 'Gap behind the tail',
    min: 0.4,
    max: 10,
    step: 0.1,
    default: 1,
    group: 'frame',
    help: 'Free space between tail and frame.',
  }),
};

export type Values = ValuesOf<typeof fields>;

/** Height of the bars above the bed side of the panel, mm. */
export const barHeight = (p: Values): number => (p.barShape === 'round' ? p.barDiameter : p.barThickness);
export const barSpan = (p: Values): number =>
  p.barShape === 'round' ? p.barDiameter : p.barWidth + 2 * p.barFillet;

export const parameters = defineParameters({
  fields,
  groups: { rocker: 'Rocker', bars: 'Bars', catch: 'Nose', frame: 'Frame' },
  applies: {
    barWidth: (p) => p.barShape === 'rectangular',
    barThickness: (p) => p.barShape === 'rectangular',
    barFillet: (p) => p.barShape === 'rectangular',
    barDiameter: (p) => p.barShape === 'round',
  },
  relations: [
    {
      id: 'bar-in-panel',
      field: 'panelThickness',
      severity: 'refuse',
      holds: (p) => barHeight(p) <= p.panelThickness,
      message: (p) => `Panel thickness must be at least ${barHeight(p)} mm, the height of the bars`,
    },
    {
      id: 'fillets-in-bar',
      field: 'barFillet',
      severity: 'refuse',
      holds: (p) => p.barShape === 'round' || 2 * p.barFillet <= 0.8 * p.barLength,
      message: (p) =>
        `Fillet at the bar ends must be at most ${(0.4 * p.barLength).toFixed(1)} mm, 0.4 of the bar length`,
    },
    {
      id: 'bar-on-rocker',
      field: 'barWidth',
      severity: 'refuse',
      holds: (p) => barSpan(p) / 2 + 0.5 <= Math.min(p.tailArm, p.catchArm),
      message: (p) =>
        `Bar with its fillets, ${barSpan(p).toFixed(1)} mm, must stay 0.5 mm inside both arms of the rocker`,
    },
    {
      id: 'small-turn',
      field: 'undercut',
      severity: 'refuse',
      holds: (p) => p.undercut <= 0.5 * p.catchArm,
      message: (p) =>
        `Undercut must be at most ${(0.5 * p.catchArm).toFixed(1)} mm, half the arm to the nose`,
    },
    {
      id: 'fillet-large-enough',
      field: 'barFillet',
      severity: 'warn',
      holds: (p) => p.barShape === 'round' || p.barFillet >= Math.min(p.barWidth, p.barThickness) / 2,
      message: (p) =>
        `Fillet at the bar ends under ${(Math.min(p.barWidth, p.barThickness) / 2).toFixed(1)} mm, half the bar, cracks at its ends first`,
    },
    {
      id: 'rocker-stiff',
      field: 'panelThickness',
      severity: 'warn',
      holds: (p) => p.panelThickness >= 0.12 * Math.max(p.catchArm, p.tailArm),
      message: (p) =>
        `Panel thickness under ${(0.12 * Math.max(p.catchArm, p.tailArm)).toFixed(1)} mm lets the rocker bend instead of turning`,
    },
  ],
});
