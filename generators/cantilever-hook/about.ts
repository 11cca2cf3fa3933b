import type { About } from '../contract';

export const about: About = {
  id: 'cantilever-hook',
  kind: 'clips',
  name: 'Cantilever hook',
  summary: 'Straight arm with a catch that snaps behind the edge of a window.',
  rightWhen:
    'There is room for an arm at least five times as long as it is thick, and the lid goes on straight.',
  wrongWhen:
    'The space is short, the catch has to hold a load for weeks, or the arm can only be printed standing up.',
  bendsBy: 'bending',
};
