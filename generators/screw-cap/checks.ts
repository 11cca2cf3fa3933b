import type { Material, Use } from '@/lib/materials/types';
import { SEAT_PRESSURE } from '@/lib/mechanics/screw-closure';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import { type Report, report } from '../report';
import type { Seat } from '../screw-context';
import { screwCurves } from '../screw-curves';
import { screwContext, screwFigures, screwGoverning } from '../screw-report';
import type { Values } from './schema';

const seatOf = (p: Values): Seat | null =>
  p.seal === 'land'
    ? {
        ...jointOf(p).land,
        pressure: SEAT_PRESSURE,
        of: 'land',
        advice:
          'Two hard printed faces seal only dust and drips: lay in a disc of TPU or rubber for liquids.',
      }
    : null;

/** Report of a neck and cap, closed by hand. */
export function check(p: Values, material: Material, use: Use): Report {
  const words = { neck: 'neck', cap: 'cap' };
  const given = { layerHeight: p.layerHeight, words, seat: seatOf(p) };
  const context = screwContext(p, given, material, use);
  const figures = screwFigures(context);
  return report({
    governing: screwGoverning(figures),
    headline: ['hand-torque', 'closing-torque', 'stripping-load'],
    figures,
    curves: screwCurves(context),
    allowable: context.allowable,
  });
}
