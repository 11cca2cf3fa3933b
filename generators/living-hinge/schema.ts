import { angle, choice, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  leafLength: length({
    label: 'Leaf length',
    min: 5,
    max: 200,
    step: 1,
    default: 20,
    group: 'leaf',
    help: 'From the web to the outer edge of one leaf.',
  }),
  leafWidth: length({
    label: 'Width along the fold',
    min: 4,
    max: 300,
    step: 1,
    default: 30,
    group: 'leaf',
    help: 'Length of the fold line. Very long hinges fold more evenly in two or more sections.',
  }),
  leafThickness: length({
    label: 'Leaf thickness',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'leaf',
    help: 'Thick enough that only the web bends: five times the web or more.',
  }),
  webThickness: length({
    label: 'Web thickness',
    min: 0.2,
    max: 2,
    step: 0.05,
    default: 0.4,
    group: 'web',
    help: 'Strain grows in proportion to it. Print it in whole layers, at least two.',
  }),
  webLength: length({
    label: 'Web length',
    min: 0.5,
    max: 60,
    step: 0.1,
    default: 3,
    group: 'web',
    help: 'Gap between the leaves that bends. Longer is gentler.',
  }),
  webFillet: length({
    label: 'Web fillet',
    min: 0.1,
    max: 3,
    step: 0.05,
    default: 0.4,
    group: 'web',
    help: 'Radius where the web runs into the leaf. Small radii concentrate the strain at the edge.',
  }),
  webRelief: length({
    label: 'Web recess',
    min: 0,
    max: 4,
    step: 0.05,
    default: 0,
    group: 'web',
    help: 'How far the web lies inside the flat face, so that the leaves can meet. 0: web on the bed, flush.',
  }),
  foldAngle: angle({
    label: 'Fold angle',
    min: 5,
    max: 180,
    step: 5,
    default: 180,
    group: 'fold',
    help: 'From flat as printed to the furthest position in use.',
  }),
  foldTowards: choice({
    label: 'Folds towards',
    options: [
      {
        value: 'flat-face',
        label: 'Flat face inside',
        help: 'The flush faces come together; the groove opens.',
      },
      { value: 'groove', label: 'Groove inside', help: 'The groove closes; the leaf edges meet early.' },
    ],
    default: 'flat-face',
    group: 'fold',
    help: 'Which faces come together. The stretched side decides the strain.',
  }),
  closing: choice({
    label: 'When folded',
    options: [
      { value: 'free', label: 'Leaves stand apart', help: 'The web takes its own even curve.' },
      { value: 'shut', label: 'Pressed face to face', help: 'Only at 180 degrees: the web is bent sharper.' },
    ],
    default: 'free',
    group: 'fold',
    help: 'Pressing a lid shut bends a flush web up to three and a half times as sharply.',
  }),
  holeDiameter: length({
    label: 'Hole diameter',
    min: 1,
    max: 12,
    step: 0.1,
    default: 3.2,
    group: 'holes',
    help: 'Through holes for screws or for glue to key into.',
  }),
  holeCount: count({
    label: 'Holes in each leaf',
    min: 0,
    max: 20,
    default: 2,
    group: 'holes',
    help: 'Evenly spaced along the middle of each leaf. 0 for none.',
  }),
  layerHeight: length({
    label: 'Layer height',
    min: 0.05,
    max: 0.4,
    step: 0.01,
    default: 0.2,
    group: 'print',
    help: 'The web should be a whole number of layers thick.',
  }),
};

export type Values = ValuesOf<typeof fields>;

/** Groove depth above the web, mm. */
export const grooveDepth = (p: Values): number => p.leafThickness - p.webRelief - p.webThickness;

const holeSpan = (p: Values): number => p.holeCount * (p.holeDiameter + 2);

export const parameters = defineParameters({
  fields,
  groups: { leaf: 'Leaves', web: 'Web', fold: 'Fold', holes: 'Holes', print: 'Print' },
  applies: {
    closing: (p) => p.foldAngle === 180,
    holeDiameter: (p) => p.holeCount > 0,
  },
  relations: [
    {
      id: 'web-inside-leaf',
      field: 'webRelief',
      severity: 'refuse',
      holds: (p) => grooveDepth(p) >= 0.1,
      message: (p) =>
        `Web recess and web thickness together must be at least 0.1 mm less than the leaf thickness of ${p.leafThickness} mm`,
    },
    {
      id: 'relief-not-past-middle',
      field: 'webRelief',
      severity: 'refuse',
      holds: (p) => p.webRelief <= (p.leafThickness - p.webThickness) / 2 + 1e-9,
      message: (p) =>
        `Web recess must be at most ${((p.leafThickness - p.webThickness) / 2).toFixed(2)} mm, which centres the web; turn the part over instead`,
    },
    {
      id: 'fillet-in-groove',
      field: 'webFillet',
      severity: 'refuse',
      holds: (p) => p.webFillet <= grooveDepth(p) + 1e-9,
      message: (p) => `Web fillet must be at most the groove depth of ${grooveDepth(p).toFixed(2)} mm`,
    },
    {
      id: 'fillets-in-web',
      field: 'webFillet',
      severity: 'refuse',
      holds: (p) => 2 * p.webFillet <= 0.8 * p.webLength + 1e-9,
      message: (p) =>
        `Web fillet must be at most ${(0.4 * p.webLength).toFixed(2)} mm, 0.4 of the web length`,
    },
    {
      id: 'holes-in-leaf',
      field: 'holeDiameter',
      severity: 'refuse',
      holds: (p) => p.holeCount === 0 || p.holeDiameter + 3 <= p.leafLength,
      message: (p) =>
        `Hole diameter must be at most ${(p.leafLength - 3).toFixed(1)} mm, 3 mm less than the leaf length`,
    },
    {
      id: 'holes-in-row',
      field: 'holeCount',
      severity: 'refuse',
      holds: (p) => p.holeCount === 0 || holeSpan(p) <= p.leafWidth,
      message: (p) =>
        `Holes in each leaf must be at most ${Math.floor(p.leafWidth / (p.holeDiameter + 2))} for a width of ${p.leafWidth} mm, 2 mm between them`,
    },
    {
      id: 'leaf-stiff',
      field: 'leafThickness',
      severity: 'warn',
      holds: (p) => p.leafThickness >= 2.5 * p.webThickness,
      message: (p) =>
        `Leaf thickness under ${(2.5 * p.webThickness).toFixed(1)} mm, 2.5 times the web, bends along with the web`,
    },
    {
      id: 'long-fold',
      field: 'leafWidth',
      severity: 'warn',
      holds: (p) => p.leafWidth <= 150,
      message: () => 'Width along the fold over 150 mm folds unevenly: use two or more sections',
    },
  ],
});
