import type { About } from '../contract';

export const about: About = {
  id: 'rod-clip',
  kind: 'clips',
  name: 'Rod clip',
  summary:
    'Open ring that snaps on a rod or tube, on a foot with screw holes, a strap slot or a flat for tape.',
  rightWhen: 'A spar, rod, tube or cable is to be held and taken out by hand, without tools.',
  wrongWhen: 'The pull is towards the mouth, or the rod must not turn or slide: a clip grips only lightly.',
  bendsBy: 'curved-beam bending',
};
