import type { About } from '../contract';

export const about: About = {
  id: 'torsion-latch',
  kind: 'clips',
  name: 'Torsion latch',
  summary: 'A rocker on two twisting bars: its nose catches an edge, a press on its tail lets go.',
  rightWhen: 'A lid must open by one finger without a tool, and there is no room for a long arm.',
  wrongWhen: 'The part has to be printed standing: the twist then shears the layers apart.',
  bendsBy: 'torsion',
};
