import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { screwMechanics } from '@/lib/mechanics/screw-closure';
import type { ScrewSizes } from '@/lib/mechanics/screw-sizes';
import type { Figure } from './report';
import type { ScrewContext, ScrewWords, Seat } from './screw-context';
import { screwLoadFigures } from './screw-load-figures';
import { screwStrainFigures } from './screw-strain-figures';
import { screwThreadFigures } from './screw-thread-figures';

/** Value over limit; what is not known counts as more than any known share. */
const used = ({ value, limit }: Figure): number =>
  value === null || limit === null ? Number.POSITIVE_INFINITY : value / limit;

const GOVERNING = ['peak-strain', 'closing-load', 'closing-torque', 'cap-spread'];

/** Of strain, pull in the thread, torque and spread: what uses most of its limit. */
export function screwGoverning(figures: readonly Figure[]): string {
  const candidates = figures.filter(({ id, verdict }) => verdict !== null && GOVERNING.includes(id));
  return candidates.reduce((most, next) => (used(next) > used(most) ? next : most)).id;
}

/** Everything the figures of a screwed closure rest on. */
export function screwContext(
  p: ScrewSizes,
  given: { readonly layerHeight: number; readonly words: ScrewWords; readonly seat: Seat | null },
  material: Material,
  use: Use,
): ScrewContext {
  const allowable = allowableStrain(material, use);
  return { p, ...given, material, allowable, mechanics: screwMechanics(p, material, allowable) };
}

export const screwFigures = (context: ScrewContext): Figure[] => [
  ...screwStrainFigures(context),
  ...screwLoadFigures(context),
  ...screwThreadFigures(context),
];
