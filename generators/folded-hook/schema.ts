import { radians } from '@/lib/units';
import { angle, choice, defineParameters, length, toggle, type ValuesOf } from '../parameters';

const fields = {
  shape: choice({
    label: 'Shape',
    options: [
      { value: 'u', label: 'U', help: 'Up from the base, round a half circle, and back down.' },
      { value: 'l', label: 'L', help: 'Out from a wall, round a corner, and up.' },
    ],
    default: 'u',
    group: 'arm',
    help: 'How the arm is folded.',
  }),
  rootLeg: length({
    label: 'Root leg',
    min: 2,
    max: 80,
    step: 0.5,
    default: 12,
    group: 'arm',
    help: 'Straight part from the base to the bend.',
  }),
  freeLeg: length({
    label: 'Free leg',
    min: 3,
    max: 80,
    step: 0.5,
    default: 9,
    group: 'arm',
    help: 'From the bend to the holding edge of the catch.',
  }),
  bendRadius: length({
    label: 'Inside radius of the bend',
    min: 0.4,
    max: 20,
    step: 0.1,
    default: 2,
    group: 'arm',
    help: 'Small radii concentrate the strain on the inside of the bend.',
  }),
  thickness: length({
    label: 'Thickness',
    min: 0.6,
    max: 6,
    step: 0.1,
    default: 1.6,
    group: 'arm',
    help: 'Of the arm, in the direction of bending.',
  }),
  armWidth: length({
    label: 'Width',
    min: 2,
    max: 60,
    step: 0.5,
    default: 8,
    group: 'arm',
    help: 'Forces grow with it, strain does not.',
  }),
  rootFillet: length({
    label: 'Root fillet',
    min: 0.2,
    max: 6,
    step: 0.1,
    default: 0.8,
    group: 'arm',
    help: 'Radius where the arm leaves its base.',
  }),
  undercut: length({
    label: 'Undercut',
    min: 0.2,
    max: 10,
    step: 0.1,
    default: 1.2,
    group: 'catch',
    help: 'How far the catch stands out, and so how far the arm has to bend to pass.',
  }),
  leadInAngle: angle({
    label: 'Lead-in angle',
    min: 15,
    max: 60,
    step: 1,
    default: 30,
    group: 'catch',
    help: 'Between the sloping face and the direction of pushing in.',
  }),
  returnAngle: angle({
    label: 'Return angle',
    min: 30,
    max: 90,
    step: 1,
    default: 45,
    group: 'catch',
    help: 'Of the holding face.',
  }),
  landLength: length({
    label: 'Land',
    min: 0.2,
    max: 6,
    step: 0.1,
    default: 0.6,
    group: 'catch',
    help: 'Flat on top of the catch.',
  }),
  baseLength: length({
    label: 'Base length',
    min: 4,
    max: 120,
    step: 0.5,
    default: 16,
    group: 'base',
    help: 'In the direction of bending for a U; along the wall for an L.',
  }),
  baseWidth: length({
    label: 'Base width',
    min: 2,
    max: 120,
    step: 0.5,
    default: 14,
    group: 'base',
    help: 'Along the width of the arm.',
  }),
  baseThickness: length({
    label: 'Base thickness',
    min: 1.2,
    max: 20,
    step: 0.2,
    default: 4,
    group: 'base',
    help: 'A base at least twice the arm thickness gives way as a block.',
  }),
  clearance: length({
    label: 'Clearance',
    min: 0.05,
    max: 1,
    step: 0.05,
    default: 0.3,
    group: 'fit',
    help: 'Between the arm and the edge it locks under.',
  }),
  receiver: toggle({
    label: 'Edge to lock under',
    default: true,
    group: 'fit',
    help: 'Adds the strip the catch locks under.',
  }),
};

export type Values = ValuesOf<typeof fields>;

export const meanBend = (p: Values): number => p.bendRadius + p.thickness / 2;
/** Runs of the faces of the catch along the arm, mm. */
export const returnRun = (p: Values): number => p.undercut / Math.tan(radians(p.returnAngle));
export const leadRun = (p: Values): number => p.undercut / Math.tan(radians(p.leadInAngle));
/** Where the catch ends towards the bend, from the holding edge, mm. */
export const catchLength = (p: Values): number => returnRun(p) + p.landLength + leadRun(p);

/** Clear space behind the free leg that it bends into, mm. */
const room = (p: Values): number => (p.shape === 'u' ? 2 * p.bendRadius : p.rootLeg + p.bendRadius);

export const parameters = defineParameters({
  fields,
  groups: { arm: 'Arm', catch: 'Catch', base: 'Base', fit: 'Fit' },
  relations: [
    {
      id: 'room-to-bend',
      field: 'bendRadius',
      severity: 'refuse',
      holds: (p) => room(p) >= p.undercut + 0.2,
      message: (p) =>
        p.shape === 'u'
          ? `Inside radius of the bend must be at least ${((p.undercut + 0.2) / 2).toFixed(2)} mm: the legs meet before the undercut of ${p.undercut} mm is cleared`
          : `Root leg and bend must leave ${(p.undercut + 0.2).toFixed(1)} mm behind the free leg`,
    },
    {
      id: 'tip-above-base',
      field: 'freeLeg',
      severity: 'refuse',
      holds: (p) => p.shape === 'l' || p.freeLeg <= p.rootLeg - 1.5,
      message: (p) =>
        `Free leg must be at most ${(p.rootLeg - 1.5).toFixed(1)} mm, so that its end stays 1.5 mm above the base`,
    },
    {
      id: 'catch-on-leg',
      field: 'undercut',
      severity: 'refuse',
      holds: (p) => catchLength(p) <= p.freeLeg,
      message: (p) => `Catch of ${catchLength(p).toFixed(1)} mm must fit on the free leg of ${p.freeLeg} mm`,
    },
    {
      id: 'fillets-on-base',
      field: 'baseLength',
      severity: 'refuse',
      holds: (p) => p.baseLength >= p.thickness + 2 * p.rootFillet + 0.4,
      message: (p) =>
        `Base length must be at least ${(p.thickness + 2 * p.rootFillet + 0.4).toFixed(1)} mm for the arm and its fillets`,
    },
    {
      id: 'arm-on-base',
      field: 'baseWidth',
      severity: 'refuse',
      holds: (p) => p.baseWidth >= p.armWidth,
      message: (p) => `Base width must be at least ${p.armWidth} mm, the width of the arm`,
    },
    {
      id: 'fillet-on-leg',
      field: 'rootFillet',
      severity: 'refuse',
      holds: (p) => p.rootFillet <= p.rootLeg - 0.2,
      message: (p) =>
        `Root fillet must be at most ${(p.rootLeg - 0.2).toFixed(1)} mm, less than the root leg`,
    },
    {
      id: 'bend-not-sharp',
      field: 'bendRadius',
      severity: 'warn',
      holds: (p) => p.bendRadius >= 0.5 * p.thickness,
      message: (p) =>
        `Inside radius of the bend under ${(0.5 * p.thickness).toFixed(1)} mm, half the thickness, concentrates the strain`,
    },
    {
      id: 'block-base',
      field: 'baseThickness',
      severity: 'warn',
      holds: (p) => p.baseThickness >= 2 * p.thickness,
      message: (p) =>
        `Base thickness under ${(2 * p.thickness).toFixed(1)} mm, twice the arm, gives way more than the check assumes`,
    },
  ],
});
