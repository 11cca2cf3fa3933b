import type { About } from '../contract';

export const about: About = {
  id: 'screw-cap',
  kind: 'caps',
  name: 'Screw cap and neck',
  summary: 'An internal-thread cap and the external-thread neck it closes, with a land or a plug as seal.',
  rightWhen:
    'Something is filled, emptied and closed again many times: a ballast pot, a glue bottle, a port in a hull.',
  wrongWhen:
    'It must hold pressure, hot liquid or drinking water, or open with one hand in a second: use a press lid or a hook.',
  bendsBy: 'thread shear, seal interference',
};
