import { expect, test } from 'vitest';
import { flexibleArm, peakOf, strainOf } from '@/generators/cantilever-hook/mechanics';
import { type HookValues, parameters, type RootKind } from '@/generators/cantilever-hook/schema';
import { compliance } from '@/lib/mechanics/large-deflection';
import { errorPercent } from '../../support/finite-elements';
import cases from './cases.json';

interface Solved {
  readonly kind: string;
  readonly root: string;
  /** Poisson's ratio where it is not 0.35 */
  readonly nu?: number;
  readonly h: number;
  readonly hTip?: number;
  readonly b?: number;
  readonly bTip?: number;
  readonly L: number;
  readonly R?: number;
  readonly W?: number | null;
  readonly tw?: number;
  readonly S?: number;
  readonly D?: number;
  readonly slot?: number;
  readonly y?: number;
  /** N per mm of width, at E = 1500 MPa */
  readonly force?: number;
  /** E b y / P */
  readonly compliance?: number;
  /** strain at `y`, or strain x E / P in 1/mm2 for solid models */
  readonly peak?: number;
}

const all = cases as readonly Solved[];
const POISSON = 0.35;
/** Far enough that the width of a body no longer counts, mm. */
const WIDE = 1000;

const rootOf = ({ root }: Solved): RootKind =>
  root === 'strip'
    ? 'wall'
    : root.startsWith('panel')
      ? (root as RootKind)
      : root === 'wall'
        ? 'wall'
        : 'block';

/** The case as values of the family. The slots of the panels solved are as wide as the family cuts them, or close. */
function valuesOf(solved: Solved): HookValues {
  const width = solved.b ?? 1;
  return {
    ...parameters.defaults,
    armLength: solved.L,
    rootThickness: solved.h,
    tipThickness: solved.hTip ?? solved.h,
    rootWidth: width,
    tipWidth: solved.bTip ?? width,
    rootFillet: solved.R ?? 1e-6,
    root: rootOf(solved),
    wallThickness: solved.tw ?? 2,
    wallSpan: solved.S ?? 40,
    wallWidth: solved.D ?? (solved.root === 'strip' ? width : (solved.W ?? WIDE)),
    clearance: (solved.slot ?? 0.6) / 2,
    baseWidth: solved.kind.startsWith('plane') ? width : (solved.W ?? WIDE),
  };
}

interface Errors {
  readonly force: number;
  readonly peak: number | null;
}

function errorsOf(solved: Solved): Errors {
  const values = valuesOf(solved);
  const plane = solved.kind.startsWith('plane');
  const solid = flexibleArm(values, solved.nu ?? POISSON);
  const flexible = plane ? { ...solid, stiffening: 1 } : solid;
  if (plane) {
    const state = strainOf(values, flexible, solved.y!);
    return {
      force: errorPercent(state.bent.forcePerModulus * 1500, solved.force!),
      peak: errorPercent(peakOf(state), solved.peak!),
    };
  }
  const force = errorPercent(solved.compliance!, compliance(flexible) * values.rootWidth);
  if (solved.peak === undefined) return { force, peak: null };
  const state = strainOf(values, flexible, 1e-3);
  return { force, peak: errorPercent(peakOf(state) / state.bent.forcePerModulus, solved.peak) };
}

const largest = (found: readonly Solved[], pick: (errors: Errors) => number | null): number =>
  Math.max(...found.map((solved) => Math.abs(pick(errorsOf(solved)) ?? 0)));

const of = (kind: string, also: (solved: Solved) => boolean = () => true) =>
  all.filter((solved) => solved.kind === kind && also(solved));

const thin = ({ tw, h }: Solved) => tw !== undefined && tw < 0.6 * h;

/** Largest error seen in each group, percent, rounded up: a group that drifts fails. */
test.each([
  ['tapered arms with a fillet on blocks and strips of wall, plane', of('plane'), 4, 3.6],
  ['the same bent to 0.3 of their length', of('plane-large', ({ y, L }) => y! <= 0.31 * L), 2.2, 4.4],
  ['the same bent to 0.45 of their length', of('plane-large'), 3.4, 7.8],
  ['sharp arms on blocks of every width', of('solid-sharp', ({ root }) => root === 'block'), 2.6, 0],
  ['sharp arms on walls of every width', of('solid-sharp', ({ root }) => root === 'wall'), 2.2, 0],
  ['filleted arms on blocks', of('solid-fillet', ({ root }) => root === 'block'), 3, 3.3],
  ['filleted arms on walls', of('solid-fillet', (one) => one.root === 'wall' && !thin(one)), 2.2, 8],
  ['filleted arms on walls half as thick as the arm', of('solid-fillet', thin), 4.2, 8.5],
  ['filleted arms at Poisson 0.3, 0.42 and 0.48', of('solid-poisson'), 2.6, 5.2],
  ['arms that narrow', of('solid-narrowing'), 1.5, 4.6],
  ['arms at the edge of a panel', of('solid-panel', ({ root }) => root === 'panel-edge'), 2.6, 5.6],
  ['arms in a slotted panel', of('solid-panel', ({ root }) => root === 'panel-slot'), 4.4, 5.3],
] as const)('%s: force and strain stay as close as recorded', (_, found, force, peak) => {
  expect(found.length).toBeGreaterThan(5);
  expect(largest(found, (errors) => errors.force)).toBeLessThanOrEqual(force);
  expect(largest(found, (errors) => errors.peak)).toBeLessThanOrEqual(peak);
});

test('the corrected figures are not biased to the unsafe side: mean strain error within 2 % of zero or above', () => {
  const errors = all.map((solved) => errorsOf(solved).peak).filter((error) => error !== null);
  const mean = errors.reduce((sum, error) => sum + error, 0) / errors.length;
  expect(mean).toBeGreaterThan(-2);
  expect(mean).toBeLessThan(3);
});
