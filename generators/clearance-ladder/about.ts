import type { About } from '../contract';

export const about: About = {
  id: 'clearance-ladder',
  kind: 'coupons',
  name: 'Clearance ladder',
  summary:
    'A plate of round and flat holes, each a little wider than the last, with a pin and a tongue to try.',
  rightWhen: 'You want to know what gap your printer leaves for a snug, slip or free fit in this plastic.',
  wrongWhen: 'You want to know how far a plastic bends: take the arm ladder.',
  bendsBy: 'nothing: gaps are tried',
};
