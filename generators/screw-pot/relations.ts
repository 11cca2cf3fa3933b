import { jointOf } from '@/lib/mechanics/screw-sizes';
import type { Relation } from '../parameters';
import { leastMm, mostMm, plugRelations, threadRelations } from '../screw-relations';
import { hasDisc, layoutOf, ROOMS, screwOf } from './layout';
import type { Values } from './schema';

const SMALLEST_MOUTH = 6;
/** Straight wall left between a flush pot's floor and where it narrows, mm. */
const SMALLEST_ROOM = 2;

/** Least inside depth, mm: the thread fits on the wall, or the room ends before it narrows. */
function leastDepth(p: Values): number {
  const { rim, narrows } = layoutOf(p);
  const { capMouth } = jointOf(screwOf(p));
  return p.body === 'flush' ? rim - narrows + SMALLEST_ROOM : Math.max(rim, rim - capMouth);
}

/** The mouth a finger or a spoon still enters. */
const WIDE_MOUTH = 16;

const refusals: readonly Relation<Values>[] = [
  {
    id: 'mouth-left',
    field: 'innerDiameter',
    severity: 'refuse',
    holds: (p) => screwOf(p).bore >= SMALLEST_MOUTH - 1e-9,
    message: (p) =>
      `Inside diameter must be at least ${leastMm(p.innerDiameter + SMALLEST_MOUTH - screwOf(p).bore)}: drawn in to be flush, the neck leaves a mouth of ${mostMm(screwOf(p).bore)} and needs ${SMALLEST_MOUTH} mm`,
  },
  {
    id: 'deep-enough',
    field: 'innerDepth',
    severity: 'refuse',
    holds: (p) => p.innerDepth >= leastDepth(p) - 1e-9,
    message: (p) =>
      p.body === 'flush'
        ? `Inside depth must be at least ${leastMm(leastDepth(p))} for neck, shoulder and some room under them`
        : `Inside depth must be at least ${leastMm(leastDepth(p))}, so that thread and lid fit on the wall`,
  },
  {
    id: 'divider-has-height',
    field: 'divider',
    severity: 'refuse',
    holds: (p) => p.divider === 'none' || layoutOf(p).dividerTop - layoutOf(p).floor >= 2,
    message: (p) =>
      `Divider would be ${mostMm(layoutOf(p).dividerTop - layoutOf(p).floor)} high and must be at least 2 mm: raise Inside depth`,
  },
  {
    id: 'divider-leaves-rooms',
    field: 'dividerThickness',
    severity: 'refuse',
    holds: (p) => p.divider === 'none' || ROOMS[p.divider] * p.dividerThickness <= p.innerDiameter / 2,
    message: (p) =>
      `Divider thickness must be at most ${mostMm(p.innerDiameter / 2 / ROOMS[p.divider])} to leave room between the walls`,
  },
];

const cautions: readonly Relation<Values>[] = [
  {
    id: 'lid-stands-flat',
    field: 'innerDepth',
    severity: 'warn',
    holds: (p) => layoutOf(p).bottom <= jointOf(screwOf(p)).capMouth - 1,
    message: () => 'The lid reaches the bed: nothing is left of the pot to hold while you unscrew it',
  },
  {
    id: 'mouth-wide',
    field: 'body',
    severity: 'warn',
    holds: (p) => p.body === 'straight' || screwOf(p).bore >= WIDE_MOUTH || p.innerDiameter < WIDE_MOUTH,
    message: (p) =>
      `The flush neck leaves a mouth of ${mostMm(screwOf(p).bore)}; under ${WIDE_MOUTH} mm no finger goes in`,
  },
  {
    id: 'disc-soft',
    field: 'sealThickness',
    severity: 'warn',
    holds: (p) => !hasDisc(p) || p.sealThickness >= 0.8,
    message: () => 'A disc under 0.8 mm does not make up for an uneven rim',
  },
];

export const relations: readonly Relation<Values>[] = [
  ...threadRelations<Values>(screwOf, {
    pitch: 'pitch',
    clearance: 'clearance',
    halves: 'pot and lid',
    cap: 'lid',
  }),
  ...plugRelations<Values>(screwOf, {
    length: 'plugLength',
    interference: 'plugInterference',
    cap: 'lid',
  }),
  ...refusals,
  ...cautions,
];
