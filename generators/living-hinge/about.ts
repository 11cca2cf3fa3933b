import type { About } from '../contract';

export const about: About = {
  id: 'living-hinge',
  kind: 'hinges',
  name: 'Living hinge',
  summary: 'Two leaves joined by a thin web that folds, with screw or glue holes.',
  rightWhen:
    'The plastic folds for life (polypropylene, soft TPU), or the fold is gentle and the web can be long.',
  wrongWhen:
    'The fold is sharp and the plastic is PLA, PETG, ABS or nylon: the web cracks within a few hundred folds.',
  bendsBy: 'web bending',
};
