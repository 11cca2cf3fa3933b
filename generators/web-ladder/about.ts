import type { About } from '../contract';

export const about: About = {
  id: 'web-ladder',
  kind: 'coupons',
  name: 'Web ladder',
  summary: 'Small hinges side by side, each web a layer thicker than the last, to fold and count.',
  rightWhen: 'You want to know which web of a living hinge lasts in your plastic, and how many folds.',
  wrongWhen: 'You want to know a gap or the strain of a straight arm: take the ladder made for that.',
  bendsBy: 'folding thin webs',
};
