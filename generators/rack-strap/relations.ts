import type { Relation } from '../parameters';
import { engagement, layoutOf, pawlFlat, rampAngle, turnOf } from './layout';
import type { Values } from './schema';

const mm = (value: number): string => `${(Math.ceil(value * 100 - 1e-6) / 100).toFixed(2)} mm`;
const down = (value: number): string => `${(Math.floor(value * 100 + 1e-6) / 100).toFixed(2)} mm`;

/** Most of the pawl that its teeth may take. */
const TOOTHED_SHARE = 0.7;
/** Plain band left between the head and the first tooth. */
const PLAIN = 3;
const LONGEST = 700;
const BED = 220;

const largestRoot = (p: Values): number => Math.min(0.8 * p.toothDepth, 0.95 * pawlFlat(p));

/** Least diameter for which the teeth begin past the head, mm. */
const leastBundle = (p: Values): number =>
  p.smallestBundle + (Math.max(PLAIN, layoutOf(p).head) - layoutOf(p).toothedFrom) / Math.PI;

/** Longest side on the bed, mm. */
function onBed(p: Values): number {
  const { band, head, ring } = layoutOf(p);
  return p.printedAs === 'curved' ? 2 * ring + 2 * p.toothDepth : band + head;
}

const refusals: readonly Relation<Values>[] = [
  {
    id: 'bundles-in-order',
    field: 'largestBundle',
    severity: 'refuse',
    holds: (p) => p.largestBundle >= p.smallestBundle,
    message: (p) => `Largest bundle must be at least the smallest, ${p.smallestBundle} mm`,
  },
  {
    id: 'head-on-bundle',
    field: 'smallestBundle',
    severity: 'refuse',
    holds: (p) => p.smallestBundle >= leastBundle(p) - 1e-9,
    message: (p) =>
      `Smallest bundle must be at least ${mm(leastBundle(p))}: the head of ${mm(layoutOf(p).head)} leaves no band to go round less. A shorter pawl helps`,
  },
  {
    id: 'strap-not-endless',
    field: 'largestBundle',
    severity: 'refuse',
    holds: (p) => layoutOf(p).band <= LONGEST,
    message: (p) =>
      `Largest bundle makes a strap of ${mm(layoutOf(p).band)}; it must be at most ${LONGEST} mm long`,
  },
  {
    id: 'root-radius-fits',
    field: 'rootRadius',
    severity: 'refuse',
    holds: (p) => p.rootRadius <= largestRoot(p) + 1e-9,
    message: (p) =>
      `Tooth root radius must be at most ${down(largestRoot(p))}, what fits between two teeth of this pitch and depth`,
  },
  {
    id: 'tooth-holds',
    field: 'clearance',
    severity: 'refuse',
    holds: (p) => engagement(p) >= 0.3 - 1e-9 && p.clearance <= 0.2 * p.pitch + 1e-9,
    message: (p) =>
      `Clearance must be at most ${down(Math.min(p.toothDepth - 0.3, 0.2 * p.pitch))}, so that teeth and pawl overlap by 0.3 mm and fit into each other`,
  },
  {
    id: 'teeth-on-pawl',
    field: 'pawlLength',
    severity: 'refuse',
    holds: (p) =>
      p.pawlTeeth * p.pitch <= TOOTHED_SHARE * p.pawlLength + 1e-9 &&
      p.pawlTeeth * p.pitch + p.pawlFillet <= p.pawlLength - 0.5,
    message: (p) =>
      `Pawl length must be at least ${mm(Math.max((p.pawlTeeth * p.pitch) / TOOTHED_SHARE, p.pawlTeeth * p.pitch + p.pawlFillet + 0.5))} for ${p.pawlTeeth} teeth of pitch ${p.pitch} mm`,
  },
  {
    id: 'ramp-slides',
    field: 'toothDepth',
    severity: 'refuse',
    holds: (p) => rampAngle(p) <= 50,
    message: (p) =>
      `Tooth depth must be at most ${down(p.pitch * 0.48 * Math.tan((50 * Math.PI) / 180))} for a pitch of ${p.pitch} mm: steeper ramps than 50° do not slide`,
  },
  {
    id: 'anvil-over-band',
    field: 'anvil',
    severity: 'refuse',
    holds: (p) => p.anvil >= p.bandThickness - 1e-9,
    message: (p) => `Anvil must be at least as thick as the band, ${p.bandThickness} mm`,
  },
  {
    id: 'lift-small',
    field: 'toothDepth',
    severity: 'refuse',
    holds: (p) => engagement(p) <= 0.3 * p.pawlLength,
    message: (p) =>
      `Tooth depth must be at most ${down(0.3 * p.pawlLength + p.clearance)} for a pawl of ${p.pawlLength} mm`,
  },
];

const cautions: readonly Relation<Values>[] = [
  {
    id: 'fits-bed',
    field: 'largestBundle',
    severity: 'warn',
    holds: (p) => onBed(p) <= BED,
    message: (p) =>
      p.printedAs === 'curved'
        ? `The ring is ${mm(onBed(p))} wide; many beds hold ${BED} mm`
        : `The strap is ${mm(onBed(p))} long; many beds hold ${BED} mm. Print it curved`,
  },
  {
    id: 'teeth-print',
    field: 'pitch',
    severity: 'warn',
    holds: (p) => p.pitch >= 2.2 && p.toothDepth >= 0.7,
    message: () => 'Teeth under 2.2 mm pitch or 0.7 mm depth come out round with a 0.4 mm nozzle',
  },
  {
    id: 'band-prints',
    field: 'bandThickness',
    severity: 'warn',
    holds: (p) => p.bandThickness >= 0.8,
    message: () => 'A band under 0.8 mm is a single line of a 0.4 mm nozzle where it stands on edge',
  },
  {
    id: 'pawl-fillet-worth-having',
    field: 'pawlFillet',
    severity: 'warn',
    holds: (p) => p.pawlFillet >= 0.4 * p.pawlThickness - 1e-9,
    message: (p) => `A root fillet under ${mm(0.4 * p.pawlThickness)} raises the strain of the pawl`,
  },
  {
    id: 'bundle-over-head',
    field: 'smallestBundle',
    severity: 'warn',
    holds: (p) => layoutOf(p).head <= 0.35 * turnOf(p, p.smallestBundle),
    message: (p) =>
      `The stiff head takes over a third of the way round ${p.smallestBundle} mm; the band is bent sharply beside it`,
  },
];

export const relations: readonly Relation<Values>[] = [...refusals, ...cautions];
