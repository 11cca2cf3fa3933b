import type { About } from '../contract';

export const about: About = {
  id: 'press-lid',
  kind: 'caps',
  name: 'Press lid and pot',
  summary: 'A round pot with a bead all round and a lid whose skirt snaps over it.',
  rightWhen: 'A round pot is opened and shut by hand without turning: paint, bits, shot, seeds.',
  wrongWhen: 'It must seal liquid, hold pressure or open with a finger in stiff plastic: use a screw cap.',
  bendsBy: 'hoop stretch',
};
