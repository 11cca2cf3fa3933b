import { IDENTITY, rotation } from '@/lib/geometry/placement';
import type { Stance } from '../contract';

const ON_ITS_SIDE = rotation('x', Math.PI / 2);

/** The window plate always lies flat; the hook lies on its side or stands. */
export function stances(): readonly Stance[] {
  return [
    {
      id: 'on-its-side',
      label: 'Hook on its side',
      because:
        'The arm lies flat on the bed: the strands run along it and the strain runs along the layers, where the plastic takes most.',
      layers: 'along',
      orient: { hook: ON_ITS_SIDE, receiver: IDENTITY },
    },
    {
      id: 'upright',
      label: 'Hook standing',
      because:
        'Bending pulls the layers of the arm apart; they part at a third to a half of the strain. Only for a hook that cannot be turned.',
      layers: 'across',
      orient: { hook: IDENTITY, receiver: IDENTITY },
    },
  ];
}
