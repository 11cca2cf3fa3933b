import type { About } from '../contract';

export const about: About = {
  id: 'hinged-box',
  kind: 'hinges',
  name: 'Hinged box',
  summary: 'Box and lid joined by a folding web, closed by a snap catch: one flat print.',
  rightWhen: 'Small things want a lid that cannot get lost, in polypropylene or TPU, which fold for life.',
  wrongWhen: 'The plastic is PLA, PETG or ABS: the web cracks. Use a knuckle hinge and a hook there.',
  bendsBy: 'web bending and a cantilever',
};
