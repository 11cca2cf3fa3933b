import { IDENTITY, rotation } from '@/lib/geometry/placement';
import type { Stance } from '../contract';
import { inPanel } from './dimensions';
import type { HookValues } from './schema';

const ON_ITS_SIDE = rotation('x', Math.PI / 2);
/** The back of the panel down, the catch up. */
const FLAT = rotation('y', -Math.PI / 2);

/** Gap under an arm lying on its side when its base is wider than the arm, mm. */
const underArm = (v: HookValues): number =>
  ((v.root === 'block' ? v.baseWidth : v.wallWidth) - v.rootWidth) / 2;

function onItsSide(v: HookValues): Stance {
  const gap = underArm(v);
  const support =
    gap > 0.2
      ? ` The base is wider than the arm: the arm hangs ${Number(gap.toFixed(2))} mm over the bed and needs support.`
      : ' Arm and base lie flush on the bed and need no support.';
  return {
    id: 'on-its-side',
    label: 'Hook on its side',
    because: `The strands run along the arm and the strain along the layers, where the plastic takes most.${support}`,
    layers: 'along',
    orient: { hook: ON_ITS_SIDE, receiver: IDENTITY },
  };
}

const FLAT_PANEL: Stance = {
  id: 'flat',
  label: 'Panel flat on the bed',
  because:
    'Arm and panel lie flat with the catch on top: the strain runs along the layers and nothing hangs over.',
  layers: 'along',
  orient: { hook: FLAT, receiver: IDENTITY },
};

const UPRIGHT: Stance = {
  id: 'upright',
  label: 'Hook standing',
  because:
    'Bending pulls the layers of the arm apart; they part at a third to a half of the strain. Only for a hook that cannot be turned.',
  layers: 'across',
  orient: { hook: IDENTITY, receiver: IDENTITY },
};

/** Best first. The window plate of a standing arm always lies flat; that of a slotted panel is turned flat with it. */
export function stances(v: HookValues): readonly Stance[] {
  if (!inPanel(v)) return [onItsSide(v), UPRIGHT];
  if (v.root === 'panel-edge') return [FLAT_PANEL, UPRIGHT];
  return [{ ...FLAT_PANEL, orient: { hook: FLAT, receiver: FLAT } }, UPRIGHT];
}
