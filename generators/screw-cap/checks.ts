import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { type Figure, type Report, report } from '../report';
import type { Context } from './context';
import { curves } from './curves';
import { loadFigures } from './load-figures';
import { capMechanics } from './mechanics';
import type { Values } from './schema';
import { strainFigures } from './strain-figures';
import { threadFigures } from './thread-figures';

/** Value over limit; what is not known counts as more than any known share. */
const used = ({ value, limit }: Figure): number =>
  value === null || limit === null ? Number.POSITIVE_INFINITY : value / limit;

const GOVERNING = ['peak-strain', 'closing-load', 'closing-torque', 'cap-spread'];

/** Of strain, pull in the thread, torque and spread: what uses most of its limit. */
function governing(figures: readonly Figure[]): string {
  const candidates = figures.filter(({ id, verdict }) => verdict !== null && GOVERNING.includes(id));
  return candidates.reduce((most, next) => (used(next) > used(most) ? next : most)).id;
}

/** Report of a neck and cap, closed by hand. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const context: Context = { p, material, allowable, mechanics: capMechanics(p, material, allowable) };
  const figures = [...strainFigures(context), ...loadFigures(context), ...threadFigures(context)];
  return report({
    governing: governing(figures),
    headline: ['hand-torque', 'closing-torque', 'stripping-load'],
    figures,
    curves: curves(context),
    allowable,
  });
}
