import type { About } from '../contract';

export const about: About = {
  id: 'folded-hook',
  kind: 'clips',
  name: 'Folded hook',
  summary: 'A snap arm folded into a U or an L, for places too short for a straight one.',
  rightWhen: 'A straight arm of the same height would break, and there is room beside it.',
  wrongWhen: 'There is room for a straight arm: it is stiffer sideways and simpler to print.',
  bendsBy: 'bending',
};
