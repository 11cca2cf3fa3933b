import { FADE } from '@/lib/geometry/thread';
import type { Material, Use } from '@/lib/materials/types';
import { SEAT_PRESSURE } from '@/lib/mechanics/screw-closure';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import { formatQuantity } from '@/lib/units';
import { type Figure, plainFigure, type Report, report } from '../report';
import type { Seat } from '../screw-context';
import { screwCurves } from '../screw-curves';
import { screwContext, screwFigures, screwGoverning } from '../screw-report';
import * as source from '../screw-sources';
import { layoutOf, ROOMS, roomVolume, screwOf } from './layout';
import type { Values } from './schema';

const PRESSED =
  'The pressure is that of rubber from 75 Shore A on, TPU among it. Wide pots want more than a hand gives: take foam for them.';
const SOFT = 'Foam and soft rubber bed by themselves: turn until the lid is felt to bite.';
const HARD = 'Two hard printed faces keep out dust and drips only: use a drop-in disc for liquids.';

/** The flat of the rim presses a disc; a land presses the rim. */
function seatOf(p: Values): Seat | null {
  const { mouth, core, rimChamfer } = layoutOf(p);
  const rim = { inner: mouth, outer: core - rimChamfer, of: 'disc' };
  if (p.seal === 'disc') return { ...rim, pressure: SEAT_PRESSURE, advice: PRESSED };
  if (p.seal === 'foam') return { ...rim, pressure: 0, advice: SOFT };
  if (p.seal !== 'land') return null;
  return { ...jointOf(screwOf(p)).land, pressure: SEAT_PRESSURE, of: 'land', advice: HARD };
}

function potFigures(p: Values): Figure[] {
  const joint = jointOf(screwOf(p));
  const { bottom } = layoutOf(p);
  const rooms = ROOMS[p.divider];
  const figure = (given: Omit<Parameters<typeof plainFigure>[0], 'source'>) =>
    plainFigure({ ...given, source: source.GEOMETRY });
  return [
    figure({
      id: 'room',
      label: 'Room in the pot',
      unit: 'ml',
      value: roomVolume(p),
      because:
        rooms === 1
          ? 'From the floor to the rim; a plug takes a little of it.'
          : `From the floor to the rim, the walls of the divider taken off; about ${(roomVolume(p) / rooms).toPrecision(2)} ml in each of ${rooms} rooms.`,
    }),
    figure({
      id: 'turns-to-open',
      label: 'Turns until the lid comes off',
      unit: 'turns',
      value: joint.engagedTurns + FADE,
      because: `Until its ridges have left those of the pot, fading ends counted; it climbs ${formatQuantity(joint.thread.lead, 'mm')} a turn.`,
    }),
    figure({
      id: 'overall-height',
      label: 'Height, closed',
      unit: 'mm',
      value: joint.capTop - bottom,
      because: 'From the bed to the top of the lid, a disc not squeezed.',
    }),
    figure({
      id: 'mouth',
      label: 'Width of the mouth',
      unit: 'mm',
      value: screwOf(p).bore,
      because:
        p.body === 'flush'
          ? 'Drawn in under the lid; a straight body leaves it as wide as the room.'
          : 'As wide as the room.',
    }),
  ];
}

/** Report of a pot and its lid, closed by hand. */
export function check(p: Values, material: Material, use: Use): Report {
  const words = { neck: 'pot', cap: 'lid' };
  const given = { layerHeight: p.layerHeight, words, seat: seatOf(p) };
  const context = screwContext(screwOf(p), given, material, use);
  const figures = screwFigures(context);
  return report({
    governing: screwGoverning(figures),
    headline: ['room', 'turns-to-open', 'closing-torque'],
    figures: [...figures, ...potFigures(p)],
    curves: screwCurves(context),
    allowable: context.allowable,
  });
}
