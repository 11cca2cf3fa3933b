import { plugTorque, screwContact } from '@/lib/mechanics/screw-closure';
import { plugContact } from '@/lib/mechanics/screw-sizes';
import { torquePerLoad } from '@/lib/mechanics/thread-torque';
import type { Curve } from './report';
import type { ScrewContext } from './screw-context';

const STEPS = 24;
const shares = Array.from({ length: STEPS + 1 }, (_, at) => at / STEPS);

/** Pull in the thread over the torque of the hand, with the friction band. */
function loadCurve({ p, material, mechanics }: ScrewContext): Curve[] {
  const { closing, joint, plug } = mechanics;
  if (!closing) return [];
  const load = (torque: number, friction: number) =>
    Math.max(0, torque - (plugTorque(p, joint, plug, friction) ?? 0)) /
    torquePerLoad(screwContact(joint, friction), 'closing');
  const { low, value, high } = material.friction;
  const torques = shares.map((share) => share * closing.hand.high);
  return [
    {
      id: 'load-over-torque',
      label: 'Pull in the thread over closing torque',
      x: { label: 'Closing torque', unit: 'Nmm' },
      y: { label: 'Pull in the thread', unit: 'N' },
      points: torques.map((torque) => [torque, load(torque, value)] as const),
      band: torques.map((torque) => [load(torque, high), load(torque, low)] as const),
    },
  ];
}

/** Torque while the plug goes home, over the last turns. */
function plugCurve({ p, material, mechanics }: ScrewContext): Curve[] {
  const { joint, plug } = mechanics;
  if (plug?.pressure == null) return [];
  const home = plugContact(p) / joint.thread.lead;
  const drag = (share: number, friction: number) => share * (plugTorque(p, joint, plug, friction) ?? 0);
  const { low, value, high } = material.friction;
  return [
    {
      id: 'torque-over-turn',
      label: 'Torque while the plug goes home',
      x: { label: 'Turns since the plug touched', unit: 'turns' },
      y: { label: 'Torque', unit: 'Nmm' },
      points: shares.map((share) => [share * home, drag(share, value)] as const),
      band: shares.map((share) => [drag(share, low), drag(share, high)] as const),
    },
  ];
}

export const screwCurves = (context: ScrewContext): Curve[] => [...plugCurve(context), ...loadCurve(context)];
