import type { About } from '../contract';

export const about: About = {
  id: 'lattice-hinge',
  kind: 'hinges',
  name: 'Lattice hinge',
  summary: 'A flat panel that bends round a corner where rows of slits leave it only slim links.',
  rightWhen: 'One panel must wrap round a bend, as a box or a cover, in a plastic too stiff for a thin web.',
  wrongWhen: 'It must be tight, carry a pull across the bend, or fold sharply in little room.',
  bendsBy: 'torsion of links',
};
